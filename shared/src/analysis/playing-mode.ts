import type { Column, HoleState } from '../acoustics/response/column.ts';
import type { Resonance } from '../acoustics/response/resonances.ts';
import { centsBetween } from '../music/cents.ts';
import type { LadderMultiples } from './ladder.ts';
import { resonanceHeight } from './ladder.ts';

/** A closed column that widens at least so much from reed to foot is a cone and sounds all multiples, not the odd ones. */
const CONE_WIDENING = 2;

/** Whether the column opens anywhere beyond its mouth end. */
function opensBeyond(column: Column, states: readonly HoleState[]): boolean {
  return column.foot.kind !== 'stopped' || states.some((state) => state.kind !== 'closed');
}

/** Open–open and closed–closed columns, and closed cones, sound 1:2:3…; open–closed ones 1:3:5…. */
export function ladderMultiples(
  column: Column,
  states: readonly HoleState[],
  maxima: boolean,
): LadderMultiples {
  const open = opensBeyond(column, states);
  if (!maxima) return open ? 'all' : 'odd';
  const mouth = column.bore[0]?.radius ?? NaN;
  const foot = column.bore.at(-1)?.radius ?? NaN;
  return !open || foot >= CONE_WIDENING * mouth ? 'all' : 'odd';
}

/** Holes left open, wholly or in part, above a covered one: they vent the column and pull its low resonances up. */
export function ventCount(states: readonly HoleState[]): number {
  const lastCovered = states.findLastIndex((state) => state.kind === 'closed');
  return states.slice(0, Math.max(lastCovered, 0)).filter((state) => state.kind !== 'closed').length;
}

export interface RegisterQuestion {
  resonances: readonly Resonance[];
  maxima: boolean;
  register: number;
  vents: number;
  targetHz: number;
}

/**
 * Which resonance a register plays; null when there is none.
 *
 * Register r plays resonance r (in open–closed columns that is the odd multiple 2r − 1: register 2 is the twelfth). Every
 * open hole above a covered one can lift a low resonance up to the next one's place, so that with n such vents the note may
 * lie at resonance r − n at the least. A lower one is taken only if it is both the stronger and nearer to the note
 * wanted: what would sound anyway. Nearness alone never decides, or a design out of tune would look in tune.
 */
export function playingResonance(question: RegisterQuestion): Resonance | null {
  const { resonances, maxima, register, vents, targetHz } = question;
  const distance = (resonance: Resonance) => Math.abs(centsBetween(resonance.frequency, targetHz));
  const least = register === 1 ? 1 : Math.max(1, register - vents);
  let playing = resonances.find((resonance) => resonance.order === register) ?? null;
  for (let order = register - 1; order >= least; order -= 1) {
    const lower = resonances.find((resonance) => resonance.order === order);
    if (lower === undefined || playing === null) continue;
    const stronger = resonanceHeight(lower, maxima) > resonanceHeight(playing, maxima);
    if (stronger && distance(lower) < distance(playing)) playing = lower;
  }
  return playing;
}
