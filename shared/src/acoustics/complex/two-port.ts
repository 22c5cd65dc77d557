import { cell, type Cells } from './cells.ts';
/**
 * Cells that one two-port takes: the real and imaginary parts of A, B, C and D in
 * [p₁; U₁] = [[A, B], [C, D]] [p₂; U₂], side 1 nearer the mouth, U positive towards the foot.
 */
export const TWO_PORT_CELLS = 8;

/**
 * Writes the two-port that changes nothing.
 *
 * @param cells - where the two-ports lie
 * @param at - address to write to
 * @returns nothing; the result is in the cells
 */
export function writeIdentity(cells: Cells, at: number): void {
  // A loop: for so few cells `fill` costs several times as much.
  for (let i = 1; i < TWO_PORT_CELLS; i += 1) cells[at + i] = 0;
  cells[at] = 1;
  cells[at + 6] = 1;
}

/**
 * Copies a two-port.
 *
 * @param cells - where the two-ports lie
 * @param from - address to read from
 * @param to - address to write to
 * @returns nothing; the result is in the cells
 */
export function copyTwoPort(cells: Cells, from: number, to: number): void {
  for (let i = 0; i < TWO_PORT_CELLS; i += 1) cells[to + i] = cell(cells, from + i);
}

/**
 * Puts a two-port behind another one (on its foot side): left ← left · right.
 *
 * @param cells - where the two-ports lie
 * @param left - address of the first two-port, replaced by the product
 * @param right - address of the second two-port
 * @returns nothing; the result is in the cells
 */
export function appendTwoPort(cells: Cells, left: number, right: number): void {
  const er = cell(cells, right);
  const ei = cell(cells, right + 1);
  const fr = cell(cells, right + 2);
  const fi = cell(cells, right + 3);
  const gr = cell(cells, right + 4);
  const gi = cell(cells, right + 5);
  const hr = cell(cells, right + 6);
  const hi = cell(cells, right + 7);
  for (let row = left; row < left + TWO_PORT_CELLS; row += 4) {
    const ar = cell(cells, row);
    const ai = cell(cells, row + 1);
    const br = cell(cells, row + 2);
    const bi = cell(cells, row + 3);
    cells[row] = ar * er - ai * ei + br * gr - bi * gi;
    cells[row + 1] = ar * ei + ai * er + br * gi + bi * gr;
    cells[row + 2] = ar * fr - ai * fi + br * hr - bi * hi;
    cells[row + 3] = ar * fi + ai * fr + br * hi + bi * hr;
  }
}

/**
 * Puts a series impedance behind a two-port: all flow passes through it.
 *
 * @param cells - where the two-ports lie
 * @param at - address of the two-port, replaced
 * @param re - real part of the impedance, Pa·s/m³
 * @param im - imaginary part
 * @returns nothing; the result is in the cells
 */
export function appendSeries(cells: Cells, at: number, re: number, im: number): void {
  for (let row = at; row < at + TWO_PORT_CELLS; row += 4) {
    const ar = cell(cells, row);
    const ai = cell(cells, row + 1);
    cells[row + 2] = cell(cells, row + 2) + ar * re - ai * im;
    cells[row + 3] = cell(cells, row + 3) + ar * im + ai * re;
  }
}

/**
 * Puts a series reactance behind a two-port; it is read from the cells, for a number handed over would be put on the heap.
 *
 * @param cells - where two-port and reactance lie
 * @param at - address of the two-port, replaced
 * @param from - address of the imaginary part of the impedance, Pa·s/m³
 * @returns nothing; the result is in the cells
 */
export function appendReactance(cells: Cells, at: number, from: number): void {
  const im = cell(cells, from);
  for (let row = at; row < at + TWO_PORT_CELLS; row += 4) {
    const ar = cell(cells, row);
    const ai = cell(cells, row + 1);
    cells[row + 2] = cell(cells, row + 2) - ai * im;
    cells[row + 3] = cell(cells, row + 3) + ar * im;
  }
}

/**
 * Puts a shunt admittance behind a two-port: flow that leaves through the wall.
 *
 * @param cells - where two-port and admittance lie
 * @param at - address of the two-port, replaced
 * @param from - address of the admittance, m³/(Pa·s)
 * @returns nothing; the result is in the cells
 */
export function appendShunt(cells: Cells, at: number, from: number): void {
  const re = cell(cells, from);
  const im = cell(cells, from + 1);
  for (let row = at; row < at + TWO_PORT_CELLS; row += 4) {
    const br = cell(cells, row + 2);
    const bi = cell(cells, row + 3);
    cells[row] = cell(cells, row) + br * re - bi * im;
    cells[row + 1] = cell(cells, row + 1) + br * im + bi * re;
  }
}

/**
 * Puts a series reactance before a two-port (on its mouth side).
 *
 * @param cells - where the two-ports lie
 * @param at - address of the two-port, replaced
 * @param reactance - imaginary part of the impedance, Pa·s/m³
 * @returns nothing; the result is in the cells
 */
export function prependReactance(cells: Cells, at: number, reactance: number): void {
  for (let i = at; i < at + 4; i += 2) {
    cells[i] = cell(cells, i) - reactance * cell(cells, i + 5);
    cells[i + 1] = cell(cells, i + 1) + reactance * cell(cells, i + 4);
  }
}

/**
 * Puts a shunt susceptance before a two-port (on its mouth side).
 *
 * @param cells - where the two-ports lie
 * @param at - address of the two-port, replaced
 * @param susceptance - imaginary part of the admittance, m³/(Pa·s)
 * @returns nothing; the result is in the cells
 */
export function prependSusceptance(cells: Cells, at: number, susceptance: number): void {
  for (let i = at; i < at + 4; i += 2) {
    cells[i + 4] = cell(cells, i + 4) - susceptance * cell(cells, i + 1);
    cells[i + 5] = cell(cells, i + 5) + susceptance * cell(cells, i);
  }
}

/**
 * Turns a two-port round, so that its foot side faces the mouth: A and D change places.
 *
 * @param cells - where the two-ports lie
 * @param at - address of the two-port, replaced
 * @returns nothing; the result is in the cells
 */
export function reverseTwoPort(cells: Cells, at: number): void {
  const re = cell(cells, at);
  const im = cell(cells, at + 1);
  cells[at] = cell(cells, at + 6);
  cells[at + 1] = cell(cells, at + 7);
  cells[at + 6] = re;
  cells[at + 7] = im;
}
