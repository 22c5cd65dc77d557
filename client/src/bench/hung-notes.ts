import type { DesignPrediction, FingeringPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument, Fingering, ToneHole } from '#shared/document/design-document.ts';
import { holeMark } from './fingering-marks.ts';

/** A note and where it hangs: under the hole that lets the air out first, in the row of its register or among the cross fingerings. */
export interface HungNote {
  fingering: Fingering;
  /** null until it is worked out, and where it cannot be. */
  predicted: FingeringPrediction | null;
  /** Hole id, or `foot`. */
  column: string;
  row: 'register' | 'cross';
}

export function hungNotes(document: DesignDocument, prediction: DesignPrediction | null): HungNote[] {
  const predicted = new Map(prediction?.fingerings.map((fingering) => [fingering.id, fingering]));
  const reachable = document.holes
    .filter((hole) => hole.cover !== 'vent' && hole.cover !== 'lid')
    .sort((a, b) => a.positionMm - b.positionMm);
  const taken = new Set<string>();
  return document.fingerings.map((fingering) => {
    const place = hangingPlace(fingering, reachable);
    const cell = `${place.column} ${fingering.register}`;
    // A second note for one place would hide the first: it hangs with the cross fingerings.
    const row = place.row === 'register' && !taken.has(cell) ? 'register' : 'cross';
    if (row === 'register') taken.add(cell);
    return { fingering, predicted: predicted.get(fingering.id) ?? null, column: place.column, row };
  });
}

function hangingPlace(
  fingering: Fingering,
  holes: readonly ToneHole[],
): { column: string; row: HungNote['row'] } {
  const marks = holes.map((hole) => holeMark(fingering, hole));
  const first = marks.findIndex((mark) => mark !== 'covered');
  const from = isOctaveVent(fingering, holes[first], marks.slice(first)) ? first + 1 : 0;
  const vent = marks.findIndex((mark, index) => index >= from && mark !== 'covered');
  const hole = holes[vent];
  if (hole === undefined) return { column: 'foot', row: 'register' };
  const isCross = marks[vent] === 'half' || marks.slice(vent).includes('covered');
  return { column: hole.id, row: isCross ? 'cross' : 'register' };
}

/** In the upper registers a thumb hole, or the topmost hole, opened over covered ones only helps the octave. */
function isOctaveVent(fingering: Fingering, hole: ToneHole | undefined, marks: readonly string[]): boolean {
  if (hole === undefined || fingering.register < 2) return false;
  return marks[1] === 'covered' && (hole.cover === 'thumb' || fingering.covered.length + 1 === marks.length);
}

/** Notes of one column, lowest register first. */
export function notesOfColumn(notes: readonly HungNote[], column: string): HungNote[] {
  return notes
    .filter((note) => note.column === column)
    .sort((a, b) => a.fingering.register - b.fingering.register);
}
