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

const REAL = cubicSpline(SELF_RADIATION.map(([kR, re]) => [kR, re] as const));
const IMAGINARY = cubicSpline(SELF_RADIATION.map(([kR, , im]) => [kR, im] as const));

/** Both parts interval by interval, so that one search serves both. */
const PIECES = REAL.map((re, i) => ({ to: re.to, from: re.from, re, im: IMAGINARY[i] ?? re }));

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
  for (const { from, to, re, im } of PIECES) {
    if (x > to) continue;
    const u = x - from;
    out[at] = re.c0 + u * (re.c1 + u * (re.c2 + u * re.c3));
    out[at + 1] = im.c0 + u * (im.c1 + u * (im.c2 + u * im.c3));
    return;
  }
}
