import type { DesignDocument, MouthEnd, ToneHole } from '#shared/document/design-document.ts';
import { diameterAt } from '#shared/document/profile.ts';

/**
 * A point of the paper that is wrapped round the body, mm: along the axis from the mouth end's reference point, and
 * round the outside from the centre line, counted the way angles are: clockwise seen from the foot.
 */
export interface WrapPoint {
  alongMm: number;
  roundMm: number;
}

const RADIANS = Math.PI / 180;

/** Pieces that a curve is drawn in: enough for a thousandth of a millimetre on the widest hole. */
const CURVE_PIECES = 24;

export function outsideRadiusMm(document: DesignDocument, alongMm: number): number {
  return diameterAt(document.outside.stations, alongMm) / 2;
}

/** An angle between −180 (excluded) and 180 degrees. */
export function turnedAngle(angleDeg: number): number {
  const turned = ((((angleDeg + 180) % 360) + 360) % 360) - 180;
  return turned === -180 ? 180 : turned;
}

/** How fast the outside radius grows footward around a place, over the length that a hole takes there. */
function taperAt(document: DesignDocument, alongMm: number, spanMm: number): number {
  const rise =
    outsideRadiusMm(document, alongMm + spanMm / 2) - outsideRadiusMm(document, alongMm - spanMm / 2);
  return rise / spanMm;
}

/**
 * Where a point of the outside lies on paper that is stuck down along the centre line and wrapped round.
 *
 * On a cylinder that is the angle times the radius. Paper wrapped round a taper drifts towards its wide end; the point
 * is set back by as much, as on the development of the cone that touches the body there.
 *
 * @param taper - growth of the radius footward for each mm, 0 for a cylinder
 */
function developed(place: { alongMm: number; radiusMm: number; angle: number }, taper: number): WrapPoint {
  const { alongMm, radiusMm, angle } = place;
  const sine = taper / Math.hypot(1, taper);
  if (Math.abs(sine) < 1e-9) return { alongMm, roundMm: radiusMm * angle };
  const slantMm = radiusMm / sine;
  return {
    alongMm: alongMm - slantMm * (1 - Math.cos(angle * sine)),
    roundMm: slantMm * Math.sin(angle * sine),
  };
}

/** A closed curve on the paper: `at(turn)` for turn from 0 to 1. */
export interface WrapCurve {
  at: (turn: number) => WrapPoint;
}

/** A hole on the paper; one that reaches over the seam appears at both edges. */
export interface HoleAppearance {
  centre: WrapPoint;
  curve: WrapCurve;
}

type DrilledHole = Pick<ToneHole, 'positionMm' | 'angleDeg' | 'diameterMm'>;

/** The mark that a hole's rim makes on the wrapped paper; a drill goes in square to the axis. */
export function holeAppearances(document: DesignDocument, hole: DrilledHole): HoleAppearance[] {
  const angleDeg = turnedAngle(hole.angleDeg);
  const radiusMm = outsideRadiusMm(document, hole.positionMm);
  const reachDeg = Math.asin(Math.min(1, hole.diameterMm / 2 / radiusMm)) / RADIANS;
  const overSeam = Math.abs(angleDeg) + reachDeg > 180;
  const angles = overSeam ? [angleDeg, angleDeg - Math.sign(angleDeg) * 360] : [angleDeg];
  return angles.map((angle) => appearance(document, { ...hole, angleDeg: angle }));
}

function appearance(document: DesignDocument, hole: DrilledHole): HoleAppearance {
  const place = {
    alongMm: hole.positionMm,
    radiusMm: outsideRadiusMm(document, hole.positionMm),
    angle: hole.angleDeg * RADIANS,
  };
  const half = hole.diameterMm / 2;
  return {
    centre: developed(place, taperAt(document, hole.positionMm, hole.diameterMm)),
    curve: ovalCurve(document, hole, { alongMm: half, acrossMm: half }),
  };
}

