import { cell } from '../complex/cells.ts';
import { phaseCrossing } from './phase-crossing.ts';
import { reflectionPhase, scanPhases, type Probe, type ResonanceSearch } from './phase-scan.ts';
import { phaseSample } from './phase-track.ts';
import { writeRoundTrip } from './round-trip.ts';
import { tuneFingering, type FingeringBranches, type PreparedColumn } from './prepared-column.ts';

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

/**
 * Resonances of every fingering, none missed and none twice; see `scanPhases`.
 *
 * Frequencies are right to some 1e-8 of themselves. Fewer come back than asked for where the rest have leaked away above the cutoff.
 *
 * @param prepared - the column
 * @param fingerings - branches of each fingering
 * @param search - what to look for
 * @returns for each fingering its resonances from the lowest, at most `count`
 */
export function findResonances(
  prepared: PreparedColumn,
  fingerings: readonly FingeringBranches[],
  search: ResonanceSearch,
): Resonance[][] {
  // Two notes of different registers often share a fingering.
  const probes = scanPhases(prepared, [...new Set(fingerings)], search);
  const found = new Map(probes.map((probe) => [probe.fingering, crossings(probe)]));
  return fingerings.map((fingering) => found.get(fingering) ?? []);
}

const fresh = phaseSample();

// One resonance for every time that the phase falls through a level. Where the holes leak it may rise again and fall through
// the same level once more, which is another resonance.
function crossings(probe: Probe): Resonance[] {
  const { track, search, prepared, fingering } = probe;
  const found: Resonance[] = [];
  const sampleAt = (frequency: number) => {
    tuneFingering(prepared, fingering, frequency, search.coupling);
    fresh.phase = reflectionPhase(prepared, fingering, search.coupling);
    writeRoundTrip(prepared, search.maxima, fresh.roundTrip);
    return fresh;
  };
  for (let i = 1; i < track.count; i += 1) {
    let level = levelBelow(track.phase(i - 1), search.maxima);
    for (; track.phase(i) <= level && found.length < search.count; level -= 2 * Math.PI) {
      const frequency = phaseCrossing(track, i, level, sampleAt);
      const magnitude = realImpedance(prepared, search.maxima);
      found.push({
        order: found.length + 1,
        frequency,
        magnitude,
        weak: magnitude > 1 / 3 && magnitude < 3,
      });
    }
  }
  return found;
}

// The next level strictly under a phase: whole turns for maxima, odd halves of one for minima. Where a sample lies on a level
// the division alone may round to either side of it, and the same resonance would be found twice or not at all.
function levelBelow(phase: number, maxima: boolean): number {
  const level = (turns: number) => (maxima ? 0 : Math.PI) + 2 * Math.PI * turns;
  const turns = Math.ceil((phase - level(0)) / (2 * Math.PI)) - 1;
  if (level(turns) >= phase) return level(turns - 1);
  return level(turns + 1) < phase ? level(turns + 1) : level(turns);
}

// The impedance at the root: its imaginary part is 0 there, and a step short of it only the real one is right.
function realImpedance(prepared: PreparedColumn, maxima: boolean): number {
  const { cells, system, inputImpedance } = prepared;
  const re = cell(cells, system.impedance) / inputImpedance;
  const im = cell(cells, system.impedance + 1) / inputImpedance;
  return maxima ? (re * re + im * im) / re : re;
}
