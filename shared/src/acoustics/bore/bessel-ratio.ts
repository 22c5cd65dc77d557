import { cell } from '../complex/cells.ts';
/**
 * F = 2·J₁(z)/(z·J₀(z)) on the ray z = x·e^{−jπ/4}, where the friction and the heat of a duct's wall live.
 *
 * Along this one ray F is a smooth function of the real x, so it is worked out once: Taylor polynomials from the
 * Riccati equation that q = J₁/J₀ obeys (q′ = 1 − q/z + q²) below `FAR`, the asymptotic series beyond.
 */

const FAR = 25;
const WIDTH = 0.5;
const TERMS = 15;
const FAR_TERMS = 13;
const ROOT_HALF = Math.SQRT1_2;

const near = nearPolynomials();
const far = farSeries();

/**
 * Writes F(x·e^{−jπ/4}); relative error below 1e-11.
 *
 * @param out - where x stands, the duct's radius over the boundary layer's length, √(ωρ/η)·a or that times √Pr; no unit, > 0.
 *   It is read from there because a number handed over would be put on the heap
 * @param at - index of x, and of the real part then; the imaginary part follows
 * @returns nothing; the result is in `out`
 * @source C. Zwikker and C. W. Kosten, Sound Absorbing Materials (1949); Bessel functions by continued fraction and
 * by Hankel's asymptotic expansion
 */
export function wallFunction(out: Float64Array, at: number): void {
  const x = cell(out, at);
  let re = 0;
  let im = 0;
  if (x >= FAR) {
    const t = 1 / x;
    for (let n = 2 * farTerms(x) - 2; n >= 0; n -= 2) {
      re = re * t + cell(far, n);
      im = im * t + cell(far, n + 1);
    }
    out[at] = re * t;
    out[at + 1] = im * t;
    return;
  }
  const part = Math.floor(x / WIDTH);
  const h = x / WIDTH - part - 0.5;
  const first = part * 2 * TERMS;
  for (let n = first + 2 * TERMS - 2; n >= first; n -= 2) {
    re = re * h + cell(near, n);
    im = im * h + cell(near, n + 1);
  }
  out[at] = re;
  out[at + 1] = im;
}

// Terms of the far series that matter: the next would add less than 1e-11 of F.
function farTerms(x: number): number {
  if (x < 40) return FAR_TERMS;
  if (x < 70) return 8;
  return x < 120 ? 7 : 6;
}

// Coefficients of F in powers of 1/x, from x⁻¹ on: −2·t·S₁(t)/S₀(t) with t = j/z = e^{3jπ/4}/x.
function farSeries(): Float64Array {
  const ratio = new Float64Array(FAR_TERMS);
  const s0 = hankel(0);
  const s1 = hankel(1);
  for (let n = 0; n < FAR_TERMS; n += 1) {
    let sum = cell(s1, n);
    for (let k = 1; k <= n; k += 1) sum -= cell(s0, k) * cell(ratio, n - k);
    ratio[n] = sum;
  }
  const series = new Float64Array(2 * FAR_TERMS);
  for (let n = 0; n < FAR_TERMS; n += 1) {
    const turn = (3 * Math.PI * (n + 1)) / 4;
    series[2 * n] = -2 * cell(ratio, n) * Math.cos(turn);
    series[2 * n + 1] = -2 * cell(ratio, n) * Math.sin(turn);
  }
  return series;
}

function hankel(order: 0 | 1): Float64Array {
  const a = new Float64Array(FAR_TERMS);
  a[0] = 1;
  for (let k = 1; k < FAR_TERMS; k += 1) {
    a[k] = (cell(a, k - 1) * (4 * order * order - (2 * k - 1) ** 2)) / (8 * k);
  }
  return a;
}

// For each part of width `WIDTH` the complex coefficients of F in powers of (x − middle)/WIDTH.
function nearPolynomials(): Float64Array {
  const parts = FAR / WIDTH;
  const polynomials = new Float64Array(parts * 2 * TERMS);
  for (let part = 0; part < parts; part += 1) {
    const middle = (part + 0.5) * WIDTH;
    const taylor = taylorOfWallFunction(middle);
    let scale = 1;
    for (let n = 0; n < TERMS; n += 1) {
      polynomials[2 * (part * TERMS + n)] = cell(taylor, 2 * n) * scale;
      polynomials[2 * (part * TERMS + n) + 1] = cell(taylor, 2 * n + 1) * scale;
      scale *= WIDTH;
    }
  }
  return polynomials;
}

// Taylor coefficients of F about x = middle.
// With G = z²F/2 = z·q the Riccati equation reads x·G′ = z² + G², z² = −j·x², which has no division by z. F follows
// from x²·F = 2jG.
function taylorOfWallFunction(middle: number): Float64Array {
  const g = new Float64Array(2 * TERMS);
  const [qr, qi] = besselQuotient(middle);
  g[0] = middle * ROOT_HALF * (qr + qi);
  g[1] = middle * ROOT_HALF * (qi - qr);
  const square = [-middle * middle, -2 * middle, -1];
  for (let n = 0; n + 1 < TERMS; n += 1) {
    let re = -n * cell(g, 2 * n);
    let im = (square[n] ?? 0) - n * cell(g, 2 * n + 1);
    for (let k = 0; k <= n; k += 1) {
      const [ar, ai, br, bi] = [
        cell(g, 2 * k),
        cell(g, 2 * k + 1),
        cell(g, 2 * (n - k)),
        cell(g, 2 * (n - k) + 1),
      ];
      re += ar * br - ai * bi;
      im += ar * bi + ai * br;
    }
    g[2 * n + 2] = re / (middle * (n + 1));
    g[2 * n + 3] = im / (middle * (n + 1));
  }
  const f = new Float64Array(2 * TERMS);
  for (let n = 0; n < 2 * TERMS; n += 1) {
    const turned = n % 2 === 0 ? -2 * cell(g, n + 1) : 2 * cell(g, n - 1);
    f[n] = (turned - 2 * middle * (f[n - 2] ?? 0) - (f[n - 4] ?? 0)) / (middle * middle);
  }
  return f;
}

// J₁/J₀ at x·e^{−jπ/4} by its continued fraction, for x ≤ 25.
function besselQuotient(x: number): [number, number] {
  let tr = 1;
  let ti = 0;
  for (let n = Math.ceil(20 + x); n >= 1; n -= 1) {
    // t ← 1 − (z²/4)/(n(n+1))/t with z² = −j·x²
    const c = (x * x) / (4 * n * (n + 1) * (tr * tr + ti * ti));
    const re = 1 + c * ti;
    ti = c * tr;
    tr = re;
  }
  const half = (x / 2) * ROOT_HALF;
  const norm = 1 / (tr * tr + ti * ti);
  return [half * (tr - ti) * norm, half * (-tr - ti) * norm];
}
