import { EngineInputError } from '../engine-input-error.ts';
import { selfRadiation } from '../radiation/cylinder-radiation.ts';

/** Where the window's length was fitted: over the bore radius, the ramp in rad, wavenumber times bore radius. */
export const WINDOW_RANGE = {
  width: { from: 0.8, to: 1.6 },
  length: { from: 0.3, to: 0.9 },
  wall: { from: 0.1, to: 0.6 },
  ramp: { from: (15 * Math.PI) / 180, to: (25 * Math.PI) / 180 },
  boreWavenumber: { to: 0.5 },
} as const;

/** Wavenumber times bore radius beyond which the growth of the length is held. */
const LARGEST_BORE_WAVENUMBER = 1;

/** A whistle's window; lengths in m, the ramp's angle in rad. The lip edge is sharp and follows the bore wall. */
export interface Window {
  /** Of the bore at the block. */
  boreRadius: number;
  /** Across the bore, edge to edge. */
  width: number;
  /** From the lip's edge to the block face, where the bore begins. */
  length: number;
  /** Of the wall at the window. */
  wall: number;
  ramp: number;
}

/** A window with all that does not depend on frequency worked out; made by `windowEnd`. */
export interface WindowEnd {
  boreRadius: number;
  /** Of the body at the window, m. */
  outerRadius: number;
  /** Length that the window adds to the bore at low frequency, before `scale`, m. */
  staticLength: number;
  /** Growth of the length with (wavenumber·radius)², no unit. */
  growth: number;
  /** Calibration of the maker's own heads: multiplies the length. */
  scale: number;
}

/**
 * Prepares the impedance of a window at the mouth end of a bore.
 *
 * The low-frequency length is within 2 % of blind finite-element shapes inside `WINDOW_RANGE`; 1 % is 1–2 cents in the first
 * register.
 *
 * @param window - see `Window`
 * @param scale - calibration factor on the length, > 0
 * @returns the end for `windowImpedance`
 * @throws EngineInputError if a length is not positive, the window is as wide as the bore, or so far outside the fitted
 *   shapes that no length comes out
 * @source fitted to three-dimensional finite elements, see tests/reference/tables/window.json
 */
export function windowEnd(window: Window, scale = 1): WindowEnd {
  requireWindow(window);
  const { boreRadius: r, wall, length } = window;
  const staticLength = r * staticLengthRatio(window);
  if (!(staticLength > 0)) {
    throw new EngineInputError(
      'width',
      window.width,
      'No formula holds for so large a window on so narrow a bore.',
    );
  }
  return {
    boreRadius: r,
    outerRadius: r + wall,
    staticLength,
    growth: 0.47 * (length / r) ** 2 + 0.19 * (wall / r),
    scale,
  };
}

const self = new Float64Array(2);

/**
 * Impedance of a window at the block face, over the characteristic impedance of the bore there.
 *
 * @param end - made by `windowEnd`
 * @param wavenumber - 1/m, ≥ 0; fitted to wavenumber·radius 0.5, the growth of the length held beyond 1
 * @param out - where the result goes: real part at `at`, imaginary part at `at + 1`
 * @param at - index into `out`
 * @source fitted to three-dimensional finite elements, see tests/reference/tables/window.json; the resistance is that of an
 *   opening in a long body
 */
export function windowImpedance(end: WindowEnd, wavenumber: number, out: Float64Array, at: number): void {
  const { boreRadius: r, outerRadius, staticLength, growth } = end;
  const held = Math.min(wavenumber * r, LARGEST_BORE_WAVENUMBER) ** 2;
  selfRadiation(wavenumber * outerRadius, self, 0);
  const outside = (r * r) / (4 * outerRadius);
  const length = staticLength * (1 + held * growth * (1 + 0.83 * held)) + outside * (self[0] ?? NaN);
  out[at] = -wavenumber * outside * (self[1] ?? NaN);
  out[at + 1] = wavenumber * length * end.scale;
}

// Low-frequency length over the bore radius.
function staticLengthRatio(window: Window): number {
  const r = window.boreRadius;
  const wall = window.wall / r;
  const length = window.length / r;
  const slope = Math.tan(window.ramp);
  const middle = 1 + 0.3 * wall;
  const arc = 2 * middle * Math.asin(window.width / r / (2 * middle));
  const equivalentRadius = Math.sqrt((arc * length) / Math.PI);
  const outerLength = length + wall / slope;
  const shape = Math.log(arc / (2 * length));
  return (
    ((1.096 * Math.PI * slope) / arc) * Math.log1p(wall / (length * slope)) +
    (2.33 - 0.089 * shape * shape) / equivalentRadius -
    1.628 -
    0.903 / Math.sqrt(arc * outerLength)
  );
}

function requireWindow(window: Window): void {
  for (const field of ['boreRadius', 'width', 'length', 'wall', 'ramp'] as const) {
    if (!(window[field] > 0)) {
      throw new EngineInputError(field, window[field], 'The measures of a window are above 0.');
    }
  }
  if (window.ramp >= Math.PI / 2) {
    throw new EngineInputError('ramp', window.ramp, 'The ramp of a window rises by less than 90°.');
  }
  if (window.width >= 2 * window.boreRadius) {
    throw new EngineInputError('width', window.width, 'A window is narrower than its bore.');
  }
}
