import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { MM_PER_INCH } from '#shared/lengths/drills.ts';

export interface RuleTick {
  /** From the rule's zero, mm. */
  mm: number;
  size: 'small' | 'middle' | 'big';
  /** The figure that stands there, or null. */
  figure: string | null;
}

/** Figures stand at least this far apart, px. */
const FIGURE_PX = 32;
/** Ticks nearer than this run together, px. */
const TICK_PX = 2;

interface Graduation {
  tick: number;
  middle: number;
  big: number;
}

/** Finest first; lengths in the rule's own unit. */
const MM_GRADUATIONS: readonly Graduation[] = [
  { tick: 1, middle: 5, big: 10 },
  { tick: 2, middle: 10, big: 20 },
  { tick: 5, middle: 10, big: 50 },
  { tick: 10, middle: 50, big: 100 },
  { tick: 50, middle: 100, big: 500 },
];
const INCH_GRADUATIONS: readonly Graduation[] = [
  { tick: 1 / 16, middle: 1 / 4, big: 1 / 2 },
  { tick: 1 / 8, middle: 1 / 2, big: 1 },
  { tick: 1 / 4, middle: 1, big: 2 },
  { tick: 1 / 2, middle: 1, big: 5 },
  { tick: 1, middle: 5, big: 10 },
];

/** Ticks and figures of a rule of some length at some scale, from its zero on. */
export function ruleTicks(lengthMm: number, pxPerMm: number, unit: LengthUnit): RuleTick[] {
  const unitMm = unit === 'mm' ? 1 : MM_PER_INCH;
  const graduations = unit === 'mm' ? MM_GRADUATIONS : INCH_GRADUATIONS;
  const fits = (length: number, px: number) => length * unitMm * pxPerMm >= px;
  const coarsest = graduations.at(-1);
  const graduation =
    graduations.find(({ tick, big }) => fits(tick, TICK_PX) && fits(big, FIGURE_PX)) ?? coarsest;
  if (graduation === undefined) return [];
  const count = Math.floor(lengthMm / unitMm / graduation.tick + 1e-6);
  return Array.from({ length: count + 1 }, (_, index) => {
    const place = index * graduation.tick;
    const size = sizeOf(place, graduation);
    return { mm: place * unitMm, size, figure: size === 'big' ? figureOf(place) : null };
  });
}

const isMultiple = (place: number, of: number) => Math.abs(place / of - Math.round(place / of)) < 1e-6;

function sizeOf(place: number, { middle, big }: Graduation): RuleTick['size'] {
  if (isMultiple(place, big)) return 'big';
  return isMultiple(place, middle) ? 'middle' : 'small';
}

function figureOf(place: number): string {
  const whole = Math.floor(place + 1e-6);
  if (place - whole < 1e-6) return String(whole);
  return whole === 0 ? '½' : `${whole}½`;
}
