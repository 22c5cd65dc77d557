import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { MouthEnd } from '#shared/document/design-document.ts';
import { documentFaults } from '#shared/document/document-faults.ts';
import { boreEnds, diameterAt, fromFootMm } from '#shared/document/profile.ts';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { usualMouthEnd } from './usual-mouth-end.ts';
import { moveFoot, moveMouthEnd, moveStopper, trimFoot, withMouthEnd } from './end-edits.ts';

const whistle = whistleDocument();
const longerWindow: MouthEnd = {
  kind: 'window',
  widthMm: 9,
  lengthMm: 5.2,
  wallMm: 1.2,
  rampDeg: 20,
  correctionScale: 1,
};
const coned = whistleDocument({
  bore: {
    stations: [
      { positionMm: -4.4, diameterMm: 12.7 },
      { positionMm: 90, diameterMm: 12.7 },
      { positionMm: 265, diameterMm: 11 },
    ],
  },
});

describe('the mouth end', () => {
  it('takes the first station of bore and outside along when the window is cut longer', () => {
    const longer = withMouthEnd(whistle, longerWindow);
    expect(longer.bore.stations[0]).toEqual({ positionMm: -5.2, diameterMm: 12.7 });
    expect(longer.outside.stations[0]).toEqual({ positionMm: -5.2, diameterMm: 17.5 });
    expect(documentFaults(longer)).toEqual([]);
  });

  it('leaves an outside alone that covers the block behind the window', () => {
    const beaked = {
      ...whistle,
      outside: { stations: [{ positionMm: -30, diameterMm: 17.5 }, ...whistle.outside.stations.slice(1)] },
    };
    const longer = withMouthEnd(beaked, longerWindow);
    expect(longer.outside.stations[0]?.positionMm).toBe(-30);
  });

  it.each(['window', 'embouchure', 'rim', 'reed', 'ideal-open', 'ideal-closed'] as const)(
    'of kind %s makes a document that can be built, from any other',
    (kind) => {
      const changed = withMouthEnd(whistle, usualMouthEnd(kind, 12.7));
      expect(documentFaults(changed)).toEqual([]);
      expect(documentFaults(withMouthEnd(changed, usualMouthEnd('window', 12.7)))).toEqual([]);
    },
  );
});

describe('the foot', () => {
  it.each([240, 300])('moves bore and outside to %d together', (footMm) => {
    const cut = moveFoot(coned, footMm);
    expect(cut.bore.stations.at(-1)?.positionMm).toBe(footMm);
    expect(cut.outside.stations.at(-1)?.positionMm).toBe(footMm);
    expect(diameterAt(cut.bore.stations, 90)).toBe(12.7);
  });

  it('cuts through the taper at its width there', () => {
    expect(moveFoot(coned, 177.5).bore.stations.at(-1)?.diameterMm).toBe(11.85);
  });
});

describe('moving the mouth end', () => {
  const flute = withMouthEnd(coned, usualMouthEnd('embouchure', 12.7));

  it.each([
    ['a window', coned],
    ['an embouchure hole', flute],
    ['a rim', withMouthEnd(coned, usualMouthEnd('rim', 12.7))],
  ])('keeps holes and bore of %s where they are on the tube', (_, document) => {
    fc.assert(
      fc.property(fc.double({ min: -40, max: 40, noNaN: true }), (byMm) => {
        const moved = moveMouthEnd(document, byMm);
        expect(documentFaults(moved)).toEqual([]);
        document.holes.forEach((hole, index) => {
          const now = moved.holes[index]?.positionMm ?? NaN;
          expect(fromFootMm(moved, now)).toBeCloseTo(fromFootMm(document, hole.positionMm), 2);
        });
        const { footMm } = boreEnds(document);
        const movedFootMm = boreEnds(moved).footMm;
        expect(movedFootMm).toBeCloseTo(footMm - byMm, 2);
        for (const fromFoot of [10, 60, 150])
          expect(diameterAt(moved.bore.stations, movedFootMm - fromFoot)).toBeCloseTo(
            diameterAt(document.bore.stations, footMm - fromFoot),
            2,
          );
      }),
    );
  });

  it('stops clear of the highest hole', () => {
    const moved = moveMouthEnd(whistle, 400);
    const [highest] = moved.holes;
    expect((highest?.positionMm ?? 0) - (highest?.diameterMm ?? 0) / 2).toBeCloseTo(1, 6);
  });

  it('keeps the stopper out of the embouchure hole', () => {
    const pushed = moveStopper(flute, 0);
    expect(pushed.mouthEnd).toMatchObject({ stopperMm: 6 });
    expect(boreEnds(pushed).mouthMm).toBe(-6);
    expect(documentFaults(pushed)).toEqual([]);
  });

  it('leaves the lowest hole room at the shortest foot', () => {
    expect(documentFaults(trimFoot(whistle, -1000))).toEqual([]);
  });
});
