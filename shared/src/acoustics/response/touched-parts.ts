import type { Cells } from '../complex/cells.ts';
import { BorePlan, type Segment } from './bore-plan.ts';
import type { Column } from './column.ts';
import { planCoupling, type Coupling } from './coupling.ts';
import { planHoleBranch, tuneHoleBranch, type HoleBranch } from './hole-branch.ts';
import { planMouthBranch, tuneMouthBranch, type MouthBranch } from './mouth-branch.ts';
import {
  planSegment,
  tuneDucts,
  tuneFoot,
  tuneSegment,
  type FingeringBranches,
  type PreparedColumn,
} from './prepared-column.ts';

/** Parts of a column that a dimension changes. */
export interface Touched {
  /** Segments, by their place. */
  segments: number[];
  /** Holes, by their place. */
  holes: number[];
  mouth: boolean;
  foot: boolean;
}

/** The touched parts of a changed column, each at the place that it has in the column; null stands for all others. */
export interface TouchedParts {
  cells: Cells;
  plan: BorePlan;
  segments: (Segment | null)[];
  branches: (HoleBranch | null)[];
  mouth: MouthBranch | null;
  /** Pairs of which a touched opening is one. */
  coupling: Coupling;
  foot: Column['foot'];
  footRadius: number;
  footRadiation: number;
}

/**
 * Lays out only what a dimension changes: a whole column for each dimension would cost as much as all the rest together.
 *
 * @param prepared - the column as it is
 * @param changed - the column with the dimension changed
 * @param touched - what the dimension changes
 * @returns the parts
 * @throws EngineInputError where a formula refuses
 */
export function planTouched(prepared: PreparedColumn, changed: Column, touched: Touched): TouchedParts {
  const plan = new BorePlan(changed.outside, changed.warmth);
  const mouth = touched.mouth ? planMouthBranch(plan, changed) : null;
  const opening = mouth === null ? prepared.mouth.opening : mouth.opening;
  const openings = prepared.coupling.openings;
  const parts = {
    segments: prepared.segments.map((_, i) =>
      touched.segments.includes(i) ? planSegment(plan, changed, i) : null,
    ),
    branches: prepared.branches.map(({ hole: index, state }) => {
      const hole = touched.holes.includes(index) ? changed.holes[index] : undefined;
      return hole === undefined ? null : planHoleBranch(plan, hole, index, state);
    }),
    coupling: planCoupling(
      plan,
      changed,
      opening,
      (first, second) => isTouched(touched, openings, first) || isTouched(touched, openings, second),
    ),
    footRadiation: plan.take(2),
  };
  const footRadius = changed.bore.at(-1)?.radius ?? NaN;
  return { ...parts, mouth, foot: changed.foot, footRadius, plan, cells: plan.cells() };
}

function isTouched(touched: Touched, openings: number, opening: number): boolean {
  if (opening === openings - 1) return touched.mouth;
  return opening === openings - 2 ? touched.foot : touched.holes.includes(opening);
}

/**
 * Sets the touched parts to a frequency, as far as a fingering uses them, and leaves the coupling.
 *
 * @param parts - the parts
 * @param fingering - its branches
 * @param touched - what the dimension changes
 * @param frequency - Hz, > 0
 * @returns nothing; the result is in the parts' cells
 */
export function tuneTouched(
  parts: TouchedParts,
  fingering: FingeringBranches,
  touched: Touched,
  frequency: number,
): void {
  const { cells, plan, branches, segments, mouth } = parts;
  tuneDucts(parts, frequency);
  for (const place of touched.segments) {
    const segment = segments[place];
    if (segment) tuneSegment(cells, segment);
  }
  for (const place of touched.holes) {
    const branch = branches[fingering[place] ?? -1];
    if (branch) tuneHoleBranch(cells, branch, plan.outside);
  }
  if (mouth !== null) tuneMouthBranch(cells, mouth, plan.outside);
  if (touched.foot) tuneFoot(parts);
}
