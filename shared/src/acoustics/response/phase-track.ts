import { cell } from '../complex/cells.ts';
/** Rise of the phase from one sample to the next that is taken as such, rad; more is a fall by the rest of a turn. */
const RISE = 1;

/**
 * Phase of a reflection over frequency, its whole turns counted; grows as samples come in.
 */
export class PhaseTrack {
  frequencies = new Float64Array(64);
  phases = new Float64Array(64);
  count = 0;
  /** Phase at the last sample as counted from foot to mouth, rad. */
  counted = 0;

  /**
   * Adds a sample above all others.
   *
   * @param frequency - Hz
   * @param principal - phase without its whole turns, rad
   * @returns the phase with its turns, rad
   */
  push(frequency: number, principal: number): number {
    return this.insert(this.count, frequency, principal);
  }

  /**
   * Puts a sample before another one and counts the turns of all that follow anew.
   *
   * @param place - where it will stand
   * @param frequency - Hz
   * @param principal - phase without its whole turns, rad
   * @returns the phase with its turns, rad
   */
  insert(place: number, frequency: number, principal: number): number {
    if (this.count === this.frequencies.length) this.grow();
    this.frequencies.copyWithin(place + 1, place, this.count);
    this.phases.copyWithin(place + 1, place, this.count);
    this.frequencies[place] = frequency;
    const phase = place === 0 ? principal : unwrapped(principal, cell(this.phases, place - 1));
    this.phases[place] = phase;
    this.count += 1;
    if (place + 1 < this.count) {
      const next = cell(this.phases, place + 1);
      const shift = unwrapped(next, phase) - next;
      if (shift !== 0)
        for (let i = place + 1; i < this.count; i += 1) this.phases[i] = cell(this.phases, i) + shift;
    }
    return phase;
  }

  private grow(): void {
    for (const key of ['frequencies', 'phases'] as const) {
      const wider = new Float64Array(2 * this[key].length);
      wider.set(this[key]);
      this[key] = wider;
    }
  }
}

/**
 * Phase with the whole turns that make it fall from the one before: by less than a turn, or rise by less than `RISE`.
 *
 * The phase of a reflection falls with frequency, strictly without losses; with them it may rise a little where the
 * reflection is weak.
 *
 * @param phase - rad, turns of no account
 * @param before - at the frequency below, rad
 * @returns rad
 */
export function unwrapped(phase: number, before: number): number {
  const turn = 2 * Math.PI;
  return phase - turn * Math.ceil((phase - before - RISE) / turn);
}
