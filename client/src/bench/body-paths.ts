import { line } from 'd3';
import type { Station, ToneHole } from '#shared/document/design-document.ts';
import { boreEnds, chimneyMm, diameterAt } from '#shared/document/profile.ts';
import type { BodyShape, DrawnBody } from './drawn-body.ts';

/** Where a drawing of the body stands: along and across the instrument. */
export interface Place {
  x: (positionMm: number) => number;
  /** Across the tube, px per mm. */
  across: number;
  /** The axis, px. */
  axisY: number;
}

type Point = [number, number];

const polygon = (points: readonly Point[]) => `${line()([...points]) ?? ''}Z`;

/** Half a profile from one position to another, as points above (sign −1) or below (sign 1) the axis. */
function edge(stations: readonly Station[], span: [number, number], place: Place, sign: -1 | 1): Point[] {
  const [fromMm, toMm] = span;
  const inside = stations.filter(({ positionMm }) => positionMm > fromMm && positionMm < toMm);
  const ends = (positionMm: number) => ({ positionMm, diameterMm: diameterAt(stations, positionMm) });
  return [ends(fromMm), ...inside, { ...ends(toMm), diameterMm: diameterBefore(stations, toMm) }].map(
    ({ positionMm, diameterMm }) => [
      place.x(positionMm),
      place.axisY + (sign * diameterMm * place.across) / 2,
    ],
  );
}

/** At a step the side toward the mouth is meant: that is where a stretch ends. */
function diameterBefore(stations: readonly Station[], positionMm: number): number {
  return (
    stations.find((station) => station.positionMm === positionMm)?.diameterMm ??
    diameterAt(stations, positionMm)
  );
}

function tube(stations: readonly Station[], span: [number, number], place: Place): Point[] {
  return [...edge(stations, span, place, -1), ...edge(stations, span, place, 1).reverse()];
}

/** Outside of the body where the document gives it. */
export function outsideSpan(shape: BodyShape, body: DrawnBody): [number, number] {
  const first = shape.outside.stations[0]?.positionMm ?? body.headMm;
  const { mouthMm } = boreEnds(shape);
  return [Math.max(body.headMm, Math.min(first, mouthMm)), body.footMm];
}

/** Outline of the body as seen from above, head included. */
export function planPath(shape: BodyShape, body: DrawnBody, place: Place): string {
  const span = outsideSpan(shape, body);
  const points = tube(shape.outside.stations, span, place);
  if (shape.mouthEnd.kind === 'reed' || span[0] <= body.headMm + 0.01) return polygon(points);
  const head = headOutline(shape, body, place);
  const top = points.slice(0, points.length / 2);
  const bottom = points.slice(points.length / 2);
  return `${head.start}${(line()(top) ?? '').replace('M', 'L')}${(line()(bottom) ?? '').replace('M', 'L')}${head.end}Z`;
}

/** Head that the document says nothing of: a whistle's beak, a flute's cap. It carries no measure. */
function headOutline(shape: BodyShape, body: DrawnBody, place: Place): { start: string; end: string } {
  const [bodyFrom] = outsideSpan(shape, body);
  const half = (diameterAt(shape.outside.stations, bodyFrom) * place.across) / 2;
  const left = place.x(body.headMm);
  const joint = place.x(bodyFrom);
  const y = place.axisY;
  if (shape.mouthEnd.kind !== 'window') {
    const round = Math.min(4, half / 3);
    return {
      start: `M${left} ${y + half - round}L${left} ${y - half + round}Q${left} ${y - half} ${left + round} ${y - half}`,
      end: `L${left + round} ${y + half}Q${left} ${y + half} ${left} ${y + half - round}`,
    };
  }
  const narrow = half * 0.62;
  const shoulder = left + (joint - left) * 0.75;
  const middle = left + (joint - left) * 0.4;
  const curve = (sign: number) =>
    `C${middle} ${y + sign * narrow * 1.1} ${middle + (shoulder - middle) * 0.25} ${y + sign * half} ${shoulder} ${y + sign * half}`;
  const back = (sign: number) =>
    `L${shoulder} ${y + sign * half}C${middle + (shoulder - middle) * 0.25} ${y + sign * half} ${middle} ${y + sign * narrow * 1.1} ${left + 2} ${y + sign * narrow}`;
  return {
    start: `M${left} ${y + narrow - 3}L${left} ${y - narrow + 3}Q${left} ${y - narrow} ${left + 2} ${y - narrow}${curve(-1)}`,
    end: `${back(1)}Q${left} ${y + narrow} ${left} ${y + narrow - 3}`,
  };
}

