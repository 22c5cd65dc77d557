import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { keyChoices } from './key-choices.ts';

describe('keys to choose from', () => {
  const choices = keyChoices(whistleDocument());
  it('reach an octave up and down from the lowest note, black keys by both names', () => {
    expect(choices[0]).toEqual({ note: 'D6', label: 'D6, an octave up' });
    expect(choices.at(-1)).toEqual({ note: 'D4', label: 'D4, an octave down' });
    expect(choices.map(({ label }) => label)).toEqual(
      expect.arrayContaining([
        'D5, as it is',
        'F5, 3 semitones up',
        'Eb5, 1 semitone up',
        'D#5, 1 semitone up',
      ]),
    );
    expect(new Set(choices.map(({ note }) => note)).size).toBe(choices.length);
  });
});
