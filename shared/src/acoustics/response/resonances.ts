import { cell } from '../complex/cells.ts';
import { chainImpedance } from './chain.ts';
import { coupledImpedance } from './input-impedance.ts';
import { countedPhase } from './phase-count.ts';
import { PhaseTrack, unwrapped } from './phase-track.ts';
import { tuneColumn, type FingeringBranches, type PreparedColumn } from './prepared-column.ts';
import { phaseCrossing } from './phase-crossing.ts';

/** One resonance at the mouth end. */
export interface Resonance {
  /** Counts the resonances of its kind from the lowest, 1. */
  order: number;
  /** Hz */
  frequency: number;
  /** Input impedance there (it is real) over the input's characteristic impedance. */
  magnitude: number;
  /** Above the cutoff of the open holes: between 1/3 and 3, no use as a note. */
  weak: boolean;
}

export interface ResonanceSearch {
  /** How many to find, from the lowest. */
  count: number;
  /** False: openings do not hear each other. */
  coupling: boolean;
  /** True: maxima of the impedance; false: minima. */
  maxima: boolean;
}

/** Samples in which the phase of a plain tube makes one full turn. */
const SAMPLES_PER_TURN = 4;
/** A step between samples beyond these is looked into, rad. */
const LARGEST_FALL = 2.4;
const LARGEST_RISE = 0.4;
/** A search ends, though it found less, where the bore's first cross mode begins to travel: k·radius there. */
const CROSS_MODE = 1.84;
/** A fall from sample to sample below the first lets the next one be left out, below the second three, rad. */
const SLOW_FALL = 0.7;
const VERY_SLOW_FALL = 0.3;
/** Hz; nothing in an instrument is narrower. */
const NARROWEST = 1e-3;

/**
 * Resonances of every fingering, by the phase of the reflection at the mouth end.
 *
 * The phase φ of (Z − Z₀)/(Z + Z₀) falls with frequency; minima of |Z| lie where it passes odd multiples of π, maxima where
 * it passes even ones. Samples are shared by all fingerings; steps too large are halved; and the turns counted from foot to
 * mouth at the last sample (`countedPhase`) prove that no turn was slept through.
 *
 * @param prepared - the column
 * @param fingerings - branches of each fingering
 * @param search - what to look for
 * @returns for each fingering its resonances from the lowest, at most `count`
 * @source R. M. Foster, Bell System Technical Journal 3 (1924) 259 (reactance theorem)
 */
export function findResonances(
  prepared: PreparedColumn,
  fingerings: readonly FingeringBranches[],
  search: ResonanceSearch,
): Resonance[][] {
  const probes = fingerings.map((fingering) => ({ prepared, fingering, search, track: new PhaseTrack(), next: 0 }));
  scan(prepared, probes, search);
  return probes.map(crossings);
}

interface Probe {
  prepared: PreparedColumn;
  fingering: FingeringBranches;
  search: ResonanceSearch;
  track: PhaseTrack;
  /** Grid sample that it takes next. */
  next: number;
}

// Phase of the reflection at the mouth end for the frequency the column is set to.
// @param prepared - the column
// @param fingering - its branches
// @param coupling - whether openings hear each other
// @returns rad, in (−π, π]
function reflectionPhase(prepared: PreparedColumn, fingering: FingeringBranches, coupling: boolean): number {
  const at = coupling ? coupledImpedance(prepared, fingering) : chainImpedance(prepared, fingering);
  const unit = prepared.inputImpedance;
  const re = prepared.cells[at] ?? 0;
  const im = prepared.cells[at + 1] ?? 0;
  return Math.atan2(2 * im * unit, re * re + im * im - unit * unit);
}

function levelOf(order: number, track: PhaseTrack, maxima: boolean): number {
  if (!maxima) return Math.PI - 2 * Math.PI * order;
  // A column that is shut all along begins at a maximum, that of no frequency at all, which does not count.
  return cell(track.phases, 0) > 0 ? 2 * Math.PI * (1 - order) : -2 * Math.PI * order;
}

function scan(prepared: PreparedColumn, probes: readonly Probe[], search: ResonanceSearch): void {
  const step = prepared.speedOfSound / (2 * SAMPLES_PER_TURN * prepared.length);
  const highest = (CROSS_MODE * prepared.speedOfSound) / (2 * Math.PI * prepared.widestRadius);
  let open = probes;
  for (let j = 0; open.length > 0 && j * step < highest; j += 1) {
    const due = open.filter((probe) => probe.next <= j);
    if (due.length === 0) continue;
    const frequency = j === 0 ? step / 16 : j * step;
    tuneColumn(prepared, frequency, search.coupling);
    for (const { track, fingering } of due) {
      track.push(frequency, reflectionPhase(prepared, fingering, search.coupling));
      track.counted = isThrough(track, search) ? countedPhase(prepared, fingering) : NaN;
    }
    const complete = due.filter((probe) => isComplete(probe));
    if (complete.length > 0) open = open.filter((probe) => !complete.includes(probe));
    for (const probe of due) probe.next = j + stride(probe.track, step);
  }
}

