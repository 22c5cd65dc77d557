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
/** Hz; a search ends here though it found less. */
const HIGHEST = 40_000;
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
  const tracks = fingerings.map(() => new PhaseTrack());
  scan(prepared, fingerings, search, tracks);
  return fingerings.map((fingering, i) => {
    const track = tracks[i] ?? new PhaseTrack();
    const probe: Probe = { prepared, fingering, search, track };
    refine(probe);
    recount(probe);
    return crossings(probe);
  });
}

interface Probe {
  prepared: PreparedColumn;
  fingering: FingeringBranches;
  search: ResonanceSearch;
  track: PhaseTrack;
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

function scan(
  prepared: PreparedColumn,
  fingerings: readonly FingeringBranches[],
  search: ResonanceSearch,
  tracks: readonly PhaseTrack[],
): void {
  const step = prepared.speedOfSound / (2 * SAMPLES_PER_TURN * prepared.length);
  const open = fingerings.map(() => true);
  let left = fingerings.length;
  for (let j = 0; left > 0 && j * step < HIGHEST; j += 1) {
    const frequency = j === 0 ? step / 16 : j * step;
    tuneColumn(prepared, frequency, search.coupling);
    for (let i = 0; i < fingerings.length; i += 1) {
      const fingering = fingerings[i];
      const track = tracks[i];
      if (open[i] !== true || fingering === undefined || track === undefined) continue;
      const phase = track.push(frequency, reflectionPhase(prepared, fingering, search.coupling));
      if (phase > levelOf(search.count, track, search.maxima)) continue;
      open[i] = false;
      left -= 1;
      track.counted = countedPhase(prepared, fingering);
    }
  }
}

function sampleAt({ prepared, fingering, search }: Probe, frequency: number): number {
  tuneColumn(prepared, frequency, search.coupling);
  return reflectionPhase(prepared, fingering, search.coupling);
}

// Halves every interval whose phase step is too large to be sure of.
function refine(probe: Probe): void {
  const { track } = probe;
  for (let i = 1; i < track.count;) {
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
  refine(probe);
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
