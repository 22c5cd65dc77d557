import type { FingeringPrediction, LadderRung } from '#shared/analysis/prediction.ts';

export interface PlacedRung {
  rung: LadderRung;
  /** Where the exact multiple stands, px from the top. */
  multipleY: number;
  /** Where the resonance stands: moved from its multiple by its cents. */
  y: number;
  /** Further off than the drawing shows: held at the end of its room, toward −1 below or 1 above. */
  held: -1 | 0 | 1;
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
/** Held where it would run into the next multiple's room, share of the spacing. */
const MOST_SHARE = 0.45;
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
      ...placeFrom(multipleY(index), spacing, rung.centsFromMultiple),
      share: Math.min(1, Math.max(0.02, 1 - rung.strength / NOTHING_AT_DB)),
    })),
    cutoffY: cutoffY(prediction, shown, { top, at: multipleY }),
  };
}

function placeFrom(multipleY: number, spacing: number, cents: number): Pick<PlacedRung, 'y' | 'held'> {
  const share = (SHARE_PER_100_CENTS * cents) / 100;
  if (Math.abs(share) <= MOST_SHARE) return { y: multipleY - spacing * share, held: 0 };
  const held = share > 0 ? 1 : -1;
  return { y: multipleY - spacing * MOST_SHARE * held, held };
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
