import { cell, type Cells } from '../complex/cells.ts';
import { TWO_PORT_CELLS } from '../complex/two-port.ts';
import { STATE_CELLS, type ColumnStates } from './column-states.ts';
import { tunePair, type CoupledPair } from './coupling.ts';
import type { FingeringBranches, PreparedColumn } from './prepared-column.ts';
import { tuneTouched, type Touched, type TouchedParts } from './touched-parts.ts';

/** What one dimension touches, with the dimension a little larger and a little smaller. */
export interface Perturbation {
  plus: TouchedParts;
  minus: TouchedParts;
  /** The difference between them, in the dimension's own unit. */
  difference: number;
  touched: Touched;
}

/**
 * How the input impedance changes with a dimension, from one solution of the whole column.
 *
 * For a two-port between states 1 and 2 the change is U₁·δp − p₁·δU with [δp; δU] = δT·[p₂; U₂], for unit flow at the mouth;
 * for the openings' radiation it is uᵀ·δZ·u. Only the two-ports that the dimension touches are worked out anew, larger and
 * smaller; the column is not solved again.
 *
 * @param prepared - the column, set to a frequency
 * @param fingering - its branches
 * @param states - of the column, solved at the frequency
 * @param perturbation - the dimension
 * @returns real and imaginary part, Pa·s/m³ per unit of the dimension
 * @source Tellegen's theorem for reciprocal networks; S. W. Director and R. A. Rohrer, IEEE Trans. Circuit Theory 16
 *   (1969) 318
 */
export function impedanceChange(
  prepared: PreparedColumn,
  fingering: FingeringBranches,
  states: ColumnStates,
  perturbation: Perturbation,
): [re: number, im: number] {
  const { plus, minus, difference, touched } = perturbation;
  tuneTouched(plus, fingering, touched, prepared.frequency);
  tuneTouched(minus, fingering, touched, prepared.frequency);
  total.fill(0);
  const change: Change = { prepared, plus, minus, states, fingering };
  for (const place of touched.segments) addSegment(change, place);
  for (const place of touched.holes) addHole(change, place);
  if (touched.mouth) addMouth(change);
  if (touched.foot) addFoot(change);
  addCoupling(change);
  return [cell(total, 0) / difference, cell(total, 1) / difference];
}

interface Change {
  prepared: PreparedColumn;
  plus: TouchedParts;
  minus: TouchedParts;
  states: ColumnStates;
  fingering: FingeringBranches;
}

const total = new Float64Array(2);
const delta = new Float64Array(TWO_PORT_CELLS);

// delta ← what a run of cells is in the larger column, less what it is in the smaller one.
function setDelta(plus: Cells, from: number, minus: Cells, to: number): void {
  for (let i = 0; i < TWO_PORT_CELLS; i += 1) delta[i] = cell(plus, from + i) - cell(minus, to + i);
}

// total ← total + U₁·δp − p₁·δU
function addTwoPort(first: Float64Array, i: number, second: Float64Array, j: number): void {
  const pr = rowRe(0, second, j);
  const pi = rowIm(0, second, j);
  const ur = rowRe(4, second, j);
  const ui = rowIm(4, second, j);
  addTo(
    cell(first, i + 2) * pr - cell(first, i + 3) * pi - cell(first, i) * ur + cell(first, i + 1) * ui,
    cell(first, i + 2) * pi + cell(first, i + 3) * pr - cell(first, i) * ui - cell(first, i + 1) * ur,
  );
}

function rowRe(row: number, s: Float64Array, j: number): number {
  return (
    cell(delta, row) * cell(s, j) -
    cell(delta, row + 1) * cell(s, j + 1) +
    cell(delta, row + 2) * cell(s, j + 2) -
    cell(delta, row + 3) * cell(s, j + 3)
  );
}

function rowIm(row: number, s: Float64Array, j: number): number {
  return (
    cell(delta, row) * cell(s, j + 1) +
    cell(delta, row + 1) * cell(s, j) +
    cell(delta, row + 2) * cell(s, j + 3) +
    cell(delta, row + 3) * cell(s, j + 2)
  );
}

function addTo(re: number, im: number): void {
  total[0] = cell(total, 0) + re;
  total[1] = cell(total, 1) + im;
}

function addSegment({ plus, minus, states }: Change, place: number): void {
  const larger = plus.segments[place];
  const smaller = minus.segments[place];
  if (!larger || !smaller) return;
  setDelta(plus.cells, larger.twoPort, minus.cells, smaller.twoPort);
  addTwoPort(states.segmentMouth, STATE_CELLS * place, states.segmentFoot, STATE_CELLS * place);
}

