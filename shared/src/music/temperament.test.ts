import { describe, expect, it } from 'vitest';
import type { Pitch } from '../document/design-document.ts';
import { centsBetween } from './cents.ts';
import { noteFrequencyHz } from './temperament.ts';

const pitch = (change: Partial<Pitch>): Pitch => ({
  a4Hz: 440,
  temperament: 'equal',
  tonic: 'C',
  centsOffsets: null,
  ...change,
});
const cents = (note: string, from: string, p: Pitch) =>
  centsBetween(noteFrequencyHz(note, p), noteFrequencyHz(from, p));

describe('the scale', () => {
  it.each([
    // ISO 16 (A4 = 440 Hz); frequencies of equal temperament to two decimals, any table of notes (common practice).
    ['A4', 440],
    ['C4', 261.63],
    ['D5', 587.33],
    ['F#5', 739.99],
    ['Bb4', 466.16],
  ])('equal temperament has %s at %f Hz', (note, hz) => {
    expect(noteFrequencyHz(note, pitch({}))).toBeCloseTo(hz, 2);
  });

  it.each([
    // J. M. Barbour, Tuning and Temperament (1951): Pythagorean and quarter-comma tables on C, cents.
    ['pythagorean', 'G4', 701.955],
    ['pythagorean', 'E4', 407.82],
    ['pythagorean', 'F#4', 611.73],
    ['pythagorean', 'Gb4', 588.27],
    ['quarter-comma-meantone', 'G4', 696.578],
    ['quarter-comma-meantone', 'E4', 386.314],
    ['quarter-comma-meantone', 'Eb4', 310.265],
    ['quarter-comma-meantone', 'G#4', 772.627],
    ['just', 'E4', 386.314],
    ['just', 'A4', 884.359],
    ['just', 'B4', 1088.269],
    ['just', 'F#4', 590.224],
  ] as const)('%s has %s at %f cents above C', (temperament, note, size) => {
    expect(cents(note, 'C4', pitch({ temperament }))).toBeCloseTo(size, 2);
  });

  it.each(['equal', 'just', 'pythagorean', 'quarter-comma-meantone'] as const)(
    '%s keeps A4 at the pitch standard',
    (temperament) => {
      for (const tonic of ['C', 'D', 'Bb', 'F#']) {
        expect(noteFrequencyHz('A4', pitch({ temperament, tonic, a4Hz: 415 }))).toBeCloseTo(415, 9);
      }
    },
  );

  it('takes own cents as typed, from the tonic upwards', () => {
    const own = pitch({
      temperament: 'own',
      tonic: 'D',
      centsOffsets: [0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11],
    });
    expect(centsBetween(noteFrequencyHz('E5', own), noteFrequencyHz('E5', pitch({})))).toBeCloseTo(2, 9);
    expect(centsBetween(noteFrequencyHz('C#5', own), noteFrequencyHz('C#5', pitch({})))).toBeCloseTo(11, 9);
  });

  it('refuses what is not a note', () => {
    expect(() => noteFrequencyHz('H5', pitch({}))).toThrow('H5 is not a note.');
  });
});