function ovalCurve(
  document: DesignDocument,
  { positionMm, angleDeg, diameterMm }: DrilledHole,
  half: { alongMm: number; acrossMm: number },
): WrapCurve {
  const taper = taperAt(document, positionMm, diameterMm);
  const centreRadiusMm = outsideRadiusMm(document, positionMm);
  const middle = angleDeg * RADIANS;
  return {
    at: (turn) => {
      const along = half.alongMm * Math.cos(2 * Math.PI * turn);
      const across = half.acrossMm * Math.sin(2 * Math.PI * turn);
      const radiusMm = centreRadiusMm + taper * along;
      const angle = middle + Math.asin(Math.min(1, Math.max(-1, across / radiusMm)));
      return developed({ alongMm: positionMm + along, radiusMm, angle }, taper);
    },
  };
}

/** The embouchure hole on the wrapped paper. */
export function embouchureCurve(
  document: DesignDocument,
  { lengthMm, widthMm }: Extract<MouthEnd, { kind: 'embouchure' }>,
): WrapCurve {
  const place = { positionMm: 0, angleDeg: 0, diameterMm: lengthMm };
  return ovalCurve(document, place, { alongMm: lengthMm / 2, acrossMm: widthMm / 2 });
}

/** The window on the wrapped paper: its lip edge lies at 0, the block face before it. */
export function windowCorners(
  document: DesignDocument,
  { lengthMm, widthMm }: Extract<MouthEnd, { kind: 'window' }>,
): WrapPoint[] {
  const radiusMm = outsideRadiusMm(document, 0);
  const halfMm = radiusMm * Math.asin(Math.min(1, widthMm / 2 / radiusMm));
  return [
    { alongMm: 0, roundMm: -halfMm },
    { alongMm: 0, roundMm: halfMm },
    { alongMm: -lengthMm, roundMm: halfMm },
    { alongMm: -lengthMm, roundMm: -halfMm },
  ];
}

/** One piece of a curve: its end and the two points that bend it there. */
export interface CurvePiece {
  start: WrapPoint;
  controls: [WrapPoint, WrapPoint];
  end: WrapPoint;
}

/** A closed curve as cubic pieces that meet smoothly. */
export function curvePieces(curve: WrapCurve, count = CURVE_PIECES): CurvePiece[] {
  const step = 1 / count;
  const nudge = 1e-5;
  const slope = (turn: number, key: keyof WrapPoint) =>
    (curve.at(turn + nudge)[key] - curve.at(turn - nudge)[key]) / (2 * nudge);
  const bent = (turn: number, reach: number): WrapPoint => ({
    alongMm: curve.at(turn).alongMm + (slope(turn, 'alongMm') * reach) / 3,
    roundMm: curve.at(turn).roundMm + (slope(turn, 'roundMm') * reach) / 3,
  });
  return Array.from({ length: count }, (_, index) => {
    const [from, to] = [index * step, (index + 1) * step];
    return {
      start: curve.at(from),
      controls: [bent(from, step), bent(to, -step)],
      end: curve.at(to),
    };
  });
}

/** Half the paper's height at a place: half of once round. */
export function halfRoundMm(document: DesignDocument, alongMm: number): number {
  return Math.PI * outsideRadiusMm(document, alongMm);
}

export interface EdgePoint {
  alongMm: number;
  halfMm: number;
}

/** The seam edge between two places: at every station between them, twice where the outside steps. */
export function seamEdge(document: DesignDocument, span: { fromMm: number; toMm: number }): EdgePoint[] {
  const between = document.outside.stations
    .filter((station) => station.positionMm > span.fromMm && station.positionMm < span.toMm)
    .map((station) => ({ alongMm: station.positionMm, halfMm: (Math.PI * station.diameterMm) / 2 }));
  return [
    { alongMm: span.fromMm, halfMm: halfRoundMm(document, span.fromMm) },
    ...between,
    // Just before the end: a step there belongs to the far side.
    { alongMm: span.toMm, halfMm: halfRoundMm(document, span.toMm - 1e-9) },
  ];
}

/**
 * How much longer a tapered outside is along its surface than along the axis, mm.
 *
 * Steps are left out: no paper lies on them.
 */
export function surfaceExcessMm(document: DesignDocument, span: { fromMm: number; toMm: number }): number {
  const points = seamEdge(document, span);
  return points.slice(1).reduce((sum, point, index) => {
    const before = points[index] ?? point;
    const along = point.alongMm - before.alongMm;
    if (along <= 0) return sum;
    return sum + Math.hypot(along, (point.halfMm - before.halfMm) / Math.PI) - along;
  }, 0);
}
