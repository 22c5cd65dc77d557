import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { addFingering, duplicateFingering, removeFingering, tapped } from './fingering-edits.ts';

const document = whistleDocument();
const [lowest] = document.fingerings;
const hole = document.holes[5]!;

describe('a tap on a hole', () => {
  it('half covers, opens and covers again', () => {
    const half = tapped(lowest!, hole);
    expect(half.half).toEqual([{ hole: 'h6', fraction: 0.5, from: 'side' }]);
    expect(half.covered).not.toContain('h6');
    const open = tapped(half, hole);
    expect(open.half).toEqual([]);
    expect(open.covered).not.toContain('h6');
    expect(tapped(open, hole).covered.toSorted()).toEqual(lowest!.covered.toSorted());
  });

  it('leaves a vent hole alone', () => {
    expect(tapped(lowest!, { ...hole, cover: 'vent' })).toBe(lowest);
  });
});

describe('the chart', () => {
  it('takes a new fingering after the chosen one, a semitone higher, fingered alike', () => {
    const { document: after, id } = addFingering(document, 'f-e5');
    expect(after.fingerings.map(({ note }) => note).slice(0, 4)).toEqual(['D5', 'E5', 'F5', 'F#5']);
    expect(after.fingerings[2]).toMatchObject({ id, covered: document.fingerings[1]!.covered });
  });

  it('starts with every hole covered', () => {
    const { document: after } = addFingering({ ...document, fingerings: [] }, null);
    expect(after.fingerings[0]).toMatchObject({ note: 'D4', covered: ['h1', 'h2', 'h3', 'h4', 'h5', 'h6'] });
  });

  it('never uses an id twice', () => {
    const twice = duplicateFingering(duplicateFingering(document, 'f-d5').document, 'f-d5').document;
    const without = addFingering(removeFingering(twice, 'f-e5'), 'f-d5').document;
    expect(new Set(without.fingerings.map(({ id }) => id)).size).toBe(without.fingerings.length);
  });
});
