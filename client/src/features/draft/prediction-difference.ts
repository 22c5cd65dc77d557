import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import { centsBetween } from '#shared/music/cents.ts';

/** How far apart two predictions of one document are at their furthest note, cents; infinite when one has a note more. */
export function largestDifferenceCents(a: DesignPrediction, b: DesignPrediction): number {
  if (a.fingerings.length !== b.fingerings.length) return Infinity;
  return a.fingerings.reduce((largest, fingering) => {
    const other = b.fingerings.find((entry) => entry.id === fingering.id);
    return Math.max(
      largest,
      other === undefined ? Infinity : apart(fingering.frequencyHz, other.frequencyHz),
    );
  }, 0);
}

function apart(a: number | null, b: number | null): number {
  if (a === null || b === null) return a === b ? 0 : Infinity;
  return Math.abs(centsBetween(a, b));
}
