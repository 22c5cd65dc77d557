import type { PhaseTrack } from './phase-track.ts';

/** A curve may go so many times further beyond a sample than the parabola through it and its neighbours does. */
const BEYOND_PARABOLA = 2;
/** And by such a share of the turns beside it where it is skewed. */
const SKEW = 0.3;
/** Phases are told apart down to this, rad; a pair of resonances nearer to vanishing is as good as none. */
const LEAST = 1e-3;

/**
 * Interval in which the phase may touch a level that no sample shows: beside a sample where it turns round just short of it.
 *
 * Where holes leak a phase may rise a little, reach a level and fall through it once more; that is a resonance.
 *
 * @param track - the phase
 * @param place - of the sample
 * @param level - phase at resonances, rad; whole turns of no account
 * @returns place of the sample that ends the interval; 0 where there is none
 */
export function touchingInterval(track: PhaseTrack, place: number, level: number): number {
  if (place < 1 || place + 1 >= track.count) return 0;
  const before = track.turn(place);
  const after = track.turn(place + 1);
  if (before * after >= 0) return 0;
  const left = track.frequency(place) - track.frequency(place - 1);
  const right = track.frequency(place + 1) - track.frequency(place);
  const bend = (after / right - before / left) / (left + right);
  const slope = before / left + bend * left;
  const beyond = (slope * slope) / (4 * Math.abs(bend));
  const turns = (track.phase(place) - level) / (2 * Math.PI);
  const short = 2 * Math.PI * (before > 0 ? Math.ceil(turns) - turns : turns - Math.floor(turns));
  const skewed = SKEW * Math.min(Math.abs(before), Math.abs(after));
  if (short > BEYOND_PARABOLA * beyond + skewed + LEAST) return 0;
  return slope * before > 0 ? place + 1 : place;
}
