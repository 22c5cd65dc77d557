import type { Medium } from '../bore/wall-losses.ts';

/** A point of the bore; SI throughout, positions from the mouth end's reference point towards the foot. */
export interface BorePoint {
  position: number;
  radius: number;
}

/** How a finger treats a hole. */
export type HoleState =
  { kind: 'open' } | { kind: 'closed' } | { kind: 'half'; fraction: number; from: 'side' | 'end' };

/** What closes a hole: a rigid lid that follows the outside, a flat one, or a fingertip that bulges in. */
export type HoleLid = 'curved' | 'flat' | 'fingertip';

/** A cone cut from the inner end of a hole. */
export interface HoleFlare {
  innerRadius: number;
  depth: number;
}

export interface ColumnHole {
  position: number;
  /** At the outer surface. */
  radius: number;
  boreRadius: number;
  outerRadius: number;
  /** On the hole's axis, from the bore wall to the outer surface. */
  chimney: number;
  /** Round the body, rad. */
  angle: number;
  flare: HoleFlare | null;
  lid: HoleLid;
  /** A flat disc that stands above the open hole. */
  pad: { radius: number; height: number } | null;
}

export type ColumnMouth =
  | { kind: 'ideal-open' }
  | { kind: 'ideal-closed' }
  | {
      kind: 'window';
      width: number;
      length: number;
      wall: number;
      ramp: number;
      boreRadius: number;
      outerRadius: number;
      scale: number;
    }
  | { kind: 'rim'; cover: number; boreRadius: number; outerRadius: number; scale: number }
  | { kind: 'reed'; volume: number; scale: number }
  | {
      kind: 'embouchure';
      along: number;
      across: number;
      chimney: number;
      flare: HoleFlare | null;
      lipCover: number;
      lipAngle: number;
      /** From the hole's axis to the stopper. */
      stopper: number;
      boreRadius: number;
      outerRadius: number;
      scale: number;
    };

export type ColumnFoot =
  { kind: 'open'; outerRadius: number } | { kind: 'flanged'; outerRadius: number } | { kind: 'stopped' };

/** An air column in a body with holes: all that the physics needs to know of an instrument. */
export interface Column {
  /** From the mouth side to the foot; two points at one position make a step. */
  bore: readonly BorePoint[];
  /** Where the mouth end looks into the bore; what lies before it is the stopper's cavity. */
  input: number;
  mouth: ColumnMouth;
  foot: ColumnFoot;
  /** In order of position. */
  holes: readonly ColumnHole[];
  /** Air outside, and inside where the column is not warmed. */
  outside: Medium;
  /** Air inside at a position; null: as outside. */
  warmth: ((position: number) => Medium) | null;
}

/**
 * Radius of the bore at a position; at a step the foot side is meant.
 *
 * @param bore - points from the mouth side to the foot, at least one
 * @param position - m; beyond the ends the end's radius holds
 * @returns m
 */
export function boreRadiusAt(bore: readonly BorePoint[], position: number): number {
  let before: BorePoint | undefined;
  for (const point of bore) {
    if (position < point.position) {
      if (before === undefined) return point.radius;
      const share = (position - before.position) / (point.position - before.position);
      return before.radius + share * (point.radius - before.radius);
    }
    before = point;
  }
  return before?.radius ?? NaN;
}

/**
 * The part of a bore between two positions, with points of its own at both.
 *
 * @param bore - points from the mouth side to the foot
 * @param from - m
 * @param to - m, > from
 * @returns its points, mouth side first; beyond the ends of the bore the end's radius holds
 */
export function boreBetween(bore: readonly BorePoint[], from: number, to: number): BorePoint[] {
  const inside = bore.filter((point) => point.position > from && point.position < to);
  const points = [{ position: from, radius: boreRadiusAt(bore, from) }, ...inside];
  // The foot-side radius at a step belongs to what follows, so the part ends with the mouth-side one.
  const step = bore.find((point) => point.position === to);
  points.push({ position: to, radius: step === undefined ? boreRadiusAt(bore, to) : step.radius });
  return points;
}
