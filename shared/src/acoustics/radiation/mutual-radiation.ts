import { EngineInputError } from '../engine-input-error.ts';
import { LARGEST_BODY_WAVENUMBER, selfRadiation } from './cylinder-radiation.ts';

/** Up to this wavenumber·radius the coupling round the body was fitted; beyond, its strength is carried on. */
const ROUND_FITTED_TO = 0.6;

/** Two openings in one round body, with all that does not depend on frequency worked out; made by `openingPair`. */
export interface OpeningPair {
  /** Of the body, m; the mean of the two places. */
  radius: number;
  /** Axial distance over the radius. */
  distance: number;
  /** sin² of half the angle between the openings. */
  turn: number;
  /** Low-frequency coupling times the radius. */
  low: number;
  /** How far the body's own resonance part reaches from one to the other, 1 at no distance. */
  reach: number;
  /** Effective path round the body over the radius. */
  path: number;
}

/**
 * Prepares the coupling of two openings through the air outside.
 *
 * @param distance - along the axis, m, ≥ 0
 * @param angle - between the two round the body, rad; 0 on the same side, π for a thumb hole
 * @param radius - outer radius of the body, m, > 0
 * @returns the pair for `mutualRadiation`
 * @throws EngineInputError if the radius is not positive or the openings lie in the same place
 * @source exact Green function of an infinite rigid cylinder, fitted, see tests/reference/tables/coupling_angle.json
 */
export function openingPair(distance: number, angle: number, radius: number): OpeningPair {
  if (!(radius > 0)) {
    throw new EngineInputError('radius', radius, 'The body has an outside diameter above 0 at its holes.');
  }
  const z = Math.abs(distance) / radius;
  const turn = Math.sin(angle / 2) ** 2;
  const chord = Math.sqrt(z * z + 4 * turn);
  if (!(chord > 0)) throw new EngineInputError('distance', distance, 'Two holes lie in the same place.');
  return {
    radius,
    distance: z,
    turn,
    low: bafflingFactor(z, turn) / chord,
    reach: Math.exp(-Math.sqrt(z * z + 88 * turn) / 2.4),
    path: Math.sqrt(z * z + 1.17) + 1.05,
  };
}

/**
 * What the body makes of the low-frequency coupling of two openings: near 2 close together on one side, ½ back to back.
 *
 * @param distance - axial distance over the body's radius, ≥ 0
 * @param turn - sin² of half the angle between them, 0–1
 * @returns the factor on the free-space coupling; no unit; within 0.007
 * @source exact static Green function of an infinite rigid cylinder, fitted, see tests/reference/tables/coupling_angle.json
 */
export function bafflingFactor(distance: number, turn: number): number {
  const squared = distance * distance;
  const near = 1 + Math.exp(-0.944 * Math.sqrt(squared + 4 * turn) ** 0.71);
  if (turn === 0) return near;
  return near - 0.708 * turn * (1 + 0.005 * squared) ** -1.648 * (turn + 0.186 * squared) ** -0.583;
}

const self = new Float64Array(2);
/** Wavenumber·radius that `self` holds for: most pairs of one body share theirs. */
let selfAt = NaN;

/**
 * Coupling G of two openings in a round body through the air outside: the mutual impedance is j·k·ρc/(4π)·G.
 *
 * Times the radius it is within 0.06 for openings on one side up to wavenumber·radius 0.6, and within 0.012, 0.03 and 0.08 at
 * 0.2, 0.4 and 0.6 for angles from 60° on. Between 0.6 and 1 its resistance stays within 0.14; beyond it only gives out no power.
 *
 * @param wavenumber - 1/m, ≥ 0
 * @param pair - made by `openingPair`
 * @param out - where G goes, 1/m: real part at `at`, imaginary part at `at + 1`
 * @param at - index into `out`
 * @source exact Green function of an infinite rigid cylinder, fitted, see tests/reference/tables/interaction.json and
 *   coupling_angle.json
 */
export function mutualRadiation(wavenumber: number, pair: OpeningPair, out: Float64Array, at: number): void {
  const v = wavenumber * pair.radius * pair.distance;
  travel.phase = v;
  travel.cosine = Math.cos(v);
  travel.sine = Math.sin(v);
  travel.bodySine = Math.sin(BODY_SHARE * v);
  mutualRadiationAfter(wavenumber, pair, travel, { out, at });
}

