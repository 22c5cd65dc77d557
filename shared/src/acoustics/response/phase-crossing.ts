import { cell } from '../complex/cells.ts';
import { nearestTurn, type PhaseSample, type PhaseTrack } from './phase-track.ts';
import type { RoundTrip } from './round-trip.ts';

/** Relative to the frequency, 2e-5 cent; far below anything that can be heard or measured. */
const TOLERANCE = 1e-8;
/** What a step leaves is less than this many times itself times the one before, over the interval's width. */
const CURVATURE = 5;
/** The same where the round trip falls evenly. */
const EVEN_CURVATURE = 1;
/** Share of a frequency to which an interval is halved at most. */
const NARROWEST = 1e-10;
const MOST_STEPS = 60;
const POINTS = 6;
/** So near its level a phase shows on which side of a resonance it is, rad. */
const NEAR = 0.5;

const xs = new Float64Array(POINTS + 1);
const ys = new Float64Array(POINTS + 1);
let known = 0;

/**
 * Frequency at which a phase falls through a level, by inverse interpolation of the round trip through the nearest samples.
 *
 * Keeps the root between two samples throughout and halves the interval whenever interpolation would leave it.
 *
 * @param track - samples; the level lies between `place − 1` and `place`
 * @param place - the first sample at or below the level
 * @param level - rad
 * @param sample - the column at a frequency
 * @returns Hz
 */
export function phaseCrossing(
  track: PhaseTrack,
  place: number,
  level: number,
  sample: (frequency: number) => PhaseSample,
): number {
  let low = track.frequency(place - 1);
  let high = track.frequency(place);
  let highest = track.phase(place - 1) - level;
  let lowest = track.phase(place) - level;
  takeNeighbours(track, place, level);
  let at = inverse(low, high);
  const width = high - low;
  let step = width;
  for (let i = 0; i < MOST_STEPS; i += 1) {
    const { phase, roundTrip } = sample(at);
    const above = nearestTurn(phase - level, (lowest + highest) / 2);
    if (above === 0) return at;
    if (above > 0) {
      low = at;
      highest = above;
    } else {
      high = at;
      lowest = above;
    }
    remember(at, above, roundTrip);
    const next = inverse(low, high);
    const moved = Math.abs(next - at);
    const rest = (even ? EVEN_CURVATURE : CURVATURE) * moved * (moved + step);
    step = moved;
    at = next;
    if (interpolated && Math.abs(above) < NEAR && rest < TOLERANCE * at * width) break;
    if (high - low < NARROWEST * high) break;
  }
  return at;
}

// What stands for the phase above its level in the interpolation: the round trip, which falls evenly, with the turns that put
// it between the same two resonances.
function coordinate(above: number, roundTrip: number): number {
  if (!even) return above;
  return nearestTurn(roundTrip, Math.PI * Math.round(above / Math.PI));
}

function takeNeighbours(track: PhaseTrack, place: number, level: number): void {
  const from = Math.max(0, place - 2);
  const to = Math.min(track.count - 1, place + 1);
  known = 0;
  shift = 0;
  even = track.isEven(place);
  for (let i = from; i <= to; i += 1) {
    xs[known] = track.frequency(i);
    ys[known] = coordinate(track.phase(i) - level, track.roundTrip(i));
    known += 1;
  }
}

// Adds a point; the one furthest from the level makes room. At a weak resonance the round trip stands a little beside 0:
// near one all points are shifted by what it is beside at the newest.
function remember(x: number, above: number, { phase, losslessPhase }: RoundTrip): void {
  const y = coordinate(above, phase);
  const exact = even && Math.abs(above) < NEAR ? losslessPhase : above;
  const wanted = exact - y;
  for (let i = 0; i < known; i += 1) ys[i] = cell(ys, i) + wanted - shift;
  shift = wanted;
  let place = known;
  if (known === POINTS) {
    place = 0;
    for (let i = 1; i < known; i += 1) if (Math.abs(cell(ys, i)) > Math.abs(cell(ys, place))) place = i;
  }
  xs[place] = x;
  ys[place] = y + shift;
  known = Math.min(known + 1, POINTS);
}

let shift = 0;
let even = false;
let interpolated = false;

// Neville's inverse interpolation at phase 0, inside (low, high), else the middle.
function inverse(low: number, high: number): number {
  let sum = 0;
  for (let i = 0; i < known; i += 1) {
    let weight = cell(xs, i);
    for (let j = 0; j < known; j += 1) {
      if (j !== i) weight *= cell(ys, j) / (cell(ys, j) - cell(ys, i));
    }
    sum += weight;
  }
  interpolated = sum >= low && sum <= high;
  return interpolated ? sum : (low + high) / 2;
}
