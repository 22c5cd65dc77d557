import { cell, type Cells } from '../complex/cells.ts';

const wave = new Float64Array(4);

/**
 * Writes the two-port of a cylindrical piece of bore.
 *
 * @param cells - where duct and two-port lie
 * @param at - address of the two-port
 * @param duct - address of the duct, see `writeDuct`
 * @param length - m; below 0 takes such a piece away, with |Γ·length| below 300
 * @returns nothing; the result is in the cells
 * @source transmission-line equations; any textbook of acoustics
 */
export function writeCylinder(cells: Cells, at: number, duct: number, length: number): void {
  hyperbolic(cell(cells, duct) * length, cell(cells, duct + 1) * length, wave);
  const cr = cell(wave, 0);
  const ci = cell(wave, 1);
  const sr = cell(wave, 2);
  const si = cell(wave, 3);
  const zr = cell(cells, duct + 2);
  const zi = cell(cells, duct + 3);
  const scale = 1 / (zr * zr + zi * zi);
  cells[at] = cr;
  cells[at + 1] = ci;
  cells[at + 2] = zr * sr - zi * si;
  cells[at + 3] = zr * si + zi * sr;
  cells[at + 4] = (sr * zr + si * zi) * scale;
  cells[at + 5] = (si * zr - sr * zi) * scale;
  cells[at + 6] = cr;
  cells[at + 7] = ci;
}

/**
 * Hyperbolic cosine and sine of a complex number.
 *
 * @param x - real part, |x| < 300
 * @param y - imaginary part
 * @param out - four cells: cosh and sinh, real and imaginary parts
 * @returns nothing; the result is in `out`
 */
export function hyperbolic(x: number, y: number, out: Float64Array): void {
  const cos = Math.cos(y);
  const sin = Math.sin(y);
  let ch = 1;
  let sh = x;
  if (x > 0.02 || x < -0.02) {
    const grow = Math.exp(x);
    ch = (grow + 1 / grow) / 2;
    sh = (grow - 1 / grow) / 2;
  } else if (x !== 0) {
    // The difference of two exponentials would lose digits here; the series is exact to rounding.
    const square = x * x;
    sh = x * (1 + (square / 6) * (1 + (square / 20) * (1 + square / 42)));
    ch = 1 + (square / 2) * (1 + (square / 12) * (1 + (square / 30) * (1 + square / 56)));
  }
  out[0] = ch * cos;
  out[1] = sh * sin;
  out[2] = sh * cos;
  out[3] = ch * sin;
}
