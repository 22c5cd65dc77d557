import { coupledImpedance } from '#shared/acoustics/response/input-impedance.ts';
import {
  tuneColumn,
  type FingeringBranches,
  type PreparedColumn,
} from '#shared/acoustics/response/prepared-column.ts';

/** Input impedance in units of the input's own, all openings coupled. */
export function impedanceAt(
  prepared: PreparedColumn,
  fingering: FingeringBranches,
  frequency: number,
): { re: number; im: number } {
  tuneColumn(prepared, frequency, true);
  const at = coupledImpedance(prepared, fingering);
  const { cells, inputImpedance } = prepared;
  return { re: (cells[at] ?? NaN) / inputImpedance, im: (cells[at + 1] ?? NaN) / inputImpedance };
}

/** Impedances between this and its inverse belong to weak resonances, of which nothing certain can be said. */
const WEAK = 3;

/**
 * Clear resonances by small steps and nothing clever: where a mass takes over from a spring while little stands against the
 * flow (minima), or a spring from a mass while much does (maxima). Each is the first frequency after it, Hz.
 */
export function slowResonances(
  prepared: PreparedColumn,
  fingering: FingeringBranches,
  { to, step }: { to: number; step: number },
): number[] {
  const found: number[] = [];
  const sign = prepared.playsMaxima ? -1 : 1;
  let before = { re: NaN, im: NaN };
  for (let frequency = step; frequency <= to; frequency += step) {
    const here = impedanceAt(prepared, fingering, frequency);
    const clear = prepared.playsMaxima
      ? Math.min(Math.hypot(before.re, before.im), Math.hypot(here.re, here.im)) > WEAK
      : Math.max(before.re, here.re) < 1 / WEAK;
    if (clear && sign * before.im < 0 && sign * here.im >= 0) found.push(frequency);
    before = here;
  }
  return found;
}
