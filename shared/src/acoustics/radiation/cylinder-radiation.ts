import { cell } from '../complex/cells.ts';
import { cubicSpline } from '../numerics/cubic-spline.ts';

/** Beyond this product of wavenumber and body radius the self-radiation is held. */
export const LARGEST_BODY_WAVENUMBER = 1.5;

/**
 * Wavenumber times body radius, then real and imaginary part of the self-radiation; no unit. From the exact Green function
 * of an infinite rigid cylinder, see tests/reference/tables/interaction.json (`self`, printed there with five figures).
 */
const SELF_RADIATION = [
  [0, 0, 0],
  [0.02, 0.00023678, -0.0199858],
  [0.05, 0.00155895, -0.0498566],
  [0.1, 0.00674566, -0.0993514],
  [0.2, 0.0304406, -0.199139],
  [0.3, 0.0733062, -0.306051],
  [0.4, 0.132237, -0.428225],
  [0.5, 0.199158, -0.571005],
  [0.6, 0.264129, -0.734005],
  [0.8, 0.363936, -1.094854],
  [1.0, 0.430653, -1.458474],
  [1.5, 0.605168, -2.374262],
] as const;

/** Cells of one interval: where it begins, where it ends, and the coefficients of real and imaginary part. */
const PIECE_CELLS = 10;

const pieces = splinePieces();

function splinePieces(): Float64Array {
  const real = cubicSpline(SELF_RADIATION.map(([kR, re]) => [kR, re] as const));
  const imaginary = cubicSpline(SELF_RADIATION.map(([kR, , im]) => [kR, im] as const));
  return Float64Array.from(
    real.flatMap((re, i) => {
      const im = imaginary[i] ?? re;
      return [re.from, re.to, re.c0, re.c1, re.c2, re.c3, im.c0, im.c1, im.c2, im.c3];
    }),
  );
}

/**
 * Frequency-dependent part g of the radiation of a small opening in a long round body.
 *
 * The opening's own impedance is j·k·ρc/(4π·outerRadius)·g beside its low-frequency end length; g holds the resistance.
 *
 * @param kR - wavenumber times outer radius of the body, ≥ 0; held beyond 1.5
 * @param out - where g goes (no unit): real part at `at`, imaginary part (≤ 0) at `at + 1`
 * @param at - index into `out`
 * @source exact Green function of an infinite rigid cylinder, tabulated in tests/reference/tables/interaction.json; cubic
 *   spline between
 */
export function selfRadiation(kR: number, out: Float64Array, at: number): void {
  const x = Math.min(kR, LARGEST_BODY_WAVENUMBER);
  let i = 0;
  while (x > cell(pieces, i + 1)) i += PIECE_CELLS;
  const u = x - cell(pieces, i);
  out[at] =
    cell(pieces, i + 2) + u * (cell(pieces, i + 3) + u * (cell(pieces, i + 4) + u * cell(pieces, i + 5)));
  out[at + 1] =
    cell(pieces, i + 6) + u * (cell(pieces, i + 7) + u * (cell(pieces, i + 8) + u * cell(pieces, i + 9)));
}
