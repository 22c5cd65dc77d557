import { cell, type Cells } from '../complex/cells.ts';
import { passReactance, passTwoPort } from './chain.ts';
import { coupledImpedance } from './input-impedance.ts';
import { outflowAt } from './opening-system.ts';
import type { FingeringBranches, PreparedColumn } from './prepared-column.ts';

/** Cells of pressure and flow at one cross-section, real and imaginary parts. */
export const STATE_CELLS = 4;

/** Pressure and flow everywhere for unit flow into the mouth end; four cells each, by segment or by hole. */
export interface ColumnStates {
  impedance: [re: number, im: number];
  /** Behind the mouth end's outlet. */
  outlet: Float64Array;
  /** At the mouth side and the foot side of every segment. */
  segmentMouth: Float64Array;
  segmentFoot: Float64Array;
  /** On a hole's axis: pressure, and flow coming from the mouth; then flow going on to the foot. */
  axisAbove: Float64Array;
  axisBelow: Float64Array;
  /** What goes into an open hole, and what comes out of it at its outlet; the foot's own at the end. */
  inner: Float64Array;
  outer: Float64Array;
}

/**
 * Room for the states of a column.
 *
 * @param holes - how many it has
 * @returns the room
 */
export function columnStates(holes: number): ColumnStates {
  const room = () => new Float64Array(STATE_CELLS * (holes + 1));
  return {
    impedance: [NaN, NaN],
    outlet: new Float64Array(STATE_CELLS),
    segmentMouth: room(),
    segmentFoot: room(),
    axisAbove: room(),
    axisBelow: room(),
    inner: room(),
    outer: room(),
  };
}

/**
 * Solves a fingering and writes pressure and flow everywhere.
 *
 * @param prepared - the column, set to a frequency with coupling
 * @param fingering - its branches
 * @param out - the states to write
 * @returns nothing; the result is in `out`
 */
export function solveStates(prepared: PreparedColumn, fingering: FingeringBranches, out: ColumnStates): void {
  const { cells, branches, segments } = prepared;
  const at = coupledImpedance(prepared, fingering);
  out.impedance = [cell(cells, at), cell(cells, at + 1)];
  writeOpeningStates(prepared, out);
  startAtFoot(prepared, fingering.length, out);
  for (let h = fingering.length; h >= 0; h -= 1) {
    const segment = segments[h];
    if (segment === undefined) continue;
    keepState(out.segmentFoot, STATE_CELLS * h);
    passTwoPort(cells, segment.twoPort, state);
    keepState(out.segmentMouth, STATE_CELLS * h);
    const branch = h === 0 ? undefined : branches[fingering[h - 1] ?? -1];
    if (branch === undefined) continue;
    const place = STATE_CELLS * (h - 1);
    if (branch.shift === 0) passReactance(state, cell(cells, branch.series));
    else passTwoPort(cells, branch.after, state);
    keepState(out.axisBelow, place);
    addBranchFlow(cells, branch.closed ? branch.shunt : -1, out.inner, place);
    keepState(out.axisAbove, place);
    if (branch.shift === 0) passReactance(state, cell(cells, branch.series));
    else passTwoPort(cells, branch.before, state);
  }
  writeOutlet(prepared, out);
}

const state = new Float64Array(STATE_CELLS);
const sum = new Float64Array(2);

// A loop: for so few cells `set` costs several times as much.
function keepState(to: Float64Array, at: number): void {
  for (let i = 0; i < STATE_CELLS; i += 1) to[at + i] = cell(state, i);
}

// At each node: pressure and flow at the outlet and, through the two-port of the hole, at the bore.
function writeOpeningStates(prepared: PreparedColumn, out: ColumnStates): void {
  const { cells, branches, coupling, system } = prepared;
  for (let i = 0; i < system.nodes; i += 1) {
    const branch = branches[system.branch[i] ?? -1];
    const own = branch === undefined ? prepared.footRadiation : branch.radiation;
    const opening = system.opening[i] ?? 0;
    const row = coupling.outer + 2 * opening * coupling.openings;
    const mouth = row + 2 * (coupling.openings - 1);
    sum[0] = -cell(cells, mouth);
    sum[1] = -cell(cells, mouth + 1);
    for (let j = 0; j < system.nodes; j += 1) {
      if (i !== j) addProduct(cells, row + 2 * (system.opening[j] ?? 0), outflowAt(system, j));
    }
    const flow = outflowAt(system, i);
    addProduct(cells, own, flow);
    state[0] = cell(sum, 0);
    state[1] = cell(sum, 1);
    state[2] = cell(cells, flow);
    state[3] = cell(cells, flow + 1);
    keepState(out.outer, STATE_CELLS * opening);
    passTwoPort(cells, branch === undefined ? prepared.footTwoPort : branch.inside, state);
    keepState(out.inner, STATE_CELLS * opening);
  }
}

function addProduct(cells: Cells, a: number, b: number): void {
  sum[0] = cell(sum, 0) + cell(cells, a) * cell(cells, b) - cell(cells, a + 1) * cell(cells, b + 1);
  sum[1] = cell(sum, 1) + cell(cells, a) * cell(cells, b + 1) + cell(cells, a + 1) * cell(cells, b);
}

function startAtFoot(prepared: PreparedColumn, holes: number, out: ColumnStates): void {
  const { cells, foot, system } = prepared;
  if (foot.kind !== 'stopped') {
    state.set(out.inner.subarray(STATE_CELLS * holes, STATE_CELLS * (holes + 1)));
    return;
  }
  // Nothing flows at a stop. Its pressure follows from that on the axis of the last open hole, else from the mouth's flow.
  const last = system.nodes - 1;
  const driven = last < 0;
  const row = system.between + 8 * system.nodes + (driven ? 4 : 0);
  if (driven) {
    sum[0] = 1;
    sum[1] = 0;
  } else {
    writeAxisPressure(prepared, last);
  }
  const ar = cell(cells, row);
  const ai = cell(cells, row + 1);
  const norm = ar * ar + ai * ai;
  state.fill(0);
  state[0] = (cell(sum, 0) * ar + cell(sum, 1) * ai) / norm;
  state[1] = (cell(sum, 1) * ar - cell(sum, 0) * ai) / norm;
}

// Pressure on the axis of an open hole: that of its own branch and of the evanescent fields of the others.
function writeAxisPressure({ cells, system }: PreparedColumn, node: number): void {
  const row = system.pressure + 2 * node * (system.nodes + 1);
  sum[0] = -cell(cells, row + 2 * system.nodes);
  sum[1] = -cell(cells, row + 2 * system.nodes + 1);
  for (let j = 0; j < system.nodes; j += 1) addProduct(cells, row + 2 * j, outflowAt(system, j));
}

// Flow that comes from the mouth: what goes on, and what goes into the hole.
function addBranchFlow(cells: Cells, shunt: number, inner: Float64Array, place: number): void {
  if (shunt < 0) {
    state[2] = cell(state, 2) + cell(inner, place + 2);
    state[3] = cell(state, 3) + cell(inner, place + 3);
    return;
  }
  const yr = cell(cells, shunt);
  const yi = cell(cells, shunt + 1);
  state[2] = cell(state, 2) + yr * cell(state, 0) - yi * cell(state, 1);
  state[3] = cell(state, 3) + yr * cell(state, 1) + yi * cell(state, 0);
}

function writeOutlet({ cells, mouth }: PreparedColumn, out: ColumnStates): void {
  passTwoPort(cells, mouth.twoPort, state);
  keepState(out.outlet, 0);
}
