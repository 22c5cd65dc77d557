import { cell, type Cells } from '../complex/cells.ts';
import {
  TWO_PORT_CELLS,
  appendReactance,
  appendShunt,
  appendTwoPort,
  copyTwoPort,
  writeIdentity,
} from '../complex/two-port.ts';
import { solveComplex } from '../numerics/linear-solve.ts';
import type { HoleBranch } from './hole-branch.ts';
import { outflowAt, type OpeningSystem } from './opening-system.ts';
import type { FingeringBranches, PreparedColumn } from './prepared-column.ts';

const quotient = new Float64Array(2);

/**
 * Input impedance at the mouth end's outlet, all openings coupled through the air outside and inside the bore.
 *
 * The column must be set to a frequency with coupling. Holds while holes are small against the wavelength.
 *
 * @param prepared - the column, set to a frequency
 * @param fingering - its branches
 * @returns address of the impedance in the column's cells, Pa·s/m³
 * @source A. Lefebvre, G. P. Scavone and J. Kergomard, Acta Acustica united with Acustica 99 (2013) 975
 */
export function coupledImpedance(prepared: PreparedColumn, fingering: FingeringBranches): number {
  const { cells, system } = prepared;
  gatherNodes(prepared, fingering);
  if (system.nodes === 0) {
    divide(cells, system.between, system.between + 4);
    cells[system.impedance] = cell(quotient, 0);
    cells[system.impedance + 1] = cell(quotient, 1);
    return system.impedance;
  }
  writeLadder(prepared);
  writeOpenings(prepared);
  writeInnerCoupling(prepared);
  writeEquations(prepared);
  solveComplex(cells, system.matrix, system.nodes);
  finishImpedance(prepared);
  return system.impedance;
}

// quotient ← one complex cell over another.
function divide(cells: Cells, numerator: number, denominator: number): void {
  const nr = cell(cells, numerator);
  const ni = cell(cells, numerator + 1);
  const dr = cell(cells, denominator);
  const di = cell(cells, denominator + 1);
  const scale = 1 / (dr * dr + di * di);
  quotient[0] = (nr * dr + ni * di) * scale;
  quotient[1] = (ni * dr - nr * di) * scale;
}

// Two-ports from the mouth's outlet to the first open hole, on to the next, … to the foot.
function gatherNodes(prepared: PreparedColumn, fingering: FingeringBranches): void {
  const { cells, segments, branches, system } = prepared;
  let at = system.between;
  let nodes = 0;
  copyTwoPort(cells, prepared.mouth.twoPort, at);
  for (let h = 0; h < fingering.length; h += 1) {
    appendTwoPort(cells, at, segments[h]?.twoPort ?? 0);
    const place = fingering[h] ?? 0;
    const branch = branches[place];
    if (branch === undefined) continue;
    appendHalfSeries(cells, at, branch, branch.before);
    if (branch.closed) {
      appendShunt(cells, at, branch.shunt);
    } else {
      system.branch[nodes] = place;
      system.opening[nodes] = h;
      nodes += 1;
      at = system.between + nodes * TWO_PORT_CELLS;
      writeIdentity(cells, at);
    }
    appendHalfSeries(cells, at, branch, branch.after);
  }
  appendTwoPort(cells, at, segments[fingering.length]?.twoPort ?? 0);
  if (prepared.foot.kind !== 'stopped') {
    system.branch[nodes] = -1;
    system.opening[nodes] = fingering.length;
    nodes += 1;
  }
  system.nodes = nodes;
  keepFromZero(prepared);
}

/** Least entry to divide by, in its own unit: what it shifts and what rounding makes of the quotient are then alike. */
const LEAST = 1e-8;

// A stretch a quarter or half a wave long, without losses, has an entry of exactly 0 that its admittance is divided by.
function keepFromZero({ cells, system, foot, inputImpedance }: PreparedColumn): void {
  const { nodes, between } = system;
  if (nodes === 0) {
    keepReactance(cells, between + 4, LEAST / inputImpedance);
    return;
  }
  keepRatio(cells, between + 6);
  for (let i = 1; i < nodes; i += 1) {
    keepReactance(cells, between + i * TWO_PORT_CELLS + 2, LEAST * inputImpedance);
  }
  if (foot.kind === 'stopped') keepRatio(cells, between + nodes * TWO_PORT_CELLS);
}

