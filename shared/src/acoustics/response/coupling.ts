import { cell, type Cells } from '../complex/cells.ts';
import { innerCoupling } from '../radiation/inner-coupling.ts';
import {
  BODY_SHARE,
  footDistance,
  footMutualRadiation,
  mutualRadiationAfter,
  openingPair,
  type OpeningPair,
  type Travel,
} from '../radiation/mutual-radiation.ts';
import type { BorePlan } from './bore-plan.ts';
import type { Column } from './column.ts';
import type { MouthOpening } from './mouth-branch.ts';

/** Openings further apart than this, in bore radii, share no field inside the bore (1e-5 of what they do when close). */
const INNER_REACH = 6;

/** One opening in the body: a hole, the foot or the mouth's. */
interface Opening {
  position: number;
  angle: number;
  boreRadius: number;
  outerRadius: number;
  kind: 'side' | 'end';
  /** Radius of a tone hole at the bore, m; null for foot and mouth. */
  holeRadius: number | null;
}

/** Two openings that hear each other. */
export interface CoupledPair {
  first: number;
  second: number;
  /** For two openings in the body's side. */
  sides: OpeningPair | null;
  /** Where one is an end: the distance through free air, m. */
  distance: number;
  /** Inside the bore: mass over ρ, 1/m; 0 where too far apart. */
  inner: number;
}

/** All pairs, and where their impedances lie: a square of complex numbers, row and column by opening. */
export interface Coupling {
  /** Holes first, mouth side to foot, then the foot, then the mouth. */
  openings: number;
  pairs: CoupledPair[];
  /** Where each opening lies along the axis, m. */
  positions: Float64Array;
  /** For each opening the cosine and sine of wavenumber times position, then of `BODY_SHARE` of that. */
  waves: Float64Array;
  /** Address of the square of mutual impedances through the air outside. */
  outer: number;
  /** Address of the square of mutual reactances inside the bore, one number each. */
  inner: number;
}

/**
 * Lays out how the openings of a column couple, outside and inside.
 *
 * @param plan - the column's cells
 * @param column - the column
 * @param mouth - the mouth end's opening
 * @param wanted - whether a pair of openings is, by their places; others are left out
 * @returns the pairs
 */
export function planCoupling(
  plan: BorePlan,
  column: Column,
  mouth: MouthOpening | null,
  wanted: (first: number, second: number) => boolean = () => true,
): Coupling {
  const openings = openingsOf(column, mouth);
  const count = openings.length;
  const pairs: CoupledPair[] = [];
  openings.forEach((one, first) => {
    for (let second = first + 1; second < count; second += 1) {
      const other = openings[second];
      if (!one || !other || !wanted(first, second)) continue;
      pairs.push({ first, second, ...couple(one, other) });
    }
  });
  return {
    openings: count,
    pairs,
    positions: Float64Array.from(openings, (opening) => opening?.position ?? NaN),
    waves: new Float64Array(4 * count),
    outer: plan.take(2 * count * count),
    inner: plan.take(count * count),
  };
}

function openingsOf(column: Column, mouth: MouthOpening | null): (Opening | null)[] {
  const foot = column.bore.at(-1);
  const holes: (Opening | null)[] = column.holes.map((hole) => ({
    ...hole,
    kind: 'side',
    holeRadius: hole.flare?.innerRadius ?? hole.radius,
  }));
  const end: Opening | null =
    column.foot.kind === 'stopped' || foot === undefined
      ? null
      : {
          position: foot.position,
          angle: 0,
          boreRadius: foot.radius,
          outerRadius: column.foot.outerRadius,
          kind: 'end',
          holeRadius: null,
        };
  return [...holes, end, mouth === null ? null : { ...mouth, angle: 0, holeRadius: null }];
}

function couple(first: Opening, second: Opening): Omit<CoupledPair, 'first' | 'second'> {
  const along = Math.abs(first.position - second.position);
  const outerRadius = (first.outerRadius + second.outerRadius) / 2;
  const boreRadius = (first.boreRadius + second.boreRadius) / 2;
  const angle = first.angle - second.angle;
  const turn = Math.abs(angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI)));
  const inner = innerMass(first, second, along / boreRadius) / (Math.PI * boreRadius);
  if (first.kind === 'side' && second.kind === 'side') {
    return { sides: openingPair(along, turn, outerRadius), distance: 0, inner };
  }
  return { sides: null, distance: footDistance(along, outerRadius), inner };
}

