import { MM_PER_INCH } from '#shared/lengths/drills.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';

export interface ScaleTick {
  /** Reading of the scale, mm. */
  atMm: number;
  /** 1 for the longest ticks, less for those between. */
  length: number;
  /** Figure at the tick; empty for most. */
  figure: string;
}

/** Ticks of a rule between two readings: every millimetre, or every sixteenth of an inch. */
export function scaleTicks(fromMm: number, toMm: number, unit: LengthUnit): ScaleTick[] {
  const stepMm = unit === 'mm' ? 1 : MM_PER_INCH / 16;
  const first = Math.ceil(fromMm / stepMm - 1e-9);
  const last = Math.floor(toMm / stepMm + 1e-9);
  const count = Math.max(0, last - first + 1);
  return Array.from({ length: count }, (_, index) => tick(first + index, { stepMm, unit }));
}

function tick(step: number, { stepMm, unit }: { stepMm: number; unit: LengthUnit }): ScaleTick {
  const [whole, half] = unit === 'mm' ? [10, 5] : [16, 8];
  const isWhole = step % whole === 0;
  const figure = String(unit === 'mm' ? step : step / whole).replace('-', '\u2212');
  return {
    atMm: step * stepMm,
    length: isWhole ? 1 : step % half === 0 ? 0.69 : 0.42,
    figure: isWhole ? figure : '',
  };
}
