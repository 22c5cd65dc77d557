import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import { MM_PER_INCH } from '#shared/lengths/drills.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { bandOf } from '../../bench/band-of.ts';
import { drillsFor } from '../../bench/drill-choice.ts';
import { changeHole, snapPosition, widestHoleMm } from '../../bench/hole-edits.ts';

/** A change of one size with its exact effect, worked out on the changed document. */
export interface Suggestion {
  kind: 'drill' | 'move';
  hole: string;
  /** New diameter, or how far footward (negative: toward the mouth end), mm. */
  mm: number;
  change: (document: DesignDocument) => DesignDocument;
  /** Cents before and after of every note that moves by half a cent or more, the chosen note first. */
  effects: { fingering: string; note: string; before: number; after: number }[];
  /** The most that any other note moves, cents. */
  othersMoveCents: number;
}

export type Predict = (document: DesignDocument) => Promise<DesignPrediction | null>;

interface Request {
  document: DesignDocument;
  prediction: DesignPrediction;
  hole: ToneHole;
  fingering: string;
  unit: LengthUnit;
  /** Half width of the band by register, cents. */
  bandCents: readonly number[];
  predict: Predict;
}

/** Sizes tried on either side of the present one. */
const TRIED = 7;
const MOVES_MM: Record<LengthUnit, number[]> = {
  mm: [-3, -2, -1, -0.5, 0.5, 1, 2, 3],
  inch: [-0.1, -0.05, -0.03, -0.01, 0.01, 0.03, 0.05, 0.1].map((inches) => inches * MM_PER_INCH),
};
/** A change that helps less than this is not worth a drill, cents. */
const LEAST_GAIN_CENTS = 0.5;
/** Notes that move less than this are summed up in one figure, cents. */
const LEAST_MOVE_CENTS = 0.6;

/**
 * The drill, and apart from it the move, that brings the chosen note nearest to true without spoiling the others.
 *
 * Both are judged by the engine itself on the changed document, never by the slope: a drill's step is too wide for that.
 */
export async function findSuggestions(request: Request): Promise<Suggestion[]> {
  const { document, hole, unit } = request;
  const widest = widestHoleMm(document, hole.positionMm);
  const drills = drillsFor(unit)
    .map((drill) => drill.diameterMm)
    .filter((diameterMm) => diameterMm <= widest && Math.abs(diameterMm - hole.diameterMm) > 1e-3)
    .filter((diameterMm) => unit === 'inch' || Math.abs(diameterMm * 10 - Math.round(diameterMm * 10)) < 1e-6)
    .sort((a, b) => Math.abs(a - hole.diameterMm) - Math.abs(b - hole.diameterMm))
    .slice(0, 2 * TRIED);
  const byDrill = await best(request, drills, (diameterMm) => ({
    kind: 'drill',
    mm: diameterMm,
    change: (before) => changeHole(before, hole.id, { diameterMm }),
  }));
  const byMove = await best(request, MOVES_MM[unit], (mm) => ({
    kind: 'move',
    mm,
    change: (before) =>
      changeHole(before, hole.id, { positionMm: snapPosition(before, hole.positionMm + mm) }),
  }));
  return [byDrill, byMove]
    .filter((suggestion) => suggestion !== null)
    .sort((a, b) => remaining(a) - remaining(b));
}

const remaining = (suggestion: Suggestion) => Math.abs(suggestion.effects[0]?.after ?? Infinity);

type Trial = Pick<Suggestion, 'kind' | 'mm' | 'change'>;

async function best(
  request: Request,
  values: readonly number[],
  trialOf: (value: number) => Trial,
): Promise<Suggestion | null> {
  const { document, prediction, hole, fingering, bandCents, predict } = request;
  let found: { cost: number; suggestion: Suggestion } | null = null;
  const present = costOf(prediction, fingering);
  for (const value of values) {
    const trial = trialOf(value);
    const answer = await predict(trial.change(document));
    if (answer === null || spoilsAnother(prediction, answer, { fingering, bandCents })) continue;
    const cost = costOf(answer, fingering);
    if (cost < (found?.cost ?? present - LEAST_GAIN_CENTS)) {
      found = { cost, suggestion: { ...trial, hole: hole.id, ...effectsOf(prediction, answer, fingering) } };
    }
  }
  return found?.suggestion ?? null;
}

/** True where a note that hung within its band would leave it: mending one is not worth that. */
function spoilsAnother(
  before: DesignPrediction,
  after: DesignPrediction,
  { fingering, bandCents }: Pick<Request, 'fingering' | 'bandCents'>,
): boolean {
  return before.fingerings.some(({ id, register, centsFromScale }) => {
    const band = bandOf(bandCents, register);
    const isWithin = centsFromScale !== null && Math.abs(centsFromScale) <= band;
    if (id === fingering || !isWithin) return false;
    const now = after.fingerings.find((other) => other.id === id)?.centsFromScale ?? null;
    return now === null || Math.abs(now) > band;
  });
}

/** The chosen note counts in full, each other by half, so that mending one does not spoil its neighbours. */
function costOf(prediction: DesignPrediction, fingering: string): number {
  return prediction.fingerings.reduce((sum, { id, centsFromScale }) => {
    const size = Math.abs(centsFromScale ?? 50);
    return sum + (id === fingering ? size : size / 2);
  }, 0);
}

export function effectsOf(
  before: DesignPrediction,
  after: DesignPrediction,
  chosen: string,
): Pick<Suggestion, 'effects' | 'othersMoveCents'> {
  const moves = before.fingerings.flatMap(({ id, note, centsFromScale }) => {
    const now = after.fingerings.find((other) => other.id === id)?.centsFromScale;
    if (centsFromScale === null || now === null || now === undefined) return [];
    return [{ fingering: id, note, before: centsFromScale, after: now }];
  });
  const size = (move: (typeof moves)[number]) => Math.abs(move.after - move.before);
  const named = moves
    .filter((move) => move.fingering === chosen || size(move) >= LEAST_MOVE_CENTS)
    .sort((a, b) => Number(b.fingering === chosen) - Number(a.fingering === chosen) || size(b) - size(a))
    .slice(0, 3);
  const others = moves.filter((move) => !named.includes(move)).map(size);
  return { effects: named, othersMoveCents: Math.max(0, ...others) };
}
