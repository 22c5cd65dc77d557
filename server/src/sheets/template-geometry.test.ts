import { describe, expect, it } from 'vitest';
import { buildHole, buildWhistle } from '../../../tests/sheets/build-sheet-input.ts';
import {
  curvePieces,
  holeAppearances,
  seamEdge,
  surfaceExcessMm,
  turnedAngle,
  type WrapPoint,
} from './template-geometry.ts';

const tapered = (fromMm: number, toMm: number) =>
  buildWhistle({
    outside: {
      stations: [
        { positionMm: -31, diameterMm: fromMm },
        { positionMm: 265, diameterMm: toMm },
      ],
    },
  });

/**
 * Where a point of the paper lands in space when the paper is wrapped round a cone with its centre line on top.
 *
 * The paper is the cone's development: its distance from the apex stays, and the angle at the apex grows by 1/sin.
 */
function wrapped(
  point: WrapPoint,
  cone: { headRadiusMm: number; headMm: number; taper: number; touchMm: number },
): { axialMm: number; acrossMm: number; downMm: number } {
  const sine = cone.taper / Math.hypot(1, cone.taper);
  const cosine = Math.sqrt(1 - sine * sine);
  const touchRadius = cone.headRadiusMm + cone.taper * (cone.touchMm - cone.headMm);
  const apexToTouch = touchRadius / sine;
  const x = apexToTouch + (point.alongMm - cone.touchMm);
  const slant = Math.sign(apexToTouch) * Math.hypot(x, point.roundMm);
  const angle = Math.atan2(point.roundMm, Math.abs(x)) / Math.abs(sine);
  const radius = slant * sine;
  return {
    axialMm: cone.touchMm + (slant - apexToTouch) * cosine,
    acrossMm: radius * Math.sin(angle),
    downMm: radius * (1 - Math.cos(angle)),
  };
}

describe('the mark of a hole on wrapped paper', () => {
  it.each([
    [0, 0],
    [90, (Math.PI * 17.5) / 4],
    [-30, (-Math.PI * 17.5) / 12],
    [390, (Math.PI * 17.5) / 12],
  ])('at %f degrees on a cylinder lies at the arc of the angle', (angleDeg, roundMm) => {
    const [mark] = holeAppearances(buildWhistle(), buildHole({ id: 'a', positionMm: 120, angleDeg }));
    expect(mark?.centre.alongMm).toBe(120);
    expect(mark?.centre.roundMm).toBeCloseTo(roundMm, 9);
  });

  it('appears at both edges when it lies on the seam', () => {
    const marks = holeAppearances(buildWhistle(), buildHole({ id: 'a', positionMm: 120, angleDeg: 180 }));
    expect(marks.map((mark) => mark.centre.roundMm)).toEqual([
      expect.closeTo((Math.PI * 17.5) / 2, 9),
      expect.closeTo((-Math.PI * 17.5) / 2, 9),
    ]);
  });

  it('appears at both edges when only its rim crosses the seam', () => {
    const near = buildHole({ id: 'a', positionMm: 120, angleDeg: -165, diameterMm: 6 });
    expect(holeAppearances(buildWhistle(), near)).toHaveLength(2);
    expect(holeAppearances(buildWhistle(), { ...near, angleDeg: -155 })).toHaveLength(1);
  });

  it('is as long as the drill is wide, and wider round by the curve of the body', () => {
    const [mark] = holeAppearances(buildWhistle(), buildHole({ id: 'a', positionMm: 120, diameterMm: 10 }));
    const points = Array.from({ length: 400 }, (_, index) => mark!.curve.at(index / 400));
    const width = (values: number[]) => Math.max(...values) - Math.min(...values);
    expect(width(points.map((point) => point.alongMm))).toBeCloseTo(10, 9);
    expect(width(points.map((point) => point.roundMm))).toBeCloseTo(17.5 * Math.asin(10 / 17.5), 9);
  });

  it.each([
    ['a flute that narrows', 27, 21, 180],
    ['a flute that narrows, hole aside', 27, 21, 40],
    ['a pipe that widens', 18, 40, 180],
    ['a pipe that widens, hole aside', 18, 40, -75],
  ])('lands on the hole when the paper is wrapped round %s', (_, headMm, footMm, angleDeg) => {
    const document = tapered(headMm, footMm);
    const hole = buildHole({ id: 'a', positionMm: 150, diameterMm: 8, angleDeg });
    const taper = (footMm - headMm) / 2 / 296;
    const cone = { headRadiusMm: headMm / 2, headMm: -31, taper, touchMm: 150 };
    const radius = headMm / 2 + taper * 181;
    const [mark] = holeAppearances(document, hole);
    const centre = wrapped(mark!.centre, cone);
    expect(centre.axialMm).toBeCloseTo(150, 6);
    expect(centre.acrossMm).toBeCloseTo(radius * Math.sin((angleDeg * Math.PI) / 180), 6);
    for (const turn of [0, 0.13, 0.25, 0.5, 0.77]) {
      const rim = wrapped(mark!.curve.at(turn), cone);
      // Along the axis the drill's own radius; the paper lies along the slope, whose excess is of second order.
      expect(rim.axialMm - 150).toBeCloseTo(4 * Math.cos(2 * Math.PI * turn), 2);
    }
  });

  it('is drawn as pieces that stay on the curve within a thousandth of a millimetre', () => {
    const document = tapered(27, 21);
    const wide = buildHole({ id: 'a', positionMm: 150, diameterMm: 16, angleDeg: 60 });
    const [mark] = holeAppearances(document, wide);
    curvePieces(mark!.curve).forEach((piece, index) => {
      const middle = (key: keyof WrapPoint) =>
        (piece.start[key] + 3 * piece.controls[0][key] + 3 * piece.controls[1][key] + piece.end[key]) / 8;
      const meant = mark!.curve.at((index + 0.5) / 24);
      expect(Math.hypot(middle('alongMm') - meant.alongMm, middle('roundMm') - meant.roundMm)).toBeLessThan(
        0.001,
      );
    });
  });
});

describe('the seam edge', () => {
  it('follows the taper and the steps of the outside', () => {
    const document = buildWhistle({
      outside: {
        stations: [
          { positionMm: 0, diameterMm: 20 },
          { positionMm: 100, diameterMm: 18 },
          { positionMm: 100, diameterMm: 24 },
          { positionMm: 265, diameterMm: 24 },
        ],
      },
    });
    const edge = seamEdge(document, { fromMm: 50, toMm: 150 });
    expect(edge.map((point) => [point.alongMm, point.halfMm / Math.PI])).toEqual([
      [50, 9.5],
      [100, 9],
      [100, 12],
      [150, expect.closeTo(12, 9)],
    ]);
  });

  it('is longer than the axis by the slope, steps left out', () => {
    expect(surfaceExcessMm(buildWhistle(), { fromMm: 0, toMm: 265 })).toBe(0);
    const steep = tapered(20, 20 + 2 * 29.6);
    expect(surfaceExcessMm(steep, { fromMm: 0, toMm: 100 })).toBeCloseTo(100 * (Math.hypot(1, 0.1) - 1), 6);
  });
});

describe('an angle', () => {
  it.each([
    [180, 180],
    [-180, 180],
    [360, 0],
    [-190, 170],
    [270, -90],
  ])('of %f degrees is one of %f', (typed, turned) => expect(turnedAngle(typed)).toBe(turned));
});