function keepRatio(cells: Cells, at: number): void {
  if (Math.abs(cell(cells, at)) + Math.abs(cell(cells, at + 1)) < LEAST) cells[at] = LEAST;
}

function keepReactance(cells: Cells, at: number, least: number): void {
  if (Math.abs(cell(cells, at)) + Math.abs(cell(cells, at + 1)) < least) cells[at + 1] = least;
}

function appendHalfSeries(cells: Cells, at: number, branch: HoleBranch, shifted: number): void {
  if (branch.shift === 0) appendReactance(cells, at, branch.series);
  else appendTwoPort(cells, at, shifted);
}

// Admittances of the bore at the nodes, the mouth driven by unit flow.
function writeLadder({ cells, system, foot }: PreparedColumn): void {
  const { nodes, between, diagonal, beside } = system;
  divide(cells, between + 4, between + 6);
  cells[diagonal] = cell(quotient, 0);
  cells[diagonal + 1] = cell(quotient, 1);
  for (let i = 1; i < nodes; i += 1) {
    const at = between + i * TWO_PORT_CELLS;
    divide(cells, at + 6, at + 2);
    addQuotient(cells, diagonal + 2 * i - 2);
    divide(cells, at, at + 2);
    cells[diagonal + 2 * i] = cell(quotient, 0);
    cells[diagonal + 2 * i + 1] = cell(quotient, 1);
    reciprocal(cells, at + 2);
    cells[beside + 2 * i] = -cell(quotient, 0);
    cells[beside + 2 * i + 1] = -cell(quotient, 1);
  }
  if (foot.kind !== 'stopped') return;
  const last = between + nodes * TWO_PORT_CELLS;
  divide(cells, last + 4, last);
  addQuotient(cells, diagonal + 2 * nodes - 2);
}

function addQuotient(cells: Cells, at: number): void {
  cells[at] = cell(cells, at) + cell(quotient, 0);
  cells[at + 1] = cell(cells, at + 1) + cell(quotient, 1);
}

function reciprocal(cells: Cells, at: number): void {
  const re = cell(cells, at);
  const im = cell(cells, at + 1);
  const norm = re * re + im * im;
  quotient[0] = re / norm;
  quotient[1] = -im / norm;
}

// Pressure and flow at the bore's side of every opening for unit flow out of every other, and into the mouth.
function writeOpenings(prepared: PreparedColumn): void {
  const { cells, branches, system } = prepared;
  const { nodes, pressure, flow } = system;
  for (let i = 0; i < nodes; i += 1) {
    const branch = branches[system.branch[i] ?? -1];
    const inside = branch?.inside ?? prepared.footTwoPort;
    const row = 2 * i * (nodes + 1);
    hearOthers(prepared, i, inside, pressure + row);
    hearOthers(prepared, i, inside + 4, flow + row);
    const radiation = branch?.radiation ?? prepared.footRadiation;
    addOwnRadiation(cells, inside, radiation, pressure + row + 2 * i);
    addOwnRadiation(cells, inside + 4, radiation, flow + row + 2 * i);
  }
}

// A row of the pressures or flows: one number of the opening's two-port times its mutual impedances with all others.
function hearOthers(
  { cells, coupling, system }: PreparedColumn,
  node: number,
  first: number,
  to: number,
): void {
  const { nodes, opening } = system;
  const heard = coupling.outer + 2 * (opening[node] ?? 0) * coupling.openings;
  const ar = cell(cells, first);
  const ai = cell(cells, first + 1);
  for (let j = 0; j <= nodes; j += 1) {
    const from = heard + 2 * (j === nodes ? coupling.openings - 1 : (opening[j] ?? 0));
    const zr = cell(cells, from);
    const zi = cell(cells, from + 1);
    cells[to + 2 * j] = ar * zr - ai * zi;
    cells[to + 2 * j + 1] = ar * zi + ai * zr;
  }
}

// out ← Z · first + second: what an opening's own flow and radiation make of a row of its two-port.
function addOwnRadiation(cells: Cells, row: number, radiation: number, out: number): void {
  passThrough(cells, row, radiation, out);
  cells[out] = cell(cells, out) + cell(cells, row + 2);
  cells[out + 1] = cell(cells, out + 1) + cell(cells, row + 3);
}

