import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { midiNumber, readNoteName } from './note-name.ts';
import { transposeSpelled, transpositionBetween } from './transposition.ts';

const midi = (text: string) => {
  const note = readNoteName(text);
  if (note === null) throw new Error(text);
  return midiNumber(note);
};

const anyNote = fc
  .tuple(
    fc.constantFrom('A', 'B', 'C', 'D', 'E', 'F', 'G'),
    fc.constantFrom('', '#', 'b'),
    fc.integer({ min: 3, max: 5 }),
  )
  .map(([letter, sign, octave]) => `${letter}${sign}${octave}`);

describe('transposing with the spelling of the interval', () => {
  it.each([
    // The scale of D major, note by note, in the keys that any primer of music writes them (common practice).
    ['D5', 'F5', 'F#5', 'A5'],
    ['D5', 'F5', 'Bb5', 'Db6'],
    ['D5', 'Eb5', 'C#6', 'D6'],
    ['D5', 'F#5', 'C#6', 'E#6'],
    ['D5', 'C5', 'F#5', 'E5'],
    ['C4', 'Bb3', 'E4', 'D4'],
    ['D5', 'D4', 'C#6', 'C#5'],
    ['C4', 'Cb4', 'C5', 'Cb5'],
  ])('from %s to %s takes %s to %s', (from, to, note, expected) => {
    expect(transposeSpelled(note, transpositionBetween(from, to))).toEqual({
      note: expected,
      isSpelled: true,
    });
  });

  it('writes by its neighbour what would need two signs, and says so', () => {
    expect(transposeSpelled('F#5', transpositionBetween('D5', 'D#5'))).toEqual({
      note: 'G5',
      isSpelled: false,
    });
  });

  it('moves every note by the same number of keys', () => {
    fc.assert(
      fc.property(anyNote, anyNote, anyNote, (from, to, note) => {
        const moved = transposeSpelled(note, transpositionBetween(from, to));
        expect(midi(moved.note) - midi(note)).toBe(midi(to) - midi(from));
      }),
    );
  });

  it('leads from one note to the other, and back', () => {
    fc.assert(
      fc.property(anyNote, anyNote, (from, to) => {
        expect(transposeSpelled(from, transpositionBetween(from, to)).note).toBe(to);
        expect(transposeSpelled(to, transpositionBetween(to, from)).note).toBe(from);
      }),
    );
  });

  it('refuses what is not a note', () => {
    expect(() => transpositionBetween('H4', 'C4')).toThrow('H4 is not a note.');
  });
});
