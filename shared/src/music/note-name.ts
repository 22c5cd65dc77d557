/** A note as it is spelled: F#5 and Gb5 are two notes, though equal temperament sounds them alike. */
export interface NoteName {
  letter: Letter;
  accidental: '' | '#' | 'b';
  octave: number;
}

type Letter = 'C' | 'D' | 'E' | 'F' | 'G' | 'A' | 'B';

const SEMITONES: Record<Letter, number> = { C: 0, D: 2, E: 4, F: 5, G: 7, A: 9, B: 11 };
const SHARP_NAMES = ['C', 'C#', 'D', 'D#', 'E', 'F', 'F#', 'G', 'G#', 'A', 'A#', 'B'] as const;
const FLAT_NAMES = ['C', 'Db', 'D', 'Eb', 'E', 'F', 'Gb', 'G', 'Ab', 'A', 'Bb', 'B'] as const;
const NOTE = /^([A-Ga-g])(#|b|\u266f|\u266d)?(-?\d)$/;

/** Reads `D5`, `F#5`, `Bb4` (also with the printed signs); null when it is not a note. */
export function readNoteName(text: string): NoteName | null {
  const match = NOTE.exec(text.trim());
  if (match === null) return null;
  const [, letter = '', sign = '', octave = ''] = match;
  const accidental = sign === '#' || sign === '\u266f' ? '#' : sign === 'b' || sign === '\u266d' ? 'b' : '';
  return { letter: letter.toUpperCase() as Letter, accidental, octave: Number(octave) };
}

export function printNoteName({ letter, accidental, octave }: NoteName): string {
  return `${letter}${accidental}${octave}`;
}

const ALTERATION = { '': 0, '#': 1, b: -1 } as const;

/** Number of the key on a keyboard, A4 = 69 (MIDI 1.0 numbering). */
export function midiNumber({ letter, accidental, octave }: NoteName): number {
  return 12 * (octave + 1) + SEMITONES[letter] + ALTERATION[accidental];
}

/** Spelling of a keyboard number, with sharps unless flats are asked for. */
export function noteOfMidi(midi: number, preferFlats = false): NoteName {
  const names = preferFlats ? FLAT_NAMES : SHARP_NAMES;
  const name = names[((midi % 12) + 12) % 12] ?? 'C';
  return {
    letter: name.charAt(0) as Letter,
    accidental: name.charAt(1) as NoteName['accidental'],
    octave: Math.floor(midi / 12) - 1,
  };
}

/** A note moved by semitones, in the spelling asked for. */
export function transposeNote(text: string, semitones: number, preferFlats = text.includes('b')): string {
  const note = readNoteName(text);
  if (note === null) throw new RangeError(`${text} is not a note.`);
  return printNoteName(noteOfMidi(midiNumber(note) + semitones, preferFlats));
}

const FIFTHS: Record<Letter, number> = { F: -1, C: 0, G: 1, D: 2, A: 3, E: 4, B: 5 };

/** Place of a note in the chain of fifths, C = 0, G = 1, F = −1, F# = 6, Bb = −2. */
export function fifthsFromC({ letter, accidental }: Pick<NoteName, 'letter' | 'accidental'>): number {
  return FIFTHS[letter] + 7 * ALTERATION[accidental];
}

/** Letters, or the syllables of fixed do. */
export type NoteWriting = 'letters' | 'syllables';

const SYLLABLES: Record<Letter, string> = {
  C: 'Do',
  D: 'Re',
  E: 'Mi',
  F: 'Fa',
  G: 'Sol',
  A: 'La',
  B: 'Si',
};

/** What a note's letter is called: `G`, or `Sol` where notes are written in syllables. */
export function letterName({ letter }: Pick<NoteName, 'letter'>, writing: NoteWriting): string {
  return writing === 'syllables' ? SYLLABLES[letter] : letter;
}

/** How a note is spoken: `F sharp 5`, `Fa sharp 5`. */
export function spokenNote(text: string, writing: NoteWriting = 'letters'): string {
  const note = readNoteName(text);
  if (note === null) return text;
  const accidental = { '': '', '#': ' sharp', b: ' flat' }[note.accidental];
  return `${letterName(note, writing)}${accidental} ${note.octave}`;
}