// out ← one complex cell times another.
function passThrough(cells: Cells, a: number, b: number, out: number): void {
  const ar = cell(cells, a);
  const ai = cell(cells, a + 1);
  const br = cell(cells, b);
  const bi = cell(cells, b + 1);
  cells[out] = ar * br - ai * bi;
  cells[out + 1] = ar * bi + ai * br;
}

// The evanescent field of one hole presses on the inner end of another.
function writeInnerCoupling({ cells, coupling, system }: PreparedColumn): void {
  const { nodes, opening, pressure, flow } = system;
  const stride = 2 * (nodes + 1);
  for (let i = 0; i < nodes; i += 1) {
    const heard = coupling.inner + (opening[i] ?? 0) * coupling.openings;
    for (let k = 0; k < nodes; k += 1) {
      const reactance = cell(cells, heard + (opening[k] ?? 0));
      if (reactance === 0) continue;
      const to = pressure + i * stride;
      const from = flow + k * stride;
      for (let j = 0; j < stride; j += 2) {
        cells[to + j] = cell(cells, to + j) - reactance * cell(cells, from + j + 1);
        cells[to + j + 1] = cell(cells, to + j + 1) + reactance * cell(cells, from + j);
      }
    }
  }
}

// Equations: flow out of the bore at every node, by the bore's admittances and by the opening, is nothing.
function writeEquations({ cells, system }: PreparedColumn): void {
  const { nodes, matrix } = system;
  for (let i = 0; i < nodes; i += 1) writeEquation(cells, system, i);
  reciprocal(cells, system.between + 6);
  addQuotient(cells, matrix + 2 * nodes);
}

// One equation: the flow into the opening, and the bore's admittances times the pressures at the node and beside it.
function writeEquation(cells: Cells, system: OpeningSystem, node: number): void {
  const { nodes, flow, matrix, pressure, diagonal, beside } = system;
  const stride = 2 * (nodes + 1);
  const above = node > 0 ? stride : 0;
  const below = node < nodes - 1 ? stride : 0;
  const dr = cell(cells, diagonal + 2 * node);
  const di = cell(cells, diagonal + 2 * node + 1);
  const ar = above === 0 ? 0 : cell(cells, beside + 2 * node);
  const ai = above === 0 ? 0 : cell(cells, beside + 2 * node + 1);
  const br = below === 0 ? 0 : cell(cells, beside + 2 * node + 2);
  const bi = below === 0 ? 0 : cell(cells, beside + 2 * node + 3);
  for (let j = node * stride; j < (node + 1) * stride; j += 2) {
    const at = pressure + j;
    const pr = cell(cells, at);
    const pi = cell(cells, at + 1);
    const qr = cell(cells, at - above);
    const qi = cell(cells, at - above + 1);
    const sr = cell(cells, at + below);
    const si = cell(cells, at + below + 1);
    cells[matrix + j] = cell(cells, flow + j) + dr * pr - di * pi + ar * qr - ai * qi + br * sr - bi * si;
    cells[matrix + j + 1] =
      cell(cells, flow + j + 1) + dr * pi + di * pr + ar * qi + ai * qr + br * si + bi * sr;
  }
}

// Z = (B + p)/D of the first two-port, less what the openings do to the mouth.
function finishImpedance({ cells, system, coupling }: PreparedColumn): void {
  const { nodes, pressure, between, opening, impedance } = system;
  let re = cell(cells, between + 2) - cell(cells, pressure + 2 * nodes);
  let im = cell(cells, between + 3) - cell(cells, pressure + 2 * nodes + 1);
  for (let j = 0; j < nodes; j += 1) {
    passThrough(cells, pressure + 2 * j, outflowAt(system, j), impedance);
    re += cell(cells, impedance);
    im += cell(cells, impedance + 1);
  }
  cells[impedance] = re;
  cells[impedance + 1] = im;
  divide(cells, impedance, between + 6);
  re = cell(quotient, 0);
  im = cell(quotient, 1);
  const mouth = coupling.outer + 2 * (coupling.openings - 1) * coupling.openings;
  for (let j = 0; j < nodes; j += 1) {
    passThrough(cells, mouth + 2 * (opening[j] ?? 0), outflowAt(system, j), impedance);
    re -= cell(cells, impedance);
    im -= cell(cells, impedance + 1);
  }
  cells[impedance] = re;
  cells[impedance + 1] = im;
}
