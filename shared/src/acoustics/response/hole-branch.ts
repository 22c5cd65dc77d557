import { cell, type Cells } from '../complex/cells.ts';
import { writeCone } from '../bore/cone.ts';
import { writeCylinder } from '../bore/cylinder.ts';
import {
  TWO_PORT_CELLS,
  appendReactance,
  appendTwoPort,
  prependReactance,
  prependSusceptance,
  writeIdentity,
} from '../complex/two-port.ts';
import { selfRadiation } from '../radiation/cylinder-radiation.ts';
import { NODE_COMPLIANCE_RATIO } from '../tone-hole/node-compliance.ts';
import type { BorePlan, Slice } from './bore-plan.ts';
import { holeShape, type HoleShape } from './hole-shape.ts';
import type { ColumnHole, HoleState } from './column.ts';

/**
 * A tone hole in one state as the column meets it: half the series length, the branch, half the series length.
 *
 * Numbers are lengths over areas (1/m) or volumes (m³); addresses point into the column's cells.
 */
export interface HoleBranch {
  hole: number;
  state: HoleState;
  closed: boolean;
  medium: number;
  shape: HoleShape;
  chimney: Slice[];
  /** How far the acting axis lies on the foot side of the hole's own, m; and the duct it is moved in. */
  shift: number;
  shiftDuct: number;
  /** Two-port of the axis' shift with half the series length behind it, and the same turned round. */
  before: number;
  after: number;
  /** Two-port from the bore to the outlet, radiation left out. */
  inside: number;
  /** Radiation impedance of the outlet. */
  radiation: number;
  /** Admittance that the whole branch shows the bore. */
  shunt: number;
  /** Im of half the series impedance. */
  series: number;
}

/**
 * Lays out a tone hole in one state.
 *
 * @param plan - the column's cells
 * @param hole - the hole
 * @param index - its place among the holes, mouth side first
 * @param state - open, closed or half-covered
 * @returns the branch
 * @throws EngineInputError where no formula holds
 */
export function planHoleBranch(
  plan: BorePlan,
  hole: ColumnHole,
  index: number,
  state: HoleState,
): HoleBranch {
  const medium = plan.mediumAt(hole.position);
  const shape = holeShape(hole, state);
  return {
    hole: index,
    state,
    closed: state.kind === 'closed',
    medium,
    shape,
    chimney: planChimney(plan, shape, medium),
    shift: shape.shift,
    shiftDuct: shape.shift === 0 ? 0 : plan.duct(hole.boreRadius, medium),
    before: plan.take(TWO_PORT_CELLS),
    after: plan.take(TWO_PORT_CELLS),
    inside: plan.take(TWO_PORT_CELLS),
    radiation: plan.take(2),
    shunt: plan.take(2),
    series: plan.take(1),
  };
}

/**
 * Slices of a chimney from the bore outwards.
 *
 * @param plan - the column's cells
 * @param shape - the hole's
 * @param medium - address of the air in it
 * @returns the slices
 */
export function planChimney(plan: BorePlan, shape: HoleShape, medium: number): Slice[] {
  return shape.chimney.flatMap((piece) =>
    piece.length > 0
      ? plan.slices(
          { position: 0, radius: piece.innerRadius },
          { position: piece.length, radius: piece.outerRadius },
          medium,
        )
      : [plan.negativeSlice(piece.outerRadius, piece.length, medium)],
  );
}

/**
 * Works a branch out for the frequency that the airs and ducts are set to.
 *
 * @param cells - the column's
 * @param branch - the branch
 * @param outside - address of the air outside
 * @returns nothing; the result is in the cells
 */
