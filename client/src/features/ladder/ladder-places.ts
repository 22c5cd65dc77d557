import type { FingeringPrediction, LadderRung } from '#shared/analysis/prediction.ts';

export interface PlacedRung {
  rung: LadderRung;
  /** Where the exact multiple stands, px from the top. */
  multipleY: number;
  /** Where the resonance stands: moved from its multiple by its cents. */
  y: number;
  /** Share of the full length: 1 at 0 dB, 0 at −30 dB. */
  share: number;
}

export interface LadderPlaces {
  rungs: PlacedRung[];
  /** Above this line the open holes leak; null with none, or beyond the top. */
  cutoffY: number | null;
}

/** A resonance is moved by this share of the spacing for every 100 cents. */
const SHARE_PER_100_CENTS = 0.42;
const NOTHING_AT_DB = -30;

interface LadderSize {
  top: number;
  bottom: number;
  /** Rungs at most. */
  most: number;
}

/** Ghost rungs evenly spaced, resonances moved off them: stretched where a mode lies wide of its multiple. */
export function ladderPlaces(
  prediction: FingeringPrediction,
  { top, bottom, most }: LadderSize,
): LadderPlaces {
  const shown = prediction.ladder.slice(0, most);
  const margin = 38;
  const spacing = (bottom - top - 2 * margin) / Math.max(1, shown.length - 1);
  const multipleY = (index: number) => bottom - margin - index * spacing;
  return {
    rungs: shown.map((rung, index) => ({
      rung,
      multipleY: multipleY(index),
      y: multipleY(index) - (spacing * SHARE_PER_100_CENTS * rung.centsFromMultiple) / 100,
      share: Math.min(1, Math.max(0.02, 1 - rung.strength / NOTHING_AT_DB)),
    })),
    cutoffY: cutoffY(prediction, shown, { top, at: multipleY }),
  };
}

/** The cutoff stands between the exact multiples it lies between. */
function cutoffY(
  { cutoffHz }: FingeringPrediction,
  rungs: readonly LadderRung[],
  { top, at }: { top: number; at: (index: number) => number },
): number | null {
  if (cutoffHz === null || rungs.length < 2) return null;
  const multiples = rungs.map((rung) => rung.frequencyHz / 2 ** (rung.centsFromMultiple / 1200));
  const above = multiples.findIndex((frequencyHz) => frequencyHz > cutoffHz);
  const upper = above <= 0 ? (above === 0 ? 1 : multiples.length - 1) : above;
  const high = multiples[upper] ?? 0;
  const low = multiples[upper - 1] ?? 0;
  if (high === low) return null;
  const y = at(upper - 1 + (cutoffHz - low) / (high - low));
  return y <= top ? null : y;
}
