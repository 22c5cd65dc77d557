import { MM_PER_INCH } from '#shared/lengths/drills.ts';
import { printExactLength } from '#shared/lengths/print-length.ts';
import { readLength, type LengthUnit } from '#shared/lengths/read-length.ts';
import type { NumberFormat } from './number-format.ts';

/** Stored in mm, shown and typed in the person's unit; takes fractions, drill names and sums as well. */
export function lengthFormat(
  unit: LengthUnit,
  stepMm = unit === 'mm' ? 0.1 : 0.005 * MM_PER_INCH,
): NumberFormat {
  return {
    suffix: unit === 'mm' ? 'mm' : 'in',
    step: stepMm,
    addsWithPlus: true,
    print: (value) => printExactLength(value, unit),
    read: (text) => {
      const reading = readLength(text, unit);
      return reading.status === 'read' ? { status: 'read', value: reading.mm } : reading;
    },
  };
}
