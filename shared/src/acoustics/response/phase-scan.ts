import { cell } from '../complex/cells.ts';
import { EngineInputError } from '../engine-input-error.ts';
import { chainImpedance } from './chain.ts';
import { coupledImpedance } from './input-impedance.ts';
import { countedPhase } from './phase-count.ts';
import { nearestTurn, PhaseTrack } from './phase-track.ts';
import { tuneColumn, tuneFingering, type FingeringBranches, type PreparedColumn } from './prepared-column.ts';

export interface ResonanceSearch {
  /** How many to find, from the lowest. */
  count: number;
  /** False: openings do not hear each other. */
  coupling: boolean;
  /** True: maxima of the impedance; false: minima. */
  maxima: boolean;
}

/** One fingering on its way through the frequencies. */
export interface Probe {
  prepared: PreparedColumn;
  fingering: FingeringBranches;
  search: ResonanceSearch;
  track: PhaseTrack;
  /** Of the common grid, Hz. */
  step: number;
  /** Grid sample that it takes next. */
  next: number;
}

/** Samples in which the phase of a plain tube makes one full turn. */
const SAMPLES_PER_TURN = 4;
/** A step from sample to sample beyond these is looked into, rad. */
const LARGEST_FALL = 2.4;
const LARGEST_RISE = 0.4;
/** An interval looked into is settled once it is this share of the grid's and its step this small, rad. */
const SETTLED_SHARE = 1 / 8;
const SETTLED_STEP = 0.8;
/** Where a phase turns round so near to a level, rad, the interval must be this share of the grid's. */
const NEAR_LEVEL = 0.6;
const TURNING_SHARE = 1 / 64;
/** And it is at most so many times as wide as the one before. */
const ABRUPT = 5;
/** Share of the power that comes back, below which losses and radiation may let a pair of resonances vanish. */
const LEAKING = 0.7;
/** Hz; nothing in an instrument is narrower. */
const NARROWEST = 1e-3;
/** No instrument needs so many; a search that does has lost its way. */
const MOST_SAMPLES = 20_000;
/** A fall below the first lets the next grid sample be left out, below the second the next three, rad. */
const SLOW_FALL = 0.7;
const VERY_SLOW_FALL = 0.3;
/** A scan ends, though it passed fewer, where so many more resonances would lie if none had leaked away. */
const LEAKED = 2;
/** But no sooner than so many turns after the last it passed: above lost ones a part of the column may sound on. */
const SILENT = 3.5;
/** And where the bore's first cross mode begins to travel: wavenumber times radius there. */
const CROSS_MODE = 1.84;

/**
 * Phase φ of the reflection (Z − Z₀)/(Z + Z₀) at the mouth end over frequency, for every fingering.
 *
 * It falls with frequency; minima of |Z| lie where it passes odd multiples of π, maxima where it passes even ones. Samples are
 * shared by all fingerings. `countedPhase` tells at each sample how many turns lie below: wherever that and the step of the
 * phase disagree, the interval is halved until it is settled. Without that count a narrow resonance between two samples
 * would go unseen. Above the cutoff, where the open holes leak, a minimum and a maximum may both vanish; then the count
 * keeps the turn and the phase, whose steps are small by then, is right to have lost it.
 *
 * @param prepared - the column
 * @param fingerings - branches of each fingering
 * @param search - how far to go
 * @returns for each fingering its track, through the last resonance wanted where there are so many
 * @throws EngineInputError where the impedance is no number or the phase never settles
 * @source R. M. Foster, Bell System Technical Journal 3 (1924) 259 (reactance theorem)
 */
export function scanPhases(
  prepared: PreparedColumn,
  fingerings: readonly FingeringBranches[],
  search: ResonanceSearch,
): Probe[] {
  const step = prepared.speedOfSound / (2 * SAMPLES_PER_TURN * prepared.length);
  const highest = (CROSS_MODE * prepared.speedOfSound) / (2 * Math.PI * prepared.widestRadius);
  const probes = fingerings.map((fingering): Probe => ({
    prepared,
    fingering,
    search,
    step,
    track: new PhaseTrack(),
    next: 0,
  }));
  let open = probes;
  for (let j = 0; open.length > 0 && j * step < highest; j += 1) {
    const due = open.filter((probe) => probe.next <= j);
    if (due.length === 0) continue;
    const frequency = j === 0 ? step / 16 : j * step;
    tuneColumn(prepared, frequency, search.coupling);
    for (const probe of due) sample(probe, probe.track.count, frequency);
    for (const probe of due) {
      settle(probe);
      probe.next = j + stride(probe);
    }
    if (due.some(isThrough)) open = open.filter((probe) => !isThrough(probe));
  }
  return probes;
}

/**
 * Phase of the reflection at the mouth end for the frequency the column is set to.
 *
 * @param prepared - the column
 * @param fingering - its branches
 * @param coupling - whether openings hear each other
 * @returns rad, in (−π, π]
 */
export function reflectionPhase(
  prepared: PreparedColumn,
  fingering: FingeringBranches,
  coupling: boolean,
): number {
  const at = coupling ? coupledImpedance(prepared, fingering) : chainImpedance(prepared, fingering);
  const unit = referenceImpedance(prepared);
  const re = cell(prepared.cells, at);
  const im = cell(prepared.cells, at + 1);
  return Math.atan2(2 * im * unit, re * re + im * im - unit * unit);
}

// A narrow input to a wide cone would turn its whole circle within a hair of each resonance; a middle radius spreads it.
function referenceImpedance({ inputImpedance, inputRadius, phaseRadius }: PreparedColumn): number {
  return inputImpedance * (inputRadius / phaseRadius) ** 2;
}

