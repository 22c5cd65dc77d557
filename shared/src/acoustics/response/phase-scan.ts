import { cell } from '../complex/cells.ts';
import { EngineInputError } from '../engine-input-error.ts';
import { chainImpedance } from './chain.ts';
import { coupledImpedance } from './input-impedance.ts';
import { countedPhase } from './phase-count.ts';
import { touchingInterval } from './phase-hump.ts';
import { PhaseTrack, phaseSample } from './phase-track.ts';
import { referenceImpedance, writeRoundTrip } from './round-trip.ts';
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

/** Samples of the common grid in which the phase of a plain tube makes one full turn. */
const SAMPLES_PER_TURN = 4;
/** Where the round trip falls evenly a step is as long as the phase takes for so much, rad. */
const USUAL_FALL = 3.4;
/** There turns are sure while phase and count agree to this, rad: openings that hear each other move a resonance by less. */
const SURE = 0.4;
/** The largest fall of such a step, rad. */
const LARGEST_FALL = 5;
/** Elsewhere no step is longer than one of the grid; rounding aside. */
const ONE_STEP = 1.01;
/** Clearances that settle a step: where phase and count agree, where they do not quite, beside a lost turn, and where it is lost. */
const CLEAR = 2;
const CLEARER = 5;
const CLEAR_BESIDE = 8;
const QUITE_CLEAR = 16;
/** Hz; nothing in an instrument is narrower. */
const NARROWEST = 1e-3;
/** No instrument needs so many; a search that does has lost its way. */
const MOST_SAMPLES = 20_000;
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
 * shared by all fingerings, two to a turn where the round trip from mouth to foot and back turns evenly, and closer where it
 * does not. Between two samples φ may have turned once more than it seems, and so an interval counts as settled only if
 * - the round trip turned as far as the interval before lets expect, or the reflection, drawn in its plane, passed the
 *   origin further off than the curve can be bent there; and
 * - `countedPhase`, which tells from one frequency alone how many turns lie below, agrees; or the curve is so straight that not
 *   even the narrowest resonance that the walls' losses allow can hide in it. Above the cutoff a minimum and a maximum may
 *   both vanish; then the count keeps the turn and the phase is right to have lost it; and
 * - φ does not turn round just short of a level beside it.
 * Whatever is not settled is halved.
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
    track: new PhaseTrack((-2 * Math.PI) / (SAMPLES_PER_TURN * step)),
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
      const next = stride(probe, j);
      // On multiples of the stride, so that fingerings meet and share a frequency.
      probe.next = j + next - (j % next);
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

// Phase at which the resonance of an order lies if none before it was lost.
function levelOf(order: number, track: PhaseTrack, maxima: boolean): number {
  if (!maxima) return Math.PI - 2 * Math.PI * order;
  // A column that is shut all along begins at a maximum, that of no frequency at all, which does not count.
  return track.phase(0) > 0 ? 2 * Math.PI * (1 - order) : -2 * Math.PI * order;
}

// Puts a sample at the frequency that the column is set to into the track.
function sample({ prepared, fingering, search, track }: Probe, place: number, frequency: number): void {
  const phase = reflectionPhase(prepared, fingering, search.coupling);
  if (!Number.isFinite(phase) || track.count >= MOST_SAMPLES) {
    throw new EngineInputError(
      'bore.stations',
      frequency,
      'No resonances can be told apart in so narrow or so uneven a bore. Check the diameters of bore and holes.',
    );
  }
  fresh.frequency = frequency;
  fresh.phase = phase;
  fresh.counted = countedPhase(prepared, fingering);
  writeRoundTrip(prepared, search.maxima, fresh.roundTrip);
  track.insert(place, fresh);
}

const fresh = phaseSample();

// Whether all resonances wanted lie below the last sample, or would if none had leaked away and the column fell silent.
function isThrough({ track, search }: Probe): boolean {
  const last = track.count - 1;
  if (track.phase(last) <= levelOf(search.count, track, search.maxima)) return true;
  const counted = track.counted(last);
  if (counted > levelOf(search.count + LEAKED, track, search.maxima)) return false;
  const found = levelAbove(track.phase(last), search.maxima);
  let silent = last;
  while (silent > 0 && track.phase(silent) <= found) silent -= 1;
  return track.counted(silent) - counted >= 2 * Math.PI * SILENT;
}

// The last level that a falling phase has passed: whole turns for maxima, odd halves of one for minima.
function levelAbove(phase: number, maxima: boolean): number {
  const level = maxima ? 0 : Math.PI;
  return level + 2 * Math.PI * Math.ceil((phase - level) / (2 * Math.PI));
}

// Halves the last interval, and its halves, until every step is sure and no level is touched unseen.
function settle(probe: Probe): void {
  const { track, prepared, search } = probe;
  for (let i = Math.max(track.count - 2, 1); i < track.count;) {
    const open = isSettled(probe, i) ? touched(probe, i - 1) : i;
    if (open === 0) {
      i += 1;
      continue;
    }
    const middle = (track.frequency(open - 1) + track.frequency(open)) / 2;
    tuneFingering(prepared, probe.fingering, middle, search.coupling);
    sample(probe, open, middle);
    // What is new may cast doubt on the interval before.
    i = Math.max(open - 1, 1);
  }
}

function touched({ track, search }: Probe, place: number): number {
  const end = touchingInterval(track, place, search.maxima ? 0 : Math.PI);
  return end > 0 && track.frequency(end) - track.frequency(end - 1) > NARROWEST ? end : 0;
}

function isSettled({ track, step, prepared }: Probe, i: number): boolean {
  const width = track.frequency(i) - track.frequency(i - 1);
  if (width < NARROWEST) return true;
  const miscount = track.miscount(i);
  const beside = Math.max(track.miscount(i - 1), track.miscount(i + 1)) > Math.PI;
  if (!beside && track.isEven(i) && miscount < SURE && track.turn(i) > -LARGEST_FALL) return true;
  if (width > ONE_STEP * step) return false;
  const clearance = track.clearance(i);
  if (miscount > Math.PI) {
    return clearance > QUITE_CLEAR * Math.max(1, width / narrowestResonance(prepared, track.frequency(i)));
  }
  if (beside) return clearance > CLEAR_BESIDE;
  return clearance > (miscount < SURE ? CLEAR : CLEARER);
}

// Hz; by the losses at the wall of the widest bore alone, as wide as half its power: 2·Re Γ/Im Γ of the frequency.
function narrowestResonance({ widestDuct, cells }: PreparedColumn, frequency: number): number {
  return (2 * frequency * cell(cells, widestDuct)) / cell(cells, widestDuct + 1);
}

// How many grid steps on the next sample lies: more where the phase falls slowly.
function stride({ track }: Probe, j: number): number {
  const last = track.count - 1;
  if (last < 2 || !track.isEven(last)) return 1;
  const fall = (track.phase(0) - track.phase(last)) / j;
  if (2 * fall > USUAL_FALL) return 1;
  return 4 * fall > USUAL_FALL ? 2 : 4;
}
