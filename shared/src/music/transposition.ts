import { fifthsFromC, midiNumber, readNoteName, type NoteName } from './note-name.ts';

/** An interval with its spelling: D to F# and D to Gb are as many semitones, but not as many fifths. */
export interface Transposition {
  semitones: number;
  /** Steps along the chain of fifths. */
  fifths: number;
}

const LETTER_OF_FIFTHS = ['F', 'C', 'G', 'D', 'A', 'E', 'B'] as const;
const ACCIDENTAL_OF_TURN = { [-1]: 'b', 0: '', 1: '#' } as const;
/** Fb and B#: further out a note needs two signs. */
const FLATTEST = -8;
const SHARPEST = 12;
const FIFTHS_IN_OCTAVE = 12;

/**
 * The interval from one note to another.
 *
 * @throws RangeError if either is not a note
 */
export function transpositionBetween(from: string, to: string): Transposition {
  const [a, b] = [noteOf(from), noteOf(to)];
  return { semitones: midiNumber(b) - midiNumber(a), fifths: fifthsFromC(b) - fifthsFromC(a) };
}

export interface TransposedNote {
  note: string;
  /** False where the right spelling would need two signs and the note is written by its neighbour in name. */
  isSpelled: boolean;
}

/**
 * A note moved by an interval, spelled as the interval spells it: a third above F# is A#, not Bb.
 *
 * @throws RangeError if the text is not a note
 */
export function transposeSpelled(text: string, { semitones, fifths }: Transposition): TransposedNote {
  const note = noteOf(text);
  const wanted = fifthsFromC(note) + fifths;
  const written = withinOneSign(wanted);
  return { note: spelledNote(written, midiNumber(note) + semitones), isSpelled: written === wanted };
}

function withinOneSign(fifths: number): number {
  if (fifths > SHARPEST) return withinOneSign(fifths - FIFTHS_IN_OCTAVE);
  return fifths < FLATTEST ? withinOneSign(fifths + FIFTHS_IN_OCTAVE) : fifths;
}

function spelledNote(fifths: number, midi: number): string {
  const turn = Math.floor((fifths + 1) / LETTER_OF_FIFTHS.length) as keyof typeof ACCIDENTAL_OF_TURN;
  const letter = LETTER_OF_FIFTHS[fifths + 1 - turn * LETTER_OF_FIFTHS.length] ?? 'C';
  // The octave is that of the letter: Cb5 lies below C5, and yet bears its figure.
  return `${letter}${ACCIDENTAL_OF_TURN[turn]}${Math.floor((midi - turn) / 12) - 1}`;
}

function noteOf(text: string): NoteName {
  const note = readNoteName(text);
  if (note === null) throw new RangeError(`${text} is not a note.`);
  return note;
}