function addHole({ plus, minus, states, fingering }: Change, place: number): void {
  const larger = plus.branches[fingering[place] ?? -1];
  const smaller = minus.branches[fingering[place] ?? -1];
  if (!larger || !smaller) return;
  const at = STATE_CELLS * place;
  const { axisAbove, axisBelow, segmentFoot, segmentMouth, inner, outer } = states;
  if (larger.shift === 0 && smaller.shift === 0) {
    const series = cell(plus.cells, larger.series) - cell(minus.cells, smaller.series);
    addProduct(axisAbove, at + 2, axisAbove, [0, series]);
    addProduct(axisBelow, at + 2, axisBelow, [0, series]);
  } else {
    setDelta(plus.cells, larger.before, minus.cells, smaller.before);
    addTwoPort(segmentFoot, at, axisAbove, at);
    setDelta(plus.cells, larger.after, minus.cells, smaller.after);
    addTwoPort(axisBelow, at, segmentMouth, at + STATE_CELLS);
  }
  if (larger.closed) {
    const yr = cell(plus.cells, larger.shunt) - cell(minus.cells, smaller.shunt);
    const yi = cell(plus.cells, larger.shunt + 1) - cell(minus.cells, smaller.shunt + 1);
    addProduct(axisBelow, at, axisBelow, [-yr, -yi]);
    return;
  }
  setDelta(plus.cells, larger.inside, minus.cells, smaller.inside);
  addTwoPort(inner, at, outer, at);
  addProduct(outer, at + 2, outer, difference(plus.cells, larger.radiation, minus.cells, smaller.radiation));
}

function difference(plus: Cells, from: number, minus: Cells, to: number): [number, number] {
  return [cell(plus, from) - cell(minus, to), cell(plus, from + 1) - cell(minus, to + 1)];
}

// total ← total + x² · factor, x the complex number at i
function addProduct(a: Float64Array, i: number, b: Float64Array, [fr, fi]: [number, number]): void {
  const re = cell(a, i) * cell(b, i) - cell(a, i + 1) * cell(b, i + 1);
  const im = cell(a, i) * cell(b, i + 1) + cell(a, i + 1) * cell(b, i);
  addTo(re * fr - im * fi, re * fi + im * fr);
}

function addMouth({ plus, minus, states }: Change): void {
  if (plus.mouth === null || minus.mouth === null) return;
  setDelta(plus.cells, plus.mouth.twoPort, minus.cells, minus.mouth.twoPort);
  addTwoPort(states.outlet, 0, states.segmentMouth, 0);
}

function addFoot({ plus, minus, states, fingering }: Change): void {
  if (plus.foot.kind === 'stopped') return;
  const at = STATE_CELLS * fingering.length + 2;
  addProduct(
    states.outer,
    at,
    states.outer,
    difference(plus.cells, plus.footRadiation, minus.cells, minus.footRadiation),
  );
}

// Twice u·δZ·u for each pair outside, v·δZ·v inside; the mouth's own flow outwards is −1.
function addCoupling(change: Change): void {
  change.plus.coupling.pairs.forEach((larger, i) => {
    const smaller = change.minus.coupling.pairs[i];
    if (smaller === undefined || !sounds(change, larger.first) || !sounds(change, larger.second)) return;
    tunePair(change.plus.cells, change.plus.coupling, change.plus.plan.outside, larger);
    tunePair(change.minus.cells, change.minus.coupling, change.minus.plan.outside, smaller);
    addCoupledPair(change, larger);
  });
}

function addCoupledPair({ plus, minus, states, fingering }: Change, { first, second }: CoupledPair): void {
  const place = first * plus.coupling.openings + second;
  const [zr, zi] = difference(
    plus.cells,
    plus.coupling.outer + 2 * place,
    minus.cells,
    minus.coupling.outer + 2 * place,
  );
  addPair(outflow(states.outer, first, fingering), outflow(states.outer, second, fingering), [
    2 * zr,
    2 * zi,
  ]);
  const within =
    cell(plus.cells, plus.coupling.inner + place) - cell(minus.cells, minus.coupling.inner + place);
  if (within === 0) return;
  addPair(outflow(states.inner, first, fingering), outflow(states.inner, second, fingering), [0, 2 * within]);
}

function sounds({ prepared, fingering }: Change, opening: number): boolean {
  if (opening >= fingering.length) return true;
  return prepared.branches[fingering[opening] ?? -1]?.closed === false;
}

function outflow(states: Float64Array, opening: number, fingering: FingeringBranches): [number, number] {
  if (opening > fingering.length) return [-1, 0];
  return [cell(states, STATE_CELLS * opening + 2), cell(states, STATE_CELLS * opening + 3)];
}

function addPair([ar, ai]: [number, number], [br, bi]: [number, number], [zr, zi]: [number, number]): void {
  const re = ar * br - ai * bi;
  const im = ar * bi + ai * br;
  addTo(re * zr - im * zi, re * zi + im * zr);
}
