import { cell } from '../complex/cells.ts';
import { roughAngle } from '../numerics/rough-angle.ts';
import type { RoundTrip } from './round-trip.ts';

/** What is known of a column at one frequency. */
export interface PhaseSample {
  /** Hz */
  frequency: number;
  /** Of the reflection at the mouth end's outlet, rad; turns of no account. */
  phase: number;
  /** The same with its turns as counted along the bore. */
  counted: number;
  roundTrip: RoundTrip;
}

/**
 * Room for a sample.
 *
 * @returns the sample, to be filled in
 */
export function phaseSample(): PhaseSample {
  const roundTrip = { re: 0, im: 0, matchedRe: 0, matchedIm: 0, lead: 0, phase: 0, losslessPhase: 0 };
  return { frequency: 0, phase: 0, counted: 0, roundTrip };
}

/** An interval is even if the round trip turns by what the one before lets expect, within this, rad. */
const EVEN = 0.8;
/** And if what would match the outlet is so much smaller than what comes back, both squared. */
const MATCHED_SHARE = 0.7;

/** Round trips are expected to turn at most this much faster than in a plain tube of the column's length. */
const STEEPEST = 2;

/** Cells of one sample, and the place of each. */
const CELLS = 8;
const FREQUENCY = 0;
/** Of the reflection at the outlet, with its turns, rad. */
const PHASE = 1;
const COUNTED = 2;
/** Phase of the round trip, turns of no account, rad. */
const ROUND_TRIP = 3;
/** What comes back, less what would match the outlet: turns as the reflection at the outlet does. */
const APART_RE = 4;
const APART_IM = 5;
/** Phase of the reflection less that of `APART`, rad; never turns. */
const LEAD = 6;
/** Phase of what comes back with the turns nearest to an even fall, rad; NaN where the outlet is nearly matched. */
const EVEN_TURN = 7;

/**
 * Phase of a reflection over frequency with its whole turns; grows as samples come in.
 */
export class PhaseTrack {
  count = 0;
  private cells = new Float64Array(48 * CELLS);
  /** What a round trip turns by per Hz in a plain tube of the column's length, rad. */
  private readonly plainSlope: number;

  /**
   * @param plainSlope - what a round trip turns by per Hz in a plain tube of the column's length, rad, below 0
   */
  constructor(plainSlope: number) {
    this.plainSlope = plainSlope;
  }

  /**
   * Frequency of a sample.
   *
   * @param place - of the sample
   * @returns Hz
   */
  frequency(place: number): number {
    return this.read(place, FREQUENCY);
  }

  /**
   * Phase of the reflection at the outlet, with its turns.
   *
   * @param place - of the sample
   * @returns rad
   */
  phase(place: number): number {
    return this.read(place, PHASE);
  }

  /**
   * The same as counted along the bore.
   *
   * @param place - of the sample
   * @returns rad
   */
  counted(place: number): number {
    return this.read(place, COUNTED);
  }

  /**
   * Phase of the round trip.
   *
   * @param place - of the sample
   * @returns rad, turns of no account
   */
  roundTrip(place: number): number {
    return this.read(place, ROUND_TRIP);
  }

  /**
   * Puts a sample before another one, or behind all, and takes the turns of those that follow anew.
   *
   * @param place - where it will stand
   * @param sample - the sample
   * @returns nothing; the sample is in the track
   */
  insert(place: number, sample: PhaseSample): void {
    if ((this.count + 1) * CELLS > this.cells.length) this.grow();
    const at = place * CELLS;
    if (place < this.count) this.cells.copyWithin(at + CELLS, at, this.count * CELLS);
    this.count += 1;
    const { re, im, matchedRe, matchedIm, lead, phase } = sample.roundTrip;
    this.cells[at + FREQUENCY] = sample.frequency;
    this.cells[at + PHASE] = sample.phase;
    this.cells[at + COUNTED] = sample.counted;
    this.cells[at + ROUND_TRIP] = phase;
    this.cells[at + APART_RE] = re - matchedRe;
    this.cells[at + APART_IM] = im - matchedIm;
    this.cells[at + LEAD] = lead;
    const matched = matchedRe * matchedRe + matchedIm * matchedIm;
    this.cells[at + EVEN_TURN] = matched < MATCHED_SHARE * (re * re + im * im) ? roughAngle(im, re) : NaN;
    if (place > 0) this.takeTurns(place);
    if (place + 1 < this.count) this.takeTurnsAnew(place + 1);
  }

  /**
   * What the phase turns by from the sample before to this one.
   *
   * @param place - of the sample, from 1
   * @returns rad; falls are below 0
   */
  turn(place: number): number {
    return this.phase(place) - this.phase(place - 1);
  }

  /**
   * How far the turn from the sample before is from the one counted along the bore.
   *
   * @param place - of the sample
   * @returns rad, ≥ 0; 0 where there is no such sample or none before it
   */
  miscount(place: number): number {
    if (place < 1 || place >= this.count) return 0;
    return Math.abs(this.counted(place) - this.counted(place - 1) - this.turn(place));
  }

