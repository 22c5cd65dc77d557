import { EngineInputError } from '../engine-input-error.ts';
import { curvedLidHeight, fingertipHeight } from '../tone-hole/closed-lid.ts';
import { halfCoveredLength, halfCoveredShift, type HalfCover } from '../tone-hole/half-covered.ts';
import { innerLength } from '../tone-hole/inner-length.ts';
import { matchingLength } from '../tone-hole/matching-length.ts';
import { padLength } from '../tone-hole/pad.ts';
import { radiationLength } from '../tone-hole/radiation-length.ts';
import { closedSeriesLength, openSeriesLength } from '../tone-hole/series-length.ts';
import { undercutShape, type ShapedUndercut } from '../tone-hole/undercut.ts';
import type { ColumnHole, HoleState } from './column.ts';

/** A straight piece of chimney, from the bore outwards. */
export interface ChimneyPiece {
  innerRadius: number;
  outerRadius: number;
  /** m; may be below 0 under a lid that follows the outside. */
  length: number;
}

/** What a tone hole in one state amounts to, whatever the frequency; lengths over areas in 1/m. */
export interface HoleShape {
  halfSeries: number;
  inner: number;
  /** Radius at the bore, for the node's compliance, m. */
  innerRadius: number;
  chimney: ChimneyPiece[];
  /** Low-frequency length of the outlet over its area; of no account when closed. */
  outlet: number;
  outerRadius: number;
  /** Of the acting axis towards the foot, m. */
  shift: number;
}

const area = (radius: number) => Math.PI * radius * radius;

/**
 * Lengths and areas of the T circuit that stands for a tone hole.
 *
 * @param hole - the hole
 * @param state - open, closed or half-covered
 * @returns its shape
 * @throws EngineInputError where the hole is too wide for its bore or its undercut breaks out
 */
export function holeShape(hole: ColumnHole, state: HoleState): HoleShape {
  const cut = hole.flare === null ? null : shapeOfFlare(hole, hole.flare);
  return state.kind === 'closed' ? closedShape(hole, cut) : openShape(hole, cut, state);
}

function shapeOfFlare(hole: ColumnHole, flare: { innerRadius: number; depth: number }): ShapedUndercut {
  const shape = undercutShape({
    boreRadius: hole.boreRadius,
    holeRadius: hole.radius,
    chimney: hole.chimney,
    outerRadius: hole.outerRadius,
    flare: flare.innerRadius - hole.radius,
    depth: flare.depth,
  });
  if (shape.status === 'shaped') return shape;
  throw new EngineInputError(
    'undercut',
    flare.innerRadius,
    shape.reason === 'cone-breaks-out'
      ? 'The undercut breaks out sideways before it meets the bore wall. Cut it deeper or less wide.'
      : 'The undercut is too near the width of the bore. Cut it less wide.',
  );
}

function openShape(
  hole: ColumnHole,
  cut: ShapedUndercut | null,
  state: Exclude<HoleState, { kind: 'closed' }>,
): HoleShape {
  const { radius: b, boreRadius: a, chimney: t, outerRadius } = hole;
  const { innerRadius, seriesRadius, rimRadius, openExtraLength } = cut ?? straight(b);
  const cover = state.kind === 'half' ? halfCover(hole, state) : null;
  const covered = cover === null ? 0 : halfCoveredLength(cover);
  const cone = cut === null ? null : { inner: innerRadius, outer: rimRadius };
  return {
    halfSeries: openSeriesLength(a, seriesRadius, t) / (2 * area(seriesRadius)),
    inner: innerLength(a, innerRadius, t) / area(innerRadius) + openExtraLength / area(b),
    innerRadius,
    chimney: chimneyPieces(hole, cone, t),
    outlet: (radiationLength(rimRadius, outerRadius) + covered + padOver(hole)) / area(rimRadius),
    outerRadius,
    // A finger drawn back leaves the mouth side of the hole open.
    shift: cover === null ? 0 : -halfCoveredShift(cover),
  };
}

function straight(radius: number) {
  return { innerRadius: radius, seriesRadius: radius, rimRadius: radius, openExtraLength: 0 };
}

function padOver({ pad, radius, outerRadius }: ColumnHole): number {
  if (pad === null) return 0;
  return padLength({
    holeRadius: radius,
    padRadius: pad.radius,
    height: pad.height,
    rimWidth: null,
    outerRadius,
  });
}

function closedShape(hole: ColumnHole, cut: ShapedUndercut | null): HoleShape {
  const { radius: b, boreRadius: a, chimney: t } = hole;
  const innerRadius = cut?.innerRadius ?? b;
  const seriesRadius = cut?.seriesRadius ?? b;
  const height =
    (hole.lid === 'flat' ? t : curvedLidHeight(t, b, hole.outerRadius)) -
    (hole.lid === 'fingertip' ? fingertipHeight(b) : 0);
  const cone = cut === null ? null : { inner: cut.closedRadius, outer: b };
  return {
    halfSeries: closedSeriesLength(a, seriesRadius, t) / (2 * area(seriesRadius)),
    inner: innerLength(a, innerRadius, t) / area(innerRadius),
    innerRadius,
    chimney: chimneyPieces(hole, cone, height),
    outlet: 0,
    outerRadius: hole.outerRadius,
    shift: 0,
  };
}

function chimneyPieces(
  hole: ColumnHole,
  cone: { inner: number; outer: number } | null,
  height: number,
): ChimneyPiece[] {
  const { radius: b, boreRadius: a, flare } = hole;
  if (cone === null || flare === null) {
    return [{ innerRadius: b, outerRadius: b, length: height + matchingLength(a, b) }];
  }
  const matching = matchingLength(a, cone.inner);
  const straight = height - flare.depth;
  return [
    { innerRadius: cone.inner, outerRadius: cone.inner, length: matching },
    { innerRadius: cone.inner, outerRadius: cone.outer, length: flare.depth },
    ...(straight === 0 ? [] : [{ innerRadius: b, outerRadius: b, length: straight }]),
  ];
}

function halfCover(hole: ColumnHole, state: { fraction: number; from: 'side' | 'end' }): HalfCover {
  return {
    fraction: state.fraction,
    from: state.from,
    holeRadius: hole.radius,
    outerRadius: hole.outerRadius,
    chimney: hole.chimney,
  };
}
