import { cell } from '../complex/cells.ts';
import { roughAngle } from '../numerics/rough-angle.ts';
import type { PreparedColumn } from './prepared-column.ts';

/** A wave's way from the mouth end down the bore and back at one frequency; see `writeRoundTrip`. */
export interface RoundTrip {
  /** What comes back of a wave of size 1, its reflection at the mouth end included. */
  re: number;
  im: number;
  /** What would come back where the reflection at the mouth end's outlet is 0. */
  matchedRe: number;
  matchedIm: number;
  /** Phase of the reflection at the outlet less that of the round trip as seen from there, rad; never turns. */
  lead: number;
  /** Phase of the round trip, but with the losses left out near resonances, rad, in (−π, π]. */
  phase: number;
  /** The same with the losses left out altogether: exactly 0 at a resonance, and of no use far from it. */
  losslessPhase: number;
}

/**
 * Impedance that the phase of a reflection at the input is reckoned against.
 *
 * A narrow input to a wide cone would turn its whole circle within a hair of each resonance; a middle radius spreads it.
 *
 * @param prepared - the column
 * @param prepared.inputImpedance
 * @param prepared.inputRadius
 * @param prepared.phaseRadius
 * @returns Pa·s/m³
 */
export function referenceImpedance({ inputImpedance, inputRadius, phaseRadius }: PreparedColumn): number {
  return inputImpedance * (inputRadius / phaseRadius) ** 2;
}

/**
 * Follows a wave from the mouth end down the bore and back.
 *
 * Its phase is 0 at the resonances that play, as that of the reflection at the outlet stands at its level there. But it
 * falls evenly with frequency, where that one waits for a resonance and then rushes past: the mass of a window or of an
 * embouchure's air does this. Where the reflection at the outlet turns, the wave turns round `matched` in its plane, so that
 * its turns can be told from few samples; and a curve through few samples of the phase finds a resonance. That is why near
 * resonances the phase leaves the losses out: then it is 0 where the impedance is real, to 1e-8 rad if it is not weak.
 *
 * @param prepared - the column, its impedance solved
 * @param maxima - whether maxima of the impedance play
 * @param out - the round trip to write
 * @returns nothing; the result is in `out`
 * @source phase closure of a wave between two reflections, any textbook of guided waves; both reflections are Möbius maps of
 *   the impedance on the same disc
 */
export function writeRoundTrip(prepared: PreparedColumn, maxima: boolean, out: RoundTrip): void {
  const { cells, mouth, system } = prepared;
  const unit = referenceImpedance(prepared);
  writeMouthRatio(cells, mouth.twoPort, unit, maxima);
  const zr = cell(cells, system.impedance) / unit;
  const zi = cell(cells, system.impedance + 1) / unit;
  const norm = maxima ? 1 / (zr * zr + zi * zi) : 1;
  const im = maxima ? -zi * norm : zi;
  const loss = zr * norm;
  const square = loss * loss;
  const far = im * im + square * square * square * square;
  writeReflection(0, im);
  out.losslessPhase = reflectionAngle();
  writeReflection((loss * far) / (1 + far), im);
  out.phase = reflectionAngle();
  writeReflection(loss, im);
  const size = 1 / (cell(fraction, 2) ** 2 + cell(fraction, 3) ** 2);
  out.re = (cell(fraction, 0) * cell(fraction, 2) + cell(fraction, 1) * cell(fraction, 3)) * size;
  out.im = (cell(fraction, 1) * cell(fraction, 2) - cell(fraction, 0) * cell(fraction, 3)) * size;
  writeMatched(out, maxima);
}

const ratio = new Float64Array(2);
const fraction = new Float64Array(4);

// g in (1 − g·v)/(1 + g*·v), v the impedance (the admittance where maxima play): by the mouth end's two-port without its
// losses, A and D real, B and C imaginary.
function writeMouthRatio(cells: Float64Array, at: number, unit: number, maxima: boolean): void {
  const ar = cell(cells, at);
  const bi = cell(cells, at + 3) / unit;
  const ci = cell(cells, at + 5) * unit;
  const dr = cell(cells, at + 6);
  const scale = 1 / (maxima ? dr * dr + ci * ci : ar * ar + bi * bi);
  ratio[0] = (dr * ar + ci * bi) * scale;
  ratio[1] = (maxima ? bi * dr - ar * ci : ci * ar - dr * bi) * scale;
}

// Numerator and denominator of (1 − g·v)/(1 + g*·v).
function writeReflection(re: number, im: number): void {
  const gr = cell(ratio, 0);
  const gi = cell(ratio, 1);
  fraction[0] = 1 - gr * re + gi * im;
  fraction[1] = -gr * im - gi * re;
  fraction[2] = 1 + gr * re + gi * im;
  fraction[3] = gr * im - gi * re;
}

function reflectionAngle(): number {
  return Math.atan2(
    cell(fraction, 1) * cell(fraction, 2) - cell(fraction, 0) * cell(fraction, 3),
    cell(fraction, 0) * cell(fraction, 2) + cell(fraction, 1) * cell(fraction, 3),
  );
}

// Where v = 1, w₀ = (1 − g)/(1 + g*); and the reflection at the outlet is −(1 + g*)/(1 + g)·(w − w₀)/(1 − w₀*·w).
function writeMatched(out: RoundTrip, maxima: boolean): void {
  const gr = cell(ratio, 0);
  const gi = cell(ratio, 1);
  const size = 1 / ((1 + gr) ** 2 + gi * gi);
  out.matchedRe = ((1 - gr) * (1 + gr) + gi * gi) * size;
  out.matchedIm = (-gi * (1 + gr) + (1 - gr) * gi) * size;
  const re = 1 - out.matchedRe * out.re - out.matchedIm * out.im;
  const im = -out.matchedRe * out.im + out.matchedIm * out.re;
  out.lead = (maxima ? 0 : Math.PI) - 2 * roughAngle(gi, 1 + gr) - roughAngle(im, re);
}