function innerMass(first: Opening, second: Opening, distance: number): number {
  if (first.holeRadius === null || second.holeRadius === null || distance > INNER_REACH) return 0;
  const ratio = (first.holeRadius + second.holeRadius) / (first.boreRadius + second.boreRadius);
  return innerCoupling(distance, first.angle - second.angle, ratio);
}

/**
 * Works the coupling out for the frequency that the airs are set to.
 *
 * @param cells - the column's
 * @param coupling - the pairs
 * @param outside - address of the air outside
 * @param wanted - whether an opening takes part, by its place; others are left as they are
 * @returns nothing; the result is in the cells
 */
export function tuneCoupling(cells: Cells, coupling: Coupling, outside: number, wanted: Uint8Array): void {
  const k = cell(cells, outside);
  for (let i = 0; i < coupling.openings; i += 1) if (wanted[i] === 1) writeWave(coupling, i, k);
  for (const pair of coupling.pairs) {
    if (wanted[pair.first] === 1 && wanted[pair.second] === 1) writePair(cells, coupling, outside, pair);
  }
}

/**
 * Works one pair out.
 *
 * @param cells - the column's
 * @param coupling - the pairs
 * @param outside - address of the air outside
 * @param pair - the pair
 * @returns nothing; the result is in the cells
 */
export function tunePair(cells: Cells, coupling: Coupling, outside: number, pair: CoupledPair): void {
  const k = cell(cells, outside);
  writeWave(coupling, pair.first, k);
  writeWave(coupling, pair.second, k);
  writePair(cells, coupling, outside, pair);
}

function writeWave({ positions, waves }: Coupling, opening: number, wavenumber: number): void {
  const phase = wavenumber * cell(positions, opening);
  waves[4 * opening] = Math.cos(phase);
  waves[4 * opening + 1] = Math.sin(phase);
  waves[4 * opening + 2] = Math.cos(BODY_SHARE * phase);
  waves[4 * opening + 3] = Math.sin(BODY_SHARE * phase);
}

const travel: Travel = { phase: 0, cosine: 1, sine: 0, bodySine: 0 };

// From one opening to the other, by the sines of a difference.
function writeTravel(
  { positions, waves }: Coupling,
  first: number,
  second: number,
  wavenumber: number,
): void {
  const forward = cell(positions, first) < cell(positions, second);
  const a = 4 * (forward ? first : second);
  const b = 4 * (forward ? second : first);
  travel.phase = wavenumber * Math.abs(cell(positions, second) - cell(positions, first));
  travel.cosine = cell(waves, b) * cell(waves, a) + cell(waves, b + 1) * cell(waves, a + 1);
  travel.sine = cell(waves, b + 1) * cell(waves, a) - cell(waves, b) * cell(waves, a + 1);
  travel.bodySine = cell(waves, b + 3) * cell(waves, a + 2) - cell(waves, b + 2) * cell(waves, a + 3);
}

const radiated: { out: Cells; at: number } = { out: new Float64Array(0), at: 0 };

function writePair(cells: Cells, coupling: Coupling, outside: number, pair: CoupledPair): void {
  const k = cell(cells, outside);
  const reactance = k * cell(cells, outside + 1);
  const { openings, outer, inner } = coupling;
  const at = outer + 2 * (pair.first * openings + pair.second);
  const mirror = outer + 2 * (pair.second * openings + pair.first);
  if (pair.sides === null) {
    footMutualRadiation(k, pair.distance, cells, at);
  } else {
    writeTravel(coupling, pair.first, pair.second, k);
    radiated.out = cells;
    radiated.at = at;
    mutualRadiationAfter(k, pair.sides, travel, radiated);
  }
  const scale = reactance / (4 * Math.PI);
  const re = -scale * cell(cells, at + 1);
  cells[at + 1] = scale * cell(cells, at);
  cells[at] = re;
  cells[mirror] = re;
  cells[mirror + 1] = cell(cells, at + 1);
  const within = reactance * pair.inner;
  cells[inner + pair.first * openings + pair.second] = within;
  cells[inner + pair.second * openings + pair.first] = within;
}
