import { DUCT_CELLS, MEDIUM_CELLS, type Medium } from '../bore/wall-losses.ts';
import { SLICE_CELLS } from '../bore/cone.ts';
import { TWO_PORT_CELLS } from '../complex/two-port.ts';
import type { BorePoint } from './column.ts';

/** A cylinder or truncated cone; addresses into the cells. */
export interface Slice {
  at: number;
  duct: number;
  conical: boolean;
  mouth: BorePoint;
  foot: BorePoint;
}

/** Slices that belong together: their two-port, and the phase that a wave turns by on the way there and back. */
export interface Link {
  slices: Slice[];
  twoPort: number;
  /** Address of the turn, rad, negative, and of ρc/S at either end. */
  turn: number;
  mouthRadius: number;
  footRadius: number;
  medium: number;
}

/** Bore between two hole axes. */
export interface Segment {
  links: Link[];
  twoPort: number;
}

/** A duct whose losses are worked out once per frequency. */
export interface Duct {
  at: number;
  medium: number;
  radius: number;
}

/** Slices of a lossy cone change in radius by about this factor. */
const SLICE_RATIO = 1.05;
/** m; also for a column whose air changes along it. */
const SLICE_LENGTH = 0.02;
/** Counting the turns of a wave stays certain while a link's area changes by less than e². */
const LINK_CHANGE = 2;
/** A cone whose radius changes by more than e^this is cut into slices of equal ratio instead of equal length. */
const STEEP_CHANGE = 1;
/** Below this difference of radius, m, a cone is a cylinder. */
const EVEN = 1e-9;

// Share of a cone's length that lies before a share of its slices.
function shareAlong(slices: number, ratio: number): number {
  return Math.abs(Math.log(ratio)) <= STEEP_CHANGE ? slices : (ratio ** slices - 1) / (ratio - 1);
}

/**
 * Lays out the cells of a column and remembers what has to be in them before the first frequency.
 */
export class BorePlan {
  size = 0;
  readonly media: { at: number; medium: Medium }[] = [];
  readonly ducts: Duct[] = [];
  private readonly fixed: [at: number, value: number][] = [];
  private readonly known = new Map<string, Duct>();
  private readonly warmth: ((position: number) => Medium) | null;
  /** Address of the air outside. */
  readonly outside: number;

  /**
   * @param outside - air outside, and inside where there is no warmth
   * @param warmth - air inside at a position, or null
   */
  constructor(outside: Medium, warmth: ((position: number) => Medium) | null) {
    this.take(TWO_PORT_CELLS);
    this.warmth = warmth;
    this.outside = this.medium(outside);
  }

  /**
   * Takes cells.
   *
   * @param count - how many
   * @returns the first one's address
   */
  take(count: number): number {
    const at = this.size;
    this.size += count;
    return at;
  }

  /**
   * Air inside at a position.
   *
   * @param position - m
   * @returns its address
   */
  mediumAt(position: number): number {
    return this.warmth === null ? this.outside : this.medium(this.warmth(position));
  }

  /**
   * A duct; the same radius in the same air is one duct.
   *
   * @param radius - m
   * @param medium - address of the air
   * @returns its address
   */
  duct(radius: number, medium: number): number {
    const key = `${radius} ${medium}`;
    const known = this.known.get(key);
    if (known !== undefined) return known.at;
    const duct = { at: this.take(DUCT_CELLS), medium, radius };
    this.known.set(key, duct);
    this.ducts.push(duct);
    return duct.at;
  }

  /**
   * One cylinder or cone.
   *
   * @param from - mouth side
   * @param to - foot side
   * @param medium - address of the air
   * @returns the slice
   */
  slice(from: BorePoint, to: BorePoint, medium: number): Slice {
    const at = this.take(SLICE_CELLS);
    this.fixed.push([at, from.radius], [at + 1, to.radius], [at + 2, Math.abs(to.position - from.position)]);
    const conical = Math.abs(to.radius - from.radius) >= EVEN;
    return { at, duct: this.duct((from.radius + to.radius) / 2, medium), conical, mouth: from, foot: to };
  }

