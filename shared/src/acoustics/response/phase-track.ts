import { cell } from '../complex/cells.ts';

/** Phase of a reflection at one frequency, rad. */
export interface PhaseSample {
  /** Hz */
  frequency: number;
  /** Turns of no account. */
  phase: number;
  /** Share of the power that comes back. */
  reflected: number;
  /** With its turns as counted along the bore. */
  counted: number;
}

/**
 * Phase of a reflection over frequency, its whole turns counted from sample to sample; grows as samples come in.
 */
export class PhaseTrack {
  frequencies = new Float64Array(64);
  phases = new Float64Array(64);
  /** Phase with its turns as counted along the bore at each sample, rad. */
  counts = new Float64Array(64);
  /** Share of the power that comes back at each sample. */
  reflected = new Float64Array(64);
  count = 0;

  /**
   * Puts a sample before another one, or behind all, and counts the turns of those that follow anew.
   *
   * @param place - where it will stand
   * @param sample - the sample
   * @returns nothing; the sample is in the track
   */
  insert(place: number, sample: PhaseSample): void {
    if (this.count === this.frequencies.length) this.grow();
    for (const values of [this.frequencies, this.phases, this.counts, this.reflected]) {
      values.copyWithin(place + 1, place, this.count);
    }
    this.frequencies[place] = sample.frequency;
    this.counts[place] = sample.counted;
    this.reflected[place] = sample.reflected;
    const phase = place === 0 ? sample.phase : nearestTurn(sample.phase, cell(this.phases, place - 1));
    this.phases[place] = phase;
    this.count += 1;
    if (place + 1 === this.count) return;
    const next = cell(this.phases, place + 1);
    const shift = nearestTurn(next, phase) - next;
    for (let i = place + 1; i < this.count; i += 1) this.phases[i] = cell(this.phases, i) + shift;
  }

  private grow(): void {
    for (const key of ['frequencies', 'phases', 'counts', 'reflected'] as const) {
      const wider = new Float64Array(2 * this[key].length);
      wider.set(this[key]);
      this[key] = wider;
    }
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
