import type { FingeringPrediction, ImpedanceCurve } from '#shared/analysis/prediction.ts';
import type { MouthEndKind } from '#shared/document/design-document.ts';

export interface CurvePoint {
  frequencyHz: number;
  /** Size of the input impedance, dB against the input's characteristic impedance. */
  decibels: number;
}

/** A pipe closed at the mouth end plays where the impedance is highest; all others where it is lowest. */
export const playsMaxima = (kind: MouthEndKind): boolean => kind === 'reed' || kind === 'ideal-closed';

export function curveInDecibels(curve: ImpedanceCurve): CurvePoint[] {
  return curve.points.map(({ frequencyHz, re, im }) => ({
    frequencyHz,
    decibels: 20 * Math.log10(Math.max(Math.hypot(re, im), 1e-9)),
  }));
}

export function decibelsAt(points: readonly CurvePoint[], frequencyHz: number): number | null {
  const after = points.findIndex((point) => point.frequencyHz >= frequencyHz);
  const [a, b] = [points[after - 1], points[after]];
  if (a === undefined || b === undefined) return null;
  const share = (frequencyHz - a.frequencyHz) / (b.frequencyHz - a.frequencyHz);
  return a.decibels + share * (b.decibels - a.decibels);
}

/** Half power, dB. */
const HALF_POWER = 10 * Math.log10(2);

/**
 * Width of a resonance between its half-power points, Hz; null where the curve turns before it gets there, as between two
 * resonances that run into each other.
 */
export function resonanceWidthHz(
  points: readonly CurvePoint[],
  frequencyHz: number,
  maxima: boolean,
): number | null {
  const sign = maxima ? -1 : 1;
  const middle = points.findIndex((point) => point.frequencyHz >= frequencyHz);
  const around = points.slice(Math.max(0, middle - 2), middle + 3).map(({ decibels }) => decibels * sign);
  if (middle < 0 || around.length === 0) return null;
  const level = Math.min(...around) + HALF_POWER;
  const upper = crossing(points, { from: middle, by: 1, level, sign });
  const lower = crossing(points, { from: middle, by: -1, level, sign });
  return upper === null || lower === null ? null : upper - lower;
}

interface CrossingSearch {
  from: number;
  by: 1 | -1;
  level: number;
  sign: number;
}

/** Where the curve first rises through a level on one side; null where it falls again before. */
function crossing(points: readonly CurvePoint[], { from, by, level, sign }: CrossingSearch): number | null {
  let highest = -Infinity;
  for (let index = from; points[index + by] !== undefined; index += by) {
    const [here, next] = [points[index], points[index + by]];
    if (here === undefined || next === undefined) return null;
    const [before, after] = [here.decibels * sign, next.decibels * sign];
    if (after >= level && before < level) {
      const share = (level - before) / (after - before);
      return here.frequencyHz + share * (next.frequencyHz - here.frequencyHz);
    }
    highest = Math.max(highest, before);
    if (after < highest - 0.5) return null;
  }
  return null;
}

/** Exact multiple that a mode is held against: 1, 2, 3… open, 1, 3, 5… closed at the mouth end. */
export const multipleOf = (mode: number, maxima: boolean): number => (maxima ? 2 * mode - 1 : mode);

/** Exact frequencies of the ladder's ghost rungs, from its first resonance. */
export function ghostsOf(
  predicted: FingeringPrediction,
  maxima: boolean,
): { mode: number; frequencyHz: number }[] {
  const first = predicted.ladder.find(({ mode }) => mode === 1);
  if (first === undefined) return [];
  return predicted.ladder.map(({ mode }) => ({
    mode,
    frequencyHz: first.frequencyHz * multipleOf(mode, maxima),
  }));
}