  /**
   * Whether the round trip falls as evenly from the sample before to this one as it did before.
   *
   * @param place - of the sample, from 1
   * @returns whether it does, and the outlet is far from matched
   */
  isEven(place: number): boolean {
    const turn = this.read(place, EVEN_TURN) - this.read(place - 1, EVEN_TURN);
    const expected = this.expectedTurn(place);
    return expected < -EVEN && Math.abs(turn - expected) < EVEN;
  }

  /**
   * How clear of the origin the reflection, drawn in the plane, passes between the sample before and this one: how far the
   * straight line between them stays away, over how far the curve is bent from it, judged by the samples beside them.
   *
   * @param place - of the sample, from 1
   * @returns no unit, ≥ 0; from 1 on it is known on which side it passes
   */
  clearance(place: number): number {
    const ar = this.read(place - 1, APART_RE);
    const ai = this.read(place - 1, APART_IM);
    const dr = this.read(place, APART_RE) - ar;
    const di = this.read(place, APART_IM) - ai;
    const share = Math.min(Math.max(-(ar * dr + ai * di) / (dr * dr + di * di), 0), 1);
    const distance = Math.hypot(ar + share * dr, ai + share * di);
    const before = place > 1 ? this.bend(place, place - 2) : 0;
    const after = place + 1 < this.count ? this.bend(place, place + 1) : 0;
    return distance / Math.max(before, after);
  }

  // Sagitta of the arc over an interval, by the second difference with a sample beside it.
  private bend(place: number, beside: number): number {
    const re = this.secondDifference(place, beside, APART_RE);
    const im = this.secondDifference(place, beside, APART_IM);
    return (Math.hypot(re, im) * (this.frequency(place) - this.frequency(place - 1)) ** 2) / 4;
  }

  private secondDifference(place: number, beside: number, part: number): number {
    const a = this.frequency(place - 1);
    const b = this.frequency(place);
    const c = this.frequency(beside);
    const over = (this.read(place, part) - this.read(place - 1, part)) / (b - a);
    const aside = (this.read(beside, part) - this.read(place - 1, part)) / (c - a);
    return (over - aside) / (b - c);
  }

  // Turns of a sample from the one before: those of the round trip where that falls evenly, else the fewest.
  private takeTurns(place: number): void {
    const at = place * CELLS;
    const evenBefore = this.read(place - 1, EVEN_TURN);
    if (!Number.isNaN(evenBefore)) {
      this.cells[at + EVEN_TURN] = nearestTurn(
        this.read(place, EVEN_TURN),
        evenBefore + this.expectedTurn(place),
      );
    }
    const before = this.angle(place - 1);
    const angle = this.angle(place);
    const turn = this.isEven(place)
      ? nearestTurn(angle, this.read(place, EVEN_TURN)) - nearestTurn(before, evenBefore)
      : nearestTurn(angle - before, 0);
    const lead = this.read(place, LEAD) - this.read(place - 1, LEAD);
    this.cells[at + PHASE] = nearestTurn(this.phase(place), this.phase(place - 1) + turn + lead);
  }

  private takeTurnsAnew(place: number): void {
    const phase = this.phase(place);
    const even = this.read(place, EVEN_TURN);
    this.takeTurns(place);
    const shift = this.phase(place) - phase;
    const evenShift = this.read(place, EVEN_TURN) - even;
    for (let at = (place + 1) * CELLS; at < this.count * CELLS; at += CELLS) {
      this.cells[at + PHASE] = cell(this.cells, at + PHASE) + shift;
      this.cells[at + EVEN_TURN] = cell(this.cells, at + EVEN_TURN) + evenShift;
    }
  }

  private angle(place: number): number {
    return roughAngle(this.read(place, APART_IM), this.read(place, APART_RE));
  }

  private expectedTurn(place: number): number {
    const width = this.frequency(place) - this.frequency(place - 1);
    const plain = this.plainSlope * width;
    if (place < 2) return plain;
    const turn = this.read(place - 1, EVEN_TURN) - this.read(place - 2, EVEN_TURN);
    if (Number.isNaN(turn)) return plain;
    const slope = turn / (this.frequency(place - 1) - this.frequency(place - 2));
    // No slower than standing still, and no faster than in a tube of twice the length: a slip must not carry on.
    return Math.min(Math.max(slope, STEEPEST * this.plainSlope), 0) * width;
  }

  private read(place: number, part: number): number {
    return cell(this.cells, place * CELLS + part);
  }

  private grow(): void {
    const wider = new Float64Array(2 * this.cells.length);
    wider.set(this.cells);
    this.cells = wider;
  }
}

/**
 * Phase with the whole turns that bring it nearest to another.
 *
 * @param phase - rad, turns of no account
 * @param expected - rad
 * @returns rad, within half a turn of what is expected
 */
export function nearestTurn(phase: number, expected: number): number {
  return phase + 2 * Math.PI * Math.round((expected - phase) / (2 * Math.PI));
}
