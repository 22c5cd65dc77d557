import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import type { Comparison } from './comparison.ts';

export interface ComparedNote {
  note: string;
  cents: number | null;
  frequencyHz: number | null;
}

/** One fingering of both, or of one alone. */
export interface NoteRow {
  key: string;
  register: number;
  /** null where that instrument has no such fingering. */
  a: ComparedNote | null;
  b: ComparedNote | null;
  /** How far the second hangs from where the first does, each against its own scale; null without both figures. */
  movedCents: number | null;
}

export function noteRows({ a, b, match }: Comparison): NoteRow[] {
  const [ofA, ofB] = [noteFinder(a.prediction), noteFinder(b.prediction)];
  return match.fingerings.map((pair, index) => {
    const [noteA, noteB] = [ofA(pair.a), ofB(pair.b)];
    return {
      key: pair.b?.id ?? `alone-${index}`,
      register: (pair.b ?? pair.a)?.register ?? 1,
      a: noteA,
      b: noteB,
      movedCents: movedBetween(noteA, noteB),
    };
  });
}

function movedBetween(from: ComparedNote | null, to: ComparedNote | null): number | null {
  const [was, is] = [from?.cents ?? null, to?.cents ?? null];
  return was === null || is === null ? null : is - was;
}

function noteFinder(prediction: DesignPrediction | null) {
  const byId = new Map(prediction?.fingerings.map((fingering) => [fingering.id, fingering]));
  return (fingering: { id: string; note: string } | null): ComparedNote | null => {
    if (fingering === null) return null;
    const predicted = byId.get(fingering.id);
    return {
      note: fingering.note,
      cents: predicted?.centsFromScale ?? null,
      frequencyHz: predicted?.frequencyHz ?? null,
    };
  };
}

/** Where each note of the second hangs in the first, by its id in the second: the dashed bobs. */
export function ghostCents({ a, match }: Comparison): ReadonlyMap<string, number> {
  const ofA = noteFinder(a.prediction);
  return new Map(
    match.fingerings.flatMap((pair): [string, number][] => {
      const cents = ofA(pair.a)?.cents ?? null;
      return pair.b === null || cents === null ? [] : [[pair.b.id, cents]];
    }),
  );
}
