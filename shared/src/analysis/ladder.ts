import type { Resonance } from '../acoustics/response/resonances.ts';
import { centsBetween } from '../music/cents.ts';
import type { LadderRung } from './prediction.ts';

/** Exact multiples that a ladder is held against: 1:2:3… or 1:3:5…. */
export type LadderMultiples = 'all' | 'odd';

const multipleOf = (mode: number, multiples: LadderMultiples) => (multiples === 'all' ? mode : 2 * mode - 1);

/**
 * The resonances of a fingering as a ladder.
 *
 * Strength is the height of each resonance against the strongest, dB: of the impedance where it plays its maxima, of the
 * admittance where it plays its minima.
 */
export function ladderOf(
  resonances: readonly Resonance[],
  maxima: boolean,
  multiples: LadderMultiples,
): LadderRung[] {
  const heights = resonances.map((resonance) => resonanceHeight(resonance, maxima));
  const strongest = Math.max(...heights);
  const first = resonances[0]?.frequency ?? NaN;
  return resonances.map((resonance, i) => ({
    mode: resonance.order,
    frequencyHz: resonance.frequency,
    centsFromMultiple: centsBetween(resonance.frequency, first * multipleOf(resonance.order, multiples)),
    strength: 20 * Math.log10((heights[i] ?? NaN) / strongest),
    weak: resonance.weak,
  }));
}

/** Where nothing takes power a resonance has no end to its height; rounding hides all beyond this. */
const HIGHEST = 1e15;

/** How far a resonance stands out: |Z|/Z0 or its inverse, from 1e-15 to 1e15. */
export function resonanceHeight({ magnitude }: Resonance, maxima: boolean): number {
  const height = Math.abs(maxima ? magnitude : 1 / magnitude);
  return Math.min(Math.max(height, 1 / HIGHEST), HIGHEST);
}