// How many grid steps on the next sample lies: more where the phase falls slowly.
function stride({ frequencies, phases, count }: PhaseTrack, step: number): number {
  if (count < 3) return 1;
  const gap = (cell(frequencies, count - 1) - cell(frequencies, count - 2)) / step;
  const fall = (cell(phases, count - 2) - cell(phases, count - 1)) / gap;
  if (fall > SLOW_FALL) return 1;
  return fall > VERY_SLOW_FALL ? 2 : 4;
}

// Whether the phase has fallen below the last level wanted.
function isThrough(track: PhaseTrack, search: ResonanceSearch): boolean {
  return cell(track.phases, track.count - 1) <= levelOf(search.count, track, search.maxima);
}

// Looks into the last step, and into all of them once the phase has come through.
function isComplete(probe: Probe): boolean {
  const { track, search } = probe;
  refine(probe, track.count - 1);
  if (Number.isNaN(track.counted)) return false;
  if (isThrough(track, search)) recount(probe);
  return isThrough(track, search);
}

function sampleAt({ prepared, fingering, search }: Probe, frequency: number): number {
  tuneColumn(prepared, frequency, search.coupling);
  return reflectionPhase(prepared, fingering, search.coupling);
}

// Halves every interval from a place on whose phase step is too large to be sure of.
function refine(probe: Probe, from: number): void {
  const { track } = probe;
  for (let i = Math.max(from, 1); i < track.count;) {
    const below = cell(track.frequencies, i - 1);
    const above = cell(track.frequencies, i);
    const fall = cell(track.phases, i - 1) - cell(track.phases, i);
    if ((fall > LARGEST_FALL || fall < -LARGEST_RISE) && above - below > NARROWEST) {
      const middle = (below + above) / 2;
      track.insert(i, middle, sampleAt(probe, middle));
    } else {
      i += 1;
    }
  }
}

// Finds turns that fell between two samples: halves the interval in which the count parts from the track.
// Where losses let a pair of resonances vanish the count may keep both; then the track, whose steps are small by then, holds.
function recount(probe: Probe): void {
  const { track } = probe;
  const last = track.count - 1;
  if (last < 1 || agrees(track.counted, cell(track.phases, last))) return;
  let low = 0;
  let high = last;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    const counted = countAt(probe, cell(track.frequencies, middle));
    if (agrees(counted, cell(track.phases, middle))) low = middle;
    else high = middle;
  }
  for (let depth = 0; depth < 12; depth += 1) {
    const below = cell(track.frequencies, high - 1);
    const above = cell(track.frequencies, high);
    const middle = (below + above) / 2;
    track.insert(high, middle, sampleAt(probe, middle));
    const counted = countedPhase(probe.prepared, probe.fingering);
    if (agrees(counted, cell(track.phases, high))) high += 1;
    if (agrees(track.counted, cell(track.phases, track.count - 1))) break;
  }
  refine(probe, 1);
}

function agrees(counted: number, tracked: number): boolean {
  return Math.abs(counted - tracked) < Math.PI;
}

function countAt({ prepared, fingering, search }: Probe, frequency: number): number {
  tuneColumn(prepared, frequency, search.coupling);
  return countedPhase(prepared, fingering);
}

// One resonance for every level that the phase falls through.
function crossings(probe: Probe): Resonance[] {
  const { track, search, prepared } = probe;
  const found: Resonance[] = [];
  let i = 1;
  for (let order = 1; order <= search.count; order += 1) {
    const level = levelOf(order, track, search.maxima);
    while (i < track.count && cell(track.phases, i) > level) i += 1;
    if (i >= track.count) break;
    const frequency = phaseCrossing(track, i, level, (f, expected) => nearest(sampleAt(probe, f), expected));
    const magnitude = realImpedance(prepared, search.maxima);
    found.push({ order, frequency, magnitude, weak: magnitude > 1 / 3 && magnitude < 3 });
  }
  return found;
}

function nearest(phase: number, expected: number): number {
  return unwrapped(phase, expected + Math.PI - 1);
}

// The impedance at the root: its imaginary part is 0 there, and a step short of it only the real one is right.
function realImpedance(prepared: PreparedColumn, maxima: boolean): number {
  const { cells, system, inputImpedance } = prepared;
  const re = cell(cells, system.impedance) / inputImpedance;
  const im = cell(cells, system.impedance + 1) / inputImpedance;
  return maxima ? (re * re + im * im) / re : re;
}