export function tuneHoleBranch(cells: Cells, branch: HoleBranch, outside: number): void {
  const { shape, medium, inside, shunt } = branch;
  const reactance = cell(cells, medium) * cell(cells, medium + 1);
  const series = reactance * shape.halfSeries;
  cells[branch.series] = series;
  if (branch.shift !== 0) tuneShift(cells, branch);
  writeSlices(cells, inside, branch.chimney);
  prependReactance(cells, inside, reactance * shape.inner);
  if (branch.closed) {
    writeRatio(cells, inside + 4, inside, shunt);
    return;
  }
  const { radiation } = branch;
  const volume = NODE_COMPLIANCE_RATIO * Math.PI * shape.innerRadius ** 3;
  prependSusceptance(cells, inside, (cell(cells, medium) * volume) / cell(cells, medium + 1));
  const k = cell(cells, outside);
  const outer = k * cell(cells, outside + 1);
  selfRadiation(k * shape.outerRadius, cells, radiation);
  const body = outer / (4 * Math.PI * shape.outerRadius);
  const re = -body * cell(cells, radiation + 1);
  cells[radiation + 1] = outer * shape.outlet + body * cell(cells, radiation);
  cells[radiation] = re;
  cells[shunt] = cell(cells, radiation);
  cells[shunt + 1] = cell(cells, radiation + 1);
  loadedAdmittance(cells, inside, shunt);
}

/**
 * Two-port of slices one after another.
 *
 * @param cells - the column's
 * @param at - address to write to
 * @param slices - in order; none change nothing
 * @returns nothing; the result is in the cells
 */
export function writeSlices(cells: Cells, at: number, slices: readonly Slice[]): void {
  const first = slices[0];
  if (first === undefined) writeIdentity(cells, at);
  else writeSlice(cells, at, first);
  for (let i = 1; i < slices.length; i += 1) {
    const slice = slices[i];
    if (slice === undefined) continue;
    writeSlice(cells, SCRATCH, slice);
    appendTwoPort(cells, at, SCRATCH);
  }
}

/** The first cells of every column serve as scratch. */
export const SCRATCH = 0;

/**
 * Two-port of one slice.
 *
 * @param cells - the column's
 * @param at - address to write to
 * @param slice - the slice
 * @returns nothing; the result is in the cells
 */
export function writeSlice(cells: Cells, at: number, slice: Slice): void {
  if (slice.conical) writeCone(cells, at, slice.duct, slice.at);
  else writeCylinder(cells, at, slice.duct, cell(cells, slice.at + 2));
}

function tuneShift(cells: Cells, branch: HoleBranch): void {
  writeCylinder(cells, branch.before, branch.shiftDuct, branch.shift);
  appendReactance(cells, branch.before, branch.series);
  writeIdentity(cells, branch.after);
  appendReactance(cells, branch.after, branch.series);
  writeCylinder(cells, SCRATCH, branch.shiftDuct, -branch.shift);
  appendTwoPort(cells, branch.after, SCRATCH);
}

// out ← numerator / denominator, complex.
function writeRatio(cells: Cells, numerator: number, denominator: number, out: number): void {
  const nr = cell(cells, numerator);
  const ni = cell(cells, numerator + 1);
  const dr = cell(cells, denominator);
  const di = cell(cells, denominator + 1);
  const scale = 1 / (dr * dr + di * di);
  cells[out] = (nr * dr + ni * di) * scale;
  cells[out + 1] = (ni * dr - nr * di) * scale;
}

// load ← (C·load + D)/(A·load + B).
function loadedAdmittance(cells: Cells, at: number, load: number): void {
  const zr = cell(cells, load);
  const zi = cell(cells, load + 1);
  const nr = cell(cells, at) * zr - cell(cells, at + 1) * zi + cell(cells, at + 2);
  const ni = cell(cells, at) * zi + cell(cells, at + 1) * zr + cell(cells, at + 3);
  const dr = cell(cells, at + 4) * zr - cell(cells, at + 5) * zi + cell(cells, at + 6);
  const di = cell(cells, at + 4) * zi + cell(cells, at + 5) * zr + cell(cells, at + 7);
  const scale = 1 / (nr * nr + ni * ni);
  cells[load] = (dr * nr + di * ni) * scale;
  cells[load + 1] = (di * nr - dr * ni) * scale;
}
