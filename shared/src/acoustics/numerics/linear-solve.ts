import { cell } from '../complex/cells.ts';
/**
 * Solves a dense complex system in place by Gaussian elimination with row pivoting.
 *
 * @param cells - holds n rows of n + 1 complex numbers, the right-hand side last, real and imaginary parts in turn
 * @param at - index of the first; the rows are destroyed and the solution stands in the last column
 * @param n - order, ≥ 1
 * @returns whether there is a solution; false when a pivot is exactly 0
 */
export function solveComplex(cells: Float64Array, at: number, n: number): boolean {
  const stride = 2 * (n + 1);
  for (let column = 0; column < n; column += 1) {
    const top = at + column * stride;
    const pivot = largestBelow(cells, top + 2 * column, stride, n - column);
    if (pivot !== 0) swapRows(cells, top, top + pivot * stride, stride);
    const lead = top + 2 * column;
    const pr = cell(cells, lead);
    const pi = cell(cells, lead + 1);
    const norm = pr * pr + pi * pi;
    if (norm === 0) return false;
    const ir = pr / norm;
    const ii = -pi / norm;
    const end = top + stride;
    for (let row = column + 1; row < n; row += 1) {
      const offset = (row - column) * stride;
      const mr = cell(cells, lead + offset);
      const mi = cell(cells, lead + offset + 1);
      const fr = mr * ir - mi * ii;
      const fi = mr * ii + mi * ir;
      for (let i = lead + 2; i < end; i += 2) {
        const xr = cell(cells, i);
        const xi = cell(cells, i + 1);
        cells[i + offset] = cell(cells, i + offset) - (fr * xr - fi * xi);
        cells[i + offset + 1] = cell(cells, i + offset + 1) - (fr * xi + fi * xr);
      }
    }
  }
  substituteBack(cells, at, n);
  return true;
}

// How many rows below the first the largest of a column stands.
function largestBelow(cells: Float64Array, first: number, stride: number, rows: number): number {
  let best = -1;
  let found = 0;
  for (let row = 0; row < rows; row += 1) {
    const i = first + row * stride;
    const size = Math.abs(cell(cells, i)) + Math.abs(cell(cells, i + 1));
    if (size > best) {
      best = size;
      found = row;
    }
  }
  return found;
}

function swapRows(cells: Float64Array, a: number, b: number, stride: number): void {
  for (let i = 0; i < stride; i += 1) {
    const kept = cell(cells, a + i);
    cells[a + i] = cell(cells, b + i);
    cells[b + i] = kept;
  }
}

function substituteBack(cells: Float64Array, at: number, n: number): void {
  const stride = 2 * (n + 1);
  for (let row = n - 1; row >= 0; row -= 1) {
    const first = at + row * stride;
    const right = first + 2 * n;
    let re = cell(cells, right);
    let im = cell(cells, right + 1);
    for (let column = row + 1; column < n; column += 1) {
      const known = at + column * stride + 2 * n;
      const mr = cell(cells, first + 2 * column);
      const mi = cell(cells, first + 2 * column + 1);
      const xr = cell(cells, known);
      const xi = cell(cells, known + 1);
      re -= mr * xr - mi * xi;
      im -= mr * xi + mi * xr;
    }
    const pr = cell(cells, first + 2 * row);
    const pi = cell(cells, first + 2 * row + 1);
    const norm = pr * pr + pi * pi;
    cells[right] = (re * pr + im * pi) / norm;
    cells[right + 1] = (im * pr - re * pi) / norm;
  }
}
