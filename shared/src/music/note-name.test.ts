import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  fifthsFromC,
  midiNumber,
  noteOfMidi,
  printNoteName,
  readNoteName,
  spokenNote,
  transposeNote,
} from './note-name.ts';

const note = (text: string) => {
  const name = readNoteName(text);
  if (name === null) throw new Error(text);
  return name;
};

describe('a note name', () => {
  it.each([
    // MIDI 1.0 detailed specification, key number table.
    ['C4', 60],
    ['A4', 69],
    ['F#5', 78],
    ['Bb4', 70],
    ['Cb5', 71],
    ['B#3', 60],
    ['C-1', 0],
  ])('%s is key %i', (text, midi) => {
    expect(midiNumber(note(text))).toBe(midi);
  });

  it.each(['', 'H4', 'D', 'D#', '5D', 'D##5', 'D5x'])('%s is no note', (text) => {
    expect(readNoteName(text)).toBeNull();
  });

  it('reads the printed signs too', () => {
    expect(printNoteName(note('f\u266f5'))).toBe('F#5');
    expect(printNoteName(note('B\u266d4'))).toBe('Bb4');
  });

  it('survives printing and reading, in sharps and flats', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 127 }), fc.boolean(), (midi, flats) => {
        expect(midiNumber(note(printNoteName(noteOfMidi(midi, flats))))).toBe(midi);
      }),
    );
  });

  it('keeps its spelling when transposed', () => {
    expect(transposeNote('Bb4', 2)).toBe('C5');
    expect(transposeNote('Bb4', -2)).toBe('Ab4');
    expect(transposeNote('F#5', 2)).toBe('G#5');
  });

  it('has its place in the chain of fifths', () => {
    expect(['F', 'C', 'G', 'F#', 'Bb'].map((name) => fifthsFromC(note(`${name}4`)))).toEqual([
      -1, 0, 1, 6, -2,
    ]);
  });

  it('is spoken without signs', () => {
    expect(spokenNote('F#5')).toBe('F sharp 5');
    expect(spokenNote('Bb4')).toBe('B flat 4');
  });
});
