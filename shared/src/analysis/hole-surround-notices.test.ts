import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { predictDesign } from './predict-design.ts';

const whistle = whistleDocument();
const [first, second] = whistle.holes;
const place = first?.positionMm ?? 0;
const mouthMm = whistle.bore.stations[0]?.positionMm ?? 0;
const footMm = whistle.bore.stations.at(-1)?.positionMm ?? 0;

const stepped = (atMm: number, to: number): DesignDocument['bore'] => ({
  stations: [
    { positionMm: mouthMm, diameterMm: 12.7 },
    { positionMm: atMm, diameterMm: 12.7 },
    { positionMm: atMm, diameterMm: to },
    { positionMm: footMm, diameterMm: to },
  ],
});

const codes = (change: Partial<DesignDocument>) =>
  predictDesign({ ...whistle, ...change }).notices.map(({ code, hole }) => `${code} ${hole ?? ''}`.trim());

describe('what stands round a hole', () => {
  it.each([place - 2, place, place + 2])('names the hole over a step of the bore at %f', (atMm) => {
    expect(codes({ bore: stepped(atMm, 11) })).toContain(`hole-over-bore-change ${first?.id}`);
  });

  it('says nothing of a step between holes, nor of a cone', () => {
    const between = ((first?.positionMm ?? 0) + (second?.positionMm ?? 0)) / 2;
    expect(codes({ bore: stepped(between, 11) }).join()).not.toContain('hole-over');
    const cone = [
      { positionMm: mouthMm, diameterMm: 12.7 },
      { positionMm: footMm, diameterMm: 9.5 },
    ];
    expect(codes({ bore: { stations: cone } }).join()).not.toContain('hole-over');
  });

  it('takes a note less exactly where the bore steps under a hole', () => {
    const [even] = predictDesign(whistle).fingerings;
    const [uneven] = predictDesign({ ...whistle, bore: stepped(place, 11) }).fingerings;
    expect(uneven?.accuracyCents).toBeGreaterThan((even?.accuracyCents ?? 0) + 10);
  });

  it('names the hole over a ring of the outside, unless its chimney was measured', () => {
    const ringed = {
      stations: [
        { positionMm: mouthMm, diameterMm: 17.5 },
        { positionMm: place, diameterMm: 17.5 },
        { positionMm: place, diameterMm: 26 },
        { positionMm: place + 10, diameterMm: 26 },
        { positionMm: place + 10, diameterMm: 17.5 },
        { positionMm: footMm, diameterMm: 17.5 },
      ],
    };
    expect(codes({ outside: ringed })).toContain(`hole-over-outside-change ${first?.id}`);
    const holes = whistle.holes.map((hole) => ({ ...hole, chimneyMm: 2.4 }));
    expect(codes({ outside: ringed, holes }).join()).not.toContain('hole-over');
  });

  it('says when an outside runs on beyond the foot', () => {
    const outside = {
      stations: [
        { positionMm: mouthMm, diameterMm: 17.5 },
        { positionMm: footMm + 12, diameterMm: 17.5 },
      ],
    };
    expect(codes({ outside })).toContain('outside-beyond-foot');
    expect(codes({})).not.toContain('outside-beyond-foot');
  });

  it('names two holes that leave a sliver of wood', () => {
    const holes = whistle.holes.map((hole, index) =>
      index === 1 && first !== undefined
        ? { ...hole, positionMm: first.positionMm + (first.diameterMm + hole.diameterMm) / 2 + 0.2 }
        : hole,
    );
    expect(codes({ holes })).toContain(`holes-nearly-touch ${second?.id}`);
    expect(codes({}).join()).not.toContain('holes-nearly-touch');
  });

  it.each([
    [7, true],
    [40, false],
  ])('a hole that begins %d mm beyond the embouchure hole: %s', (beyondMm, isNamed) => {
    const mouthEnd = {
      kind: 'embouchure',
      lengthMm: 7,
      widthMm: 7,
      chimneyMm: 2.5,
      undercut: null,
      lipCover: 0.4,
      lipAngleDeg: 90,
      stopperMm: 6,
      correctionScale: 1,
    } as const;
    const holes = whistle.holes.map((hole, index) =>
      index === 0 ? { ...hole, positionMm: 3.5 + hole.diameterMm / 2 + beyondMm - 3 } : hole,
    );
    expect(codes({ mouthEnd, holes }).join().includes('hole-near-embouchure')).toBe(isNamed);
  });
});
