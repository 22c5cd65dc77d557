import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { conflictRows, firstChoices, mergedDocument, type Side } from './conflict-rows.ts';

const start = whistleDocument();

const withHole = (document: DesignDocument, index: number, diameterMm: number): DesignDocument => ({
  ...document,
  holes: document.holes.with(index, { ...document.holes[index]!, diameterMm }),
});

const withoutHole = (document: DesignDocument, id: string): DesignDocument => ({
  ...document,
  holes: document.holes.filter((hole) => hole.id !== id),
  fingerings: document.fingerings.map((fingering) => ({
    ...fingering,
    covered: fingering.covered.filter((hole) => hole !== id),
  })),
});

describe('conflict rows', () => {
  it('say who changed what since both began', () => {
    const mine = withHole(withHole(start, 3, 7), 0, 6.8);
    const theirs = withHole(withHole(start, 3, 6.8), 1, 8.2);
    const rows = conflictRows(mine, theirs, start);
    expect(rows.map((row) => [row.key, row.changedBy, row.ancestor, row.before, row.after])).toEqual([
      ['holes.h1.diameterMm', 'me', 7, 6.8, 7],
      ['holes.h2.diameterMm', 'them', 8.5, 8.5, 8.2],
      ['holes.h4.diameterMm', 'both', 6.5, 7, 6.8],
    ]);
    expect(firstChoices(rows)).toEqual({
      'holes.h1.diameterMm': 'mine',
      'holes.h2.diameterMm': 'theirs',
      'holes.h4.diameterMm': undefined,
    });
  });

  it('see both hands where one took a hole away that the other changed', () => {
    const rows = conflictRows(withHole(start, 3, 7), withoutHole(start, 'h4'), start);
    const hole = rows.find((row) => row.key.startsWith('holes.h4'));
    expect(hole?.changedBy).toBe('both');
  });

  it('merge to mine or theirs when one side is chosen throughout', () => {
    const holeSizes = fc.array(fc.tuple(fc.nat(5), fc.integer({ min: 30, max: 90 })), { maxLength: 6 });
    const edit = (sizes: [number, number][]) =>
      sizes.reduce((document, [index, tenths]) => withHole(document, index, tenths / 10), start);
    fc.assert(
      fc.property(holeSizes, holeSizes, fc.boolean(), (a, b, removes) => {
        const mine = edit(a);
        const theirs = removes ? withoutHole(edit(b), 'h2') : edit(b);
        const rows = conflictRows(mine, theirs, start);
        const all = (side: Side) => Object.fromEntries(rows.map((row) => [row.key, side]));
        expect(mergedDocument(mine, rows, all('mine'))).toEqual(mine);
        expect(mergedDocument(mine, rows, all('theirs'))).toEqual(theirs);
      }),
    );
  });
});
