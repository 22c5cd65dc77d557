import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { transformDesign } from '../transform/transform-design.ts';
import type { DesignDocument } from './design-document.ts';
import { documentDifference } from './document-difference.ts';
import { matchDocuments, withIdsOf, type Pair } from './match-documents.ts';

const whistle = whistleDocument();

const names = (pairs: readonly Pair<{ id: string }>[]) =>
  pairs.map(({ a, b }) => [a?.id ?? null, b?.id ?? null]);

/** The same instrument as somebody else would have written it down. */
const renamed = (document: DesignDocument): DesignDocument => ({
  ...document,
  holes: document.holes.map((hole, index) => ({ ...hole, id: `x${9 - index}` })),
  fingerings: document.fingerings.map((fingering, index) => ({
    ...fingering,
    id: `n${index}`,
    covered: fingering.covered.map((id) => `x${10 - Number(id.slice(1))}`),
  })),
});

describe('matching two documents', () => {
  it('goes by ids where they agree', () => {
    const moved = {
      ...whistle,
      holes: whistle.holes.map((hole) => ({ ...hole, positionMm: hole.positionMm + 2 })),
    };
    const match = matchDocuments(whistle, moved);
    expect(match.isByPlace).toBe(false);
    expect(names(match.holes)).toEqual(whistle.holes.map(({ id }) => [id, id]));
    expect(names(match.fingerings)).toEqual(whistle.fingerings.map(({ id }) => [id, id]));
  });

  it('matches by place what has other names, and the fingerings by their notes', () => {
    const match = matchDocuments(whistle, renamed(whistle));
    expect(match.isByPlace).toBe(true);
    expect(names(match.holes)).toEqual(whistle.holes.map(({ id }, index) => [id, `x${9 - index}`]));
    expect(names(match.fingerings)).toEqual(whistle.fingerings.map(({ id }, index) => [id, `n${index}`]));
    expect(documentDifference(whistle, withIdsOf(renamed(whistle), match))).toEqual([]);
  });

  it('leaves a hole that has no fellow alone, wherever it lies', () => {
    const [first] = whistle.holes;
    const more = renamed(whistle);
    more.holes.push({ ...first!, id: 'extra', positionMm: 245 });
    expect(names(matchDocuments(whistle, more).holes).at(-1)).toEqual([null, 'extra']);
    expect(names(matchDocuments(more, whistle).holes).at(-1)).toEqual(['extra', null]);
  });

  it('never takes a thumb hole for a finger hole', () => {
    const other = renamed(whistle);
    other.holes[0] = { ...other.holes[0]!, cover: 'thumb' };
    expect(names(matchDocuments(whistle, other).holes)).toContainEqual([null, 'x9']);
  });

  it('knows the fingerings of a transposed chart again', () => {
    const outcome = transformDesign(whistle, {
      lowestNote: 'F5',
      a4Hz: 440,
      bore: 'scaled',
      holeSizes: 'exact',
      unit: 'mm',
    });
    if (outcome.status === 'refused') throw new Error('refused');
    const match = matchDocuments(whistle, outcome.document);
    expect(names(match.fingerings)).toEqual(whistle.fingerings.map(({ id }) => [id, id]));
  });

  it('knows a fingering in another key by its pattern', () => {
    const low = renamed(whistle);
    low.fingerings.forEach((fingering) => {
      fingering.note = fingering.note.replace(/\d/, (octave) => String(Number(octave) - 1));
    });
    const match = matchDocuments(whistle, low);
    expect(names(match.fingerings)).toEqual(whistle.fingerings.map(({ id }, index) => [id, `n${index}`]));
  });

  it('loses nothing and doubles nothing, whatever is left out on either side', () => {
    const some = fc.subarray(whistle.holes.map(({ id }) => id));
    const without = (document: DesignDocument, ids: readonly string[]) => ({
      ...document,
      holes: document.holes.filter((_, index) => ids.includes(`h${index + 1}`)),
      fingerings: document.fingerings.map((fingering) => ({ ...fingering, covered: [] })),
    });
    fc.assert(
      fc.property(some, some, fc.boolean(), (inA, inB, isRenamed) => {
        const a = without(whistle, inA);
        const b = without(isRenamed ? renamed(whistle) : whistle, inB);
        const { holes, fingerings } = matchDocuments(a, b);
        const ids = (pairs: readonly Pair<{ id: string }>[], side: 'a' | 'b') =>
          pairs.flatMap((pair) => pair[side]?.id ?? []).sort();
        expect(ids(holes, 'a')).toEqual(a.holes.map(({ id }) => id).sort());
        expect(ids(holes, 'b')).toEqual(b.holes.map(({ id }) => id).sort());
        expect(ids(fingerings, 'a')).toEqual(a.fingerings.map(({ id }) => id).sort());
        const aligned = withIdsOf(b, { holes, fingerings, isByPlace: false });
        expect(new Set(aligned.holes.map(({ id }) => id)).size).toBe(b.holes.length);
      }),
    );
  });
});