// Share of the power that comes back.
function reflectedPower(prepared: PreparedColumn): number {
  const unit = referenceImpedance(prepared);
  const re = cell(prepared.cells, prepared.system.impedance);
  const im = cell(prepared.cells, prepared.system.impedance + 1);
  return ((re - unit) ** 2 + im * im) / ((re + unit) ** 2 + im * im);
}

// Phase at which the resonance of an order lies if none before it was lost.
function levelOf(order: number, track: PhaseTrack, maxima: boolean): number {
  if (!maxima) return Math.PI - 2 * Math.PI * order;
  // A column that is shut all along begins at a maximum, that of no frequency at all, which does not count.
  return cell(track.phases, 0) > 0 ? 2 * Math.PI * (1 - order) : -2 * Math.PI * order;
}

// Puts a sample at the frequency that the column is set to into the track.
function sample({ prepared, fingering, search, track }: Probe, place: number, frequency: number): void {
  const phase = reflectionPhase(prepared, fingering, search.coupling);
  const reflected = reflectedPower(prepared);
  if (!Number.isFinite(phase) || track.count >= MOST_SAMPLES) {
    throw new EngineInputError(
      'bore.stations',
      frequency,
      'No resonances can be told apart in so narrow or so uneven a bore. Check the diameters of bore and holes.',
    );
  }
  track.insert(place, { frequency, phase, reflected, counted: countedPhase(prepared, fingering) });
}

// Whether all resonances wanted lie below the last sample, or would if none had leaked away and the column fell silent.
function isThrough({ track, search }: Probe): boolean {
  const last = track.count - 1;
  if (cell(track.phases, last) <= levelOf(search.count, track, search.maxima)) return true;
  const counted = cell(track.counts, last);
  if (counted > levelOf(search.count + LEAKED, track, search.maxima)) return false;
  const found = levelAbove(cell(track.phases, last), search.maxima);
  let silent = last;
  while (silent > 0 && cell(track.phases, silent) <= found) silent -= 1;
  return cell(track.counts, silent) - counted >= 2 * Math.PI * SILENT;
}

// The last level that a falling phase has passed: whole turns for maxima, odd halves of one for minima.
function levelAbove(phase: number, maxima: boolean): number {
  const level = maxima ? 0 : Math.PI;
  return level + 2 * Math.PI * Math.ceil((phase - level) / (2 * Math.PI));
}

// Halves the last interval, and its halves, until every step is sure; the one before it too where the phase begins to rise.
function settle(probe: Probe): void {
  const { track, prepared, search } = probe;
  for (let i = Math.max(track.count - 2, 1); i < track.count;) {
    if (isSettled(probe, i)) {
      i += 1;
      continue;
    }
    const middle = (cell(track.frequencies, i - 1) + cell(track.frequencies, i)) / 2;
    tuneFingering(prepared, probe.fingering, middle, search.coupling);
    sample(probe, i, middle);
    i = Math.max(i - 1, 1);
  }
}

function isSettled({ track, step, search }: Probe, i: number): boolean {
  const width = cell(track.frequencies, i) - cell(track.frequencies, i - 1);
  if (width < NARROWEST) return true;
  const turn = cell(track.phases, i) - cell(track.phases, i - 1);
  const counted = cell(track.counts, i) - cell(track.counts, i - 1);
  if (width > TURNING_SHARE * step && mayTouchUnseen(track, i, search.maxima)) return false;
  if (Math.abs(counted - turn) < Math.PI && turn > -LARGEST_FALL && turn < LARGEST_RISE) return true;
  const reflected = Math.min(cell(track.reflected, i), cell(track.reflected, i - 1));
  return reflected < LEAKING && width <= SETTLED_SHARE * step && Math.abs(turn) <= SETTLED_STEP;
}

// Whether the phase turns round, or lost a turn near by, so near to a level that it could reach it between two samples.
function mayTouchUnseen(track: PhaseTrack, i: number, maxima: boolean): boolean {
  const level = maxima ? 0 : Math.PI;
  const distance = (phase: number) => Math.abs(nearestTurn(level, phase) - phase);
  if (Math.min(distance(cell(track.phases, i)), distance(cell(track.phases, i - 1))) > NEAR_LEVEL)
    return false;
  return [i - 1, i, i + 1].some((j) => turnsRound(track, j)) || isAbruptlyWide(track, i);
}

// What made the interval before narrow may reach into this one.
function isAbruptlyWide({ frequencies }: PhaseTrack, i: number): boolean {
  if (i < 2) return false;
  const before = cell(frequencies, i - 1) - cell(frequencies, i - 2);
  return cell(frequencies, i) - cell(frequencies, i - 1) > ABRUPT * before;
}

function turnsRound({ phases, counts, count }: PhaseTrack, i: number): boolean {
  if (i < 1 || i >= count) return false;
  const turn = cell(phases, i) - cell(phases, i - 1);
  return turn > 0 || Math.abs(cell(counts, i) - cell(counts, i - 1) - turn) >= Math.PI;
}

// How many grid steps on the next sample lies: more where the phase falls slowly.
function stride({ track: { frequencies, phases, count }, step }: Probe): number {
  if (count < 3) return 1;
  const gap = (cell(frequencies, count - 1) - cell(frequencies, count - 2)) / step;
  const fall = (cell(phases, count - 2) - cell(phases, count - 1)) / gap;
  if (fall > SLOW_FALL) return 1;
  return fall > VERY_SLOW_FALL ? 2 : 4;
}
