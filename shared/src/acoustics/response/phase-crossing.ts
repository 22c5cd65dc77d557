import { cell } from '../complex/cells.ts';
import type { PhaseTrack } from './phase-track.ts';

/** Relative to the frequency; far below anything that can be heard or measured. */
const TOLERANCE = 1e-9;
/** Once two interpolated steps in a row multiply to less than this, Hz², the next one would be below 1e-6 Hz. */
const CLOSE = 1e-4;
const MOST_STEPS = 60;
const POINTS = 5;

const xs = new Float64Array(POINTS + 1);
const ys = new Float64Array(POINTS + 1);

/**
 * Frequency at which a phase passes a level, by inverse interpolation through the nearest samples.
 *
 * Keeps the root between two samples throughout and halves the interval whenever interpolation would leave it.
 *
 * @param track - samples; the level lies between `place − 1` and `place`
 * @param place - the first sample at or below the level
 * @param level - rad
 * @param sample - phase at a frequency, its turns chosen nearest to what is expected
 * @returns Hz
 */
export function phaseCrossing(
  track: PhaseTrack,
  place: number,
  level: number,
  sample: (frequency: number, expected: number) => number,
): number {
  let low = cell(track.frequencies, place - 1);
  let high = cell(track.frequencies, place);
  let lowPhase = cell(track.phases, place - 1);
  let highPhase = cell(track.phases, place);
  let known = neighbours(track, place, level);
  let { at } = guess(known, low, high);
  let step = high - low;
  for (let i = 0; i < MOST_STEPS; i += 1) {
    const share = (at - low) / (high - low);
    const phase = sample(at, lowPhase + share * (highPhase - lowPhase));
    if (phase === level) return at;
    if (phase > level) {
      low = at;
      lowPhase = phase;
    } else {
      high = at;
      highPhase = phase;
    }
    known = remember(known, at, phase - level);
    const next = guess(known, low, high);
    const moved = Math.abs(next.at - at);
    // Halving gains one bit a step: two small steps of it promise nothing about the next.
    const promising = next.interpolated && moved * step < CLOSE;
    const closeEnough = promising || moved < TOLERANCE * at || high - low < TOLERANCE * high;
    step = moved;
    at = next.at;
    if (closeEnough) break;
  }
  return at;
}

// The two samples on either side, phases from the level; returns how many.
function neighbours(track: PhaseTrack, place: number, level: number): number {
  let known = 0;
  const from = Math.max(0, place - 2);
  const to = Math.min(track.count - 1, place + 1);
  for (let i = from; i <= to; i += 1) {
    xs[known] = cell(track.frequencies, i);
    ys[known] = cell(track.phases, i) - level;
    known += 1;
  }
  return known;
}

// Adds a point; the one furthest from the level makes room.
function remember(known: number, x: number, y: number): number {
  let place = known;
  if (known === POINTS) {
    place = 0;
    for (let i = 1; i < known; i += 1) if (Math.abs(cell(ys, i)) > Math.abs(cell(ys, place))) place = i;
  }
  xs[place] = x;
  ys[place] = y;
  return Math.min(known + 1, POINTS);
}

// Neville's inverse interpolation at phase 0, inside (low, high), else the middle.
function guess(known: number, low: number, high: number): { at: number; interpolated: boolean } {
  let sum = 0;
  for (let i = 0; i < known; i += 1) {
    let weight = cell(xs, i);
    for (let j = 0; j < known; j += 1) {
      if (j !== i) weight *= cell(ys, j) / (cell(ys, j) - cell(ys, i));
    }
    sum += weight;
  }
  const interpolated = sum >= low && sum <= high;
  return { at: interpolated ? sum : (low + high) / 2, interpolated };
}
