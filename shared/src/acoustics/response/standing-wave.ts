import { cell } from '../complex/cells.ts';
import type { Segment, Slice } from './bore-plan.ts';
import { CHAIN_CELLS, passReactance, passTwoPort, type ChainState } from './chain.ts';
import { writeSlice } from './hole-branch.ts';
import { coupledImpedance } from './input-impedance.ts';
import { outflowAt } from './opening-system.ts';
import { tuneColumn, type FingeringBranches, type PreparedColumn } from './prepared-column.ts';

/** Magnitude of the pressure at a place in the bore for unit flow into the mouth end. */
export interface PressurePoint {
  /** m */
  position: number;
  /** Pa·s/m³ */
  pressure: number;
}

export interface Wave {
  frequency: number;
  foot: number;
  coupling: boolean;
}

/**
 * Pressure along the bore at one frequency, from the foot to the input, at the ends of all slices.
 *
 * @param prepared - the column, freshly prepared; put points into its bore where the pressure is wanted
 * @param fingering - its branches
 * @param wave - what is asked
 * @param wave.frequency - Hz, > 0
 * @param wave.foot - position of the foot, m
 * @param wave.coupling - false: openings do not hear each other
 * @returns the points, foot first
 */
export function pressureAlongBore(
  prepared: PreparedColumn,
  fingering: FingeringBranches,
  { frequency, foot, coupling }: Wave,
): PressurePoint[] {
  // A fresh column's mutual impedances are 0 until they are worked out.
  tuneColumn(prepared, frequency, coupling);
  coupledImpedance(prepared, fingering);
  const { cells, segments, branches, system } = prepared;
  const points: PressurePoint[] = [];
  let node = system.nodes;
  let position = foot;
  const state = new Float64Array(CHAIN_CELLS);
  if (prepared.foot.kind === 'stopped') {
    startAtStop(prepared, state);
  } else {
    node -= 1;
    writeNode(prepared, node, state);
  }
  for (let h = fingering.length; h >= 0; h -= 1) {
    const segment = segments[h];
    if (segment !== undefined) position = passSegment(prepared, segment, state, { points, position });
    const branch = h === 0 ? undefined : branches[fingering[h - 1] ?? -1];
    if (branch === undefined) continue;
    if (branch.shift === 0) passReactance(state, cell(cells, branch.series));
    else passTwoPort(cells, branch.after, state);
    if (branch.closed) {
      addFlow(state, shuntFlow(cells, branch.shunt, state));
    } else {
      node -= 1;
      writeNode(prepared, node, leaving);
      addFlow(state, [cell(leaving, 2), cell(leaving, 3)]);
    }
    if (branch.shift === 0) passReactance(state, cell(cells, branch.series));
    else passTwoPort(cells, branch.before, state);
  }
  return points;
}

const leaving = new Float64Array(CHAIN_CELLS);

// Pressure at a node and flow that leaves the bore there.
function writeNode({ cells, system }: PreparedColumn, node: number, out: ChainState): void {
  const stride = 2 * (system.nodes + 1);
  [system.pressure, system.flow].forEach((square, part) => {
    const row = square + node * stride;
    let re = -cell(cells, row + 2 * system.nodes);
    let im = -cell(cells, row + 2 * system.nodes + 1);
    for (let j = 0; j < system.nodes; j += 1) {
      const at = outflowAt(system, j);
      const xr = cell(cells, row + 2 * j);
      const xi = cell(cells, row + 2 * j + 1);
      re += xr * cell(cells, at) - xi * cell(cells, at + 1);
      im += xr * cell(cells, at + 1) + xi * cell(cells, at);
    }
    out[2 * part] = re;
    out[2 * part + 1] = im;
  });
}

// At a stopped foot nothing flows; the pressure follows from the last node, or from the mouth where no hole is open.
function startAtStop(prepared: PreparedColumn, out: ChainState): void {
  const { cells, system } = prepared;
  const at = system.between + 8 * system.nodes;
  const known = new Float64Array(CHAIN_CELLS);
  const driven = system.nodes === 0;
  if (driven) known[0] = 1;
  else writeNode(prepared, system.nodes - 1, known);
  const row = driven ? at + 4 : at;
  const ar = cell(cells, row);
  const ai = cell(cells, row + 1);
  const norm = ar * ar + ai * ai;
  out.fill(0);
  out[0] = (cell(known, 0) * ar + cell(known, 1) * ai) / norm;
  out[1] = (cell(known, 1) * ar - cell(known, 0) * ai) / norm;
}

function shuntFlow(cells: Float64Array, at: number, state: ChainState): [number, number] {
  const yr = cell(cells, at);
  const yi = cell(cells, at + 1);
  return [yr * cell(state, 0) - yi * cell(state, 1), yr * cell(state, 1) + yi * cell(state, 0)];
}

function addFlow(state: ChainState, [re, im]: [number, number]): void {
  state[2] = cell(state, 2) + re;
  state[3] = cell(state, 3) + im;
}

interface Walk {
  points: PressurePoint[];
  position: number;
}

function passSegment({ cells }: PreparedColumn, segment: Segment, state: ChainState, walk: Walk): number {
  let { position } = walk;
  const record = () => walk.points.push({ position, pressure: Math.hypot(cell(state, 0), cell(state, 1)) });
  record();
  const slices: Slice[] = segment.links.flatMap((link) => link.slices).reverse();
  for (const slice of slices) {
    writeSlice(cells, 0, slice);
    passTwoPort(cells, 0, state);
    position -= cell(cells, slice.at + 2);
    record();
  }
  return position;
}