/** How a wave that goes from one opening to the other along the axis turns, with the sines of that. */
export interface Travel {
  /** Wavenumber times distance. */
  phase: number;
  cosine: number;
  sine: number;
  /** Sine of `BODY_SHARE` of the phase. */
  bodySine: number;
}

/** The body's own resonance part turns by this share of what the wave along it does. */
export const BODY_SHARE = 0.65;

const travel: Travel = { phase: 0, cosine: 1, sine: 0, bodySine: 0 };

/**
 * The same where the sines are known: those of all openings of a body cost less than those of all their pairs.
 *
 * @param wavenumber - 1/m, ≥ 0
 * @param pair - made by `openingPair`
 * @param along - from one opening to the other
 * @param to - where G goes, 1/m: real part at `at`, imaginary part at `at + 1`
 * @param to.out - the cells
 * @param to.at - index into them
 * @returns nothing; the result is in the cells
 * @source as `mutualRadiation`
 */
export function mutualRadiationAfter(
  wavenumber: number,
  pair: OpeningPair,
  along: Travel,
  { out, at }: { out: Float64Array; at: number },
): void {
  const { radius, distance, turn } = pair;
  const { phase: v, cosine, sine, bodySine } = along;
  // Held where the self-radiation is: a coupling stronger than the opening's own resistance would give out power.
  const q = Math.min(wavenumber * radius, LARGEST_BODY_WAVENUMBER);
  if (q !== selfAt) selfRadiation(q, self, 0);
  selfAt = q;
  const ownRe = self[0] ?? NaN;
  const ownIm = (self[1] ?? NaN) + q;
  let re = pair.low + ownRe * pair.reach - (distance > 0 ? (1 - cosine) / distance : 0);
  let im = v < 1e-4 ? ownIm - q : (ownIm * bodySine) / (BODY_SHARE * v) - (q * sine) / v;
  if (turn > 0) {
    const round = 8 * turn * roundStrength(q);
    re -= round * aroundReal(q * pair.path);
    im += round * (v < 0.01 ? 1 / 3 - (v * v) / 30 : (sine / v - cosine) / (v * v));
  }
  out[at] = re / radius;
  out[at + 1] = im / radius;
}

/**
 * Distance between an opening in the body and the foot, for `footMutualRadiation`.
 *
 * @param distance - along the axis, m
 * @param radius - outer radius of the body, m
 * @returns m
 * @source held against whole instruments in three-dimensional finite elements
 */
export function footDistance(distance: number, radius: number): number {
  return Math.hypot(distance, radius);
}

/**
 * Coupling G of an opening in the body and the open foot: the mutual impedance is j·k·ρc/(4π)·G.
 *
 * @param wavenumber - 1/m, ≥ 0
 * @param distance - from `footDistance`, m, > 0
 * @param out - where G goes, 1/m: real part at `at`, imaginary part at `at + 1`
 * @param at - index into `out`
 * @source radiation of a point into free space; held against whole instruments in three-dimensional finite elements
 */
export function footMutualRadiation(
  wavenumber: number,
  distance: number,
  out: Float64Array,
  at: number,
): void {
  const phase = wavenumber * distance;
  out[at] = Math.cos(phase) / distance;
  out[at + 1] = -Math.sin(phase) / distance;
}

// The cube of wavenumber·radius up to 0.6. The fitted cube grows past any physical coupling beyond (ten times the exact
// resistance at 1.5): a parabola with the same value and slope follows the exact Green function from there.
function roundStrength(q: number): number {
  if (q <= ROUND_FITTED_TO) return q * q * q;
  const beyond = q - ROUND_FITTED_TO;
  return 0.216 + beyond * (1.08 - 0.32 * beyond);
}

// (cos x − 1)/x³ + sin x/x², which is 1/(2x) − x/8 while x is small.
function aroundReal(x: number): number {
  if (x === 0) return 0;
  if (x < 1e-3) return 0.5 / x - x / 8;
  const half = Math.sin(x / 2);
  return (Math.sin(x) - (2 * half * half) / x) / (x * x);
}
