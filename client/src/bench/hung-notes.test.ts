import { describe, expect, it } from 'vitest';
import type { Fingering } from '#shared/document/design-document.ts';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { hungNotes } from './hung-notes.ts';

const base = whistleDocument();
const fingering = (covered: string[], changes: Partial<Fingering> = {}): Fingering => ({
  ...base.fingerings[0]!,
  covered,
  ...changes,
});
const hang = (...fingerings: Fingering[]) =>
  hungNotes(
    { ...base, fingerings: fingerings.map((each, index) => ({ ...each, id: `f${index}` })) },
    null,
  ).map(({ column, row }) => `${column} ${row}`);

describe('where a note hangs', () => {
  it.each([
    ['everything covered', fingering(['h1', 'h2', 'h3', 'h4', 'h5', 'h6']), 'foot register'],
    ['three covered', fingering(['h1', 'h2', 'h3']), 'h4 register'],
    ['nothing covered', fingering([]), 'h1 register'],
    ['a fork', fingering(['h1', 'h3', 'h4']), 'h2 cross'],
    [
      'a half-covered hole',
      fingering(['h1', 'h2'], { half: [{ hole: 'h3', fraction: 0.5, from: 'side' }] }),
      'h3 cross',
    ],
    [
      'the octave vented at the top',
      fingering(['h2', 'h3', 'h4', 'h5', 'h6'], { register: 2 }),
      'foot register',
    ],
    ['the same in the first register', fingering(['h2', 'h3', 'h4', 'h5', 'h6']), 'h1 cross'],
  ])('%s', (_, each, place) => {
    expect(hang(each)).toEqual([place]);
  });

  it('among the cross fingerings when its place is taken', () => {
    expect(hang(fingering(['h1']), fingering(['h1']))).toEqual(['h2 register', 'h2 cross']);
  });

  it('beside its octave, which has a row of its own', () => {
    expect(hang(fingering(['h1']), fingering(['h1'], { register: 2 }))).toEqual([
      'h2 register',
      'h2 register',
    ]);
  });
});
