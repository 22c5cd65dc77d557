import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { documentFaults } from '#shared/document/document-faults.ts';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import {
  addHole,
  removeHole,
  roomiestPosition,
  snapPosition,
  widestHoleMm,
  withUndercut,
} from './hole-edits.ts';

const document = whistleDocument();
const coveredIn = (changed: typeof document, note: string) =>
  changed.fingerings.find((fingering) => fingering.note === note)?.covered;

describe('a new hole', () => {
  it('is covered where the next hole toward the foot is, so that the scale stays one', () => {
    const changed = addHole(document, 175, 6);
    const added = changed.holes.find((hole) => !document.holes.some((old) => old.id === hole.id));
    expect(added?.positionMm).toBe(175);
    expect(coveredIn(changed, 'F#5')).toContain(added?.id);
    expect(coveredIn(changed, 'A5')).not.toContain(added?.id);
  });

  it('nearest the foot is covered only where everything is', () => {
    const changed = addHole(document, 245, 6);
    expect(coveredIn(changed, 'D5')).toHaveLength(7);
    expect(coveredIn(changed, 'E5')).toHaveLength(5);
  });

  it('goes again and leaves the design as it was', () => {
    const changed = addHole(document, 245, 6);
    const id = changed.holes.at(-1)!.id;
    expect(removeHole(changed, id)).toEqual(document);
  });

  it('is offered where there is room', () => {
    const changed = addHole(document, roomiestPosition(document), 6);
    expect(documentFaults(changed)).toEqual([]);
  });
});

describe('snapPosition', () => {
  it('lies on tenths from the foot and inside the bore', () => {
    fc.assert(
      fc.property(fc.double({ min: -100, max: 500, noNaN: true }), (mm) => {
        const snapped = snapPosition(document, mm);
        const tenths = (265 - snapped) * 10;
        expect(tenths).toBeCloseTo(Math.round(tenths), 5);
        expect(snapped).toBeGreaterThan(0);
        expect(snapped).toBeLessThan(265);
      }),
    );
  });
});

describe('sizes of a hole', () => {
  it('are no wider than the bore allows', () => {
    // 0.95 of 12.7 is 12.065.
    expect(widestHoleMm(document, 100)).toBe(12);
  });

  it('undercut to the hole itself is no undercut', () => {
    const cut = withUndercut(document, 'h1', 8);
    expect(cut.holes[0]?.undercut).toEqual({ innerDiameterMm: 8, depthMm: 1.2 });
    expect(withUndercut(cut, 'h1', 7).holes[0]?.undercut).toBeNull();
  });
});