  /**
   * Slices of a straight piece, fine enough for its losses, its air and the count of turns.
   *
   * @param from - mouth side
   * @param to - foot side
   * @param medium - address of the air; null: as it is along the bore
   * @returns the slices, mouth side first; none for a step
   */
  slices(from: BorePoint, to: BorePoint, medium: number | null = null): Slice[] {
    const length = Math.abs(to.position - from.position);
    if (length === 0) return [];
    const count = this.sliceCount(from, to, medium);
    const point = (i: number): BorePoint => {
      const share = shareAlong(i / count, to.radius / from.radius);
      return {
        position: from.position + share * (to.position - from.position),
        radius: from.radius + share * (to.radius - from.radius),
      };
    };
    return Array.from({ length: count }, (_, i) => {
      const air = medium ?? this.mediumAt(point(i + 0.5).position);
      return this.slice(point(i), point(i + 1), air);
    });
  }

  /**
   * A cylinder taken away: what a lid that follows the outside takes off a chimney.
   *
   * @param radius - m
   * @param length - m, ≤ 0
   * @param medium - address of the air
   * @returns the slice
   */
  negativeSlice(radius: number, length: number, medium: number): Slice {
    const at = this.take(SLICE_CELLS);
    this.fixed.push([at, radius], [at + 1, radius], [at + 2, length]);
    const mouth = { position: 0, radius };
    const foot = { position: length, radius };
    return { at, duct: this.duct(radius, medium), conical: false, mouth, foot };
  }

  /**
   * Bore through all points given.
   *
   * @param points - from the mouth side to the foot side, at least two
   * @returns the segment
   */
  segment(points: readonly BorePoint[]): Segment {
    const links: Link[] = [];
    let change = Infinity;
    points.forEach((to, index) => {
      const from = points[index - 1];
      if (from === undefined) return;
      const parts = this.slices(from, to);
      const each = Math.abs(2 * Math.log(to.radius / from.radius)) / Math.max(parts.length, 1);
      change += parts.length === 0 ? each : 0;
      for (const slice of parts) {
        change += each;
        if (change > LINK_CHANGE || links.length === 0) {
          links.push(this.link(slice.mouth));
          change = each;
        }
        const link = links.at(-1);
        link?.slices.push(slice);
        if (link !== undefined) link.footRadius = slice.foot.radius;
      }
    });
    const only = links.length === 1 ? links[0] : undefined;
    return { links, twoPort: only?.twoPort ?? this.take(TWO_PORT_CELLS) };
  }

  /**
   * The cells, with all in them that does not depend on frequency.
   *
   * @returns a new array
   */
  cells(): Float64Array {
    const cells = new Float64Array(this.size);
    for (const [at, value] of this.fixed) cells[at] = value;
    return cells;
  }

  private link({ position, radius }: BorePoint): Link {
    return {
      slices: [],
      twoPort: this.take(TWO_PORT_CELLS),
      turn: this.take(1),
      mouthRadius: radius,
      footRadius: radius,
      medium: this.mediumAt(position),
    };
  }

  private medium(medium: Medium): number {
    const at = this.take(MEDIUM_CELLS);
    this.media.push({ at, medium });
    return at;
  }

  private sliceCount(from: BorePoint, to: BorePoint, medium: number | null): number {
    const length = Math.abs(to.position - from.position);
    const change = Math.abs(Math.log(to.radius / from.radius));
    const even = Math.abs(to.radius - from.radius) < EVEN;
    const lossless = this.media[0]?.medium.lossless === true;
    const fine = even || lossless ? 1 : Math.ceil(change / Math.log(SLICE_RATIO) - 1e-9);
    const short = (even || lossless) && (medium !== null || this.warmth === null);
    return Math.max(
      1,
      fine,
      short ? 1 : Math.ceil(length / SLICE_LENGTH - 1e-9),
      Math.ceil((2 * change) / LINK_CHANGE - 1e-9),
    );
  }
}
