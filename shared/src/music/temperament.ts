import type { Pitch, Temperament } from '../document/design-document.ts';
import { fifthsFromC, midiNumber, readNoteName, type NoteName } from './note-name.ts';
import { frequencyAbove } from './cents.ts';

const A4: NoteName = { letter: 'A', accidental: '', octave: 4 };

/** A pure fifth, 3:2, cents. */
const PURE_FIFTH = 1200 * Math.log2(3 / 2);

/** The fifth of which four make a pure major third and two octaves, cents. P. Aaron (1523), in Barbour, Tuning and Temperament (1951), ch. 3. */
const QUARTER_COMMA_FIFTH = (1200 * Math.log2(5)) / 4;

/**
 * Five-limit ratios of the twelve semitones from the tonic.
 * Helmholtz and Ellis, On the Sensations of Tone (1885), ch. XVI and appendix XX (the usual chromatic scale of just intonation).
 */
const JUST_RATIOS = [
  1,
  16 / 15,
  9 / 8,
  6 / 5,
  5 / 4,
  4 / 3,
  45 / 32,
  3 / 2,
  8 / 5,
  5 / 3,
  9 / 5,
  15 / 8,
] as const;

const inOctave = (value: number, size: number) => ((value % size) + size) % size;

/** Signed difference of a tempered note from equal temperament on the same tonic, cents. */
type Deviation = (note: NoteName, tonic: NoteName, pitch: Pitch) => number;

function chainOfFifths(fifth: number): Deviation {
  // Spelling decides: in a chain of fifths F# and Gb are different notes.
  return (note, tonic) => (fifthsFromC(note) - fifthsFromC(tonic)) * (fifth - 700);
}

const semitoneFromTonic = (note: NoteName, tonic: NoteName) =>
  inOctave(midiNumber(note) - midiNumber(tonic), 12);

const DEVIATIONS: Record<Temperament, Deviation> = {
  equal: () => 0,
  pythagorean: chainOfFifths(PURE_FIFTH),
  'quarter-comma-meantone': chainOfFifths(QUARTER_COMMA_FIFTH),
  just: (note, tonic) => {
    const semitone = semitoneFromTonic(note, tonic);
    return 1200 * Math.log2(JUST_RATIOS[semitone] ?? 1) - 100 * semitone;
  },
  own: (note, tonic, pitch) => pitch.centsOffsets?.[semitoneFromTonic(note, tonic)] ?? 0,
};

/**
 * Frequency that the scale asks for, Hz.
 *
 * The A of the scale sounds exactly at `a4Hz`, whatever the temperament; own cents are taken as typed, from equal temperament.
 *
 * @throws RangeError if the text is not a note or the tonic is not a note name
 */
export function noteFrequencyHz(text: string, pitch: Pitch): number {
  const note = readNoteName(text);
  const tonic = readNoteName(`${pitch.tonic}4`);
  if (note === null) throw new RangeError(`${text} is not a note.`);
  if (tonic === null) throw new RangeError(`${pitch.tonic} is not a note.`);
  const deviation = DEVIATIONS[pitch.temperament];
  const ofA = pitch.temperament === 'own' ? 0 : deviation(A4, tonic, pitch);
  const cents = 100 * (midiNumber(note) - midiNumber(A4)) + deviation(note, tonic, pitch) - ofA;
  return frequencyAbove(pitch.a4Hz, cents);
}