/** The body cut along its axis: everything between outside and bore is wood. */
export function sectionPath(shape: BodyShape, body: DrawnBody, place: Place): string {
  const fromMm = shape.mouthEnd.kind === 'reed' ? outsideSpan(shape, body)[0] : body.headMm;
  return polygon(tube(shape.outside.stations, [fromMm, body.footMm], place));
}

export function borePath(shape: BodyShape, place: Place): string {
  const { mouthMm, footMm } = boreEnds(shape);
  return polygon(tube(shape.bore.stations, [mouthMm, footMm], place));
}

/** Holes in the half of the tube that faces away are drawn in the lower wall. */
export const facesUp = (hole: ToneHole): boolean => Math.cos((hole.angleDeg * Math.PI) / 180) > -1e-9;

export interface ChimneyPaths {
  /** The opening, to be filled with air. */
  opening: string;
  /** Its two sides. */
  sides: string;
  /** Wood standing proud of the body round a chimney higher than the wall; null when there is none. */
  collar: string | null;
}

/** A hole cut through the wall, with its undercut, in the section. */
export function chimneyPaths(shape: BodyShape, hole: ToneHole, place: Place): ChimneyPaths {
  const sign = facesUp(hole) ? -1 : 1;
  const radius = (stations: readonly Station[]) => (diameterAt(stations, hole.positionMm) * place.across) / 2;
  const boreY = place.axisY + sign * radius(shape.bore.stations);
  const wallY = place.axisY + sign * radius(shape.outside.stations);
  const topY = boreY + sign * chimneyMm(shape, hole) * place.across;
  const proud = (topY - wallY) * sign > 0.5;
  const outerY = proud ? topY : wallY;
  const half = hole.diameterMm / 2;
  const inner = (hole.undercut?.innerDiameterMm ?? hole.diameterMm) / 2;
  const kneeY = boreY + sign * (hole.undercut?.depthMm ?? 0) * place.across;
  const side = (toward: -1 | 1): Point[] => [
    [place.x(hole.positionMm + toward * half), outerY],
    [place.x(hole.positionMm + toward * half), kneeY],
    [place.x(hole.positionMm + toward * inner), boreY],
  ];
  const [left, right] = [side(-1), side(1)];
  const beyond = (points: Point[]): Point[] => {
    const first = points[0] ?? [0, 0];
    const last = points.at(-1) ?? [0, 0];
    return [[first[0], first[1] + sign * 1.2], ...points, [last[0], last[1] - sign * 0.9]];
  };
  const rim = Math.max(1.2, hole.diameterMm * 0.2);
  return {
    opening: polygon([...beyond(left), ...beyond(right).reverse()]),
    sides: `${line()(left) ?? ''}${line()(right) ?? ''}`,
    collar: proud
      ? polygon([
          [place.x(hole.positionMm - half - rim), wallY],
          [place.x(hole.positionMm - half - rim), topY],
          [place.x(hole.positionMm + half + rim), topY],
          [place.x(hole.positionMm + half + rim), wallY],
        ])
      : null,
  };
}

export interface PlanHole {
  cx: number;
  cy: number;
  rx: number;
  ry: number;
  /** On the far side of the tube: drawn dashed, through the wood. */
  behind: boolean;
}

/** A hole as seen from above, turned round the tube by its angle. */
export function planHole(shape: BodyShape, hole: ToneHole, place: Place): PlanHole {
  const turn = (hole.angleDeg * Math.PI) / 180;
  const outer = (diameterAt(shape.outside.stations, hole.positionMm) * place.across) / 2;
  const rx = (place.x(hole.positionMm + hole.diameterMm) - place.x(hole.positionMm)) / 2;
  const ry = (hole.diameterMm * place.across) / 2;
  return {
    cx: place.x(hole.positionMm),
    // Clockwise seen from the foot, which lies at the right: towards the top of the page.
    cy: place.axisY - outer * Math.sin(turn),
    rx,
    ry: Math.max(1.5, ry * Math.abs(Math.cos(turn))),
    behind: Math.cos(turn) < -1e-9,
  };
}
