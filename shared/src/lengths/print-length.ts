import { MM_PER_INCH } from './drills.ts';
import type { LengthUnit } from './read-length.ts';

/**
 * A stored length in the person's unit, without the unit's name: one decimal in mm (two below 0.1), three in inch.
 *
 * Digits that would change the stored value are kept, to a micrometre, so that what stands in a field is what is stored.
 */
export function printLength(mm: number, unit: LengthUnit, digits?: number): string {
  const value = unit === 'mm' ? mm : mm / MM_PER_INCH;
  const usual = unit === 'inch' ? 3 : Math.abs(mm) > 0 && Math.abs(mm) < 0.1 ? 2 : 1;
  const text = value.toFixed(digits ?? usual);
  return Number(text) === 0 ? text.replace('-', '') : text.replace('-', '\u2212');
}

/** As `printLength`, with as many digits as the stored value needs (to a micrometre): for fields that are edited. */
export function printExactLength(mm: number, unit: LengthUnit): string {
  const value = unit === 'mm' ? mm : mm / MM_PER_INCH;
  const [least, most] = unit === 'mm' ? [1, 3] : [3, 4];
  for (let digits = least; digits < most; digits += 1) {
    if (Math.abs(Number(value.toFixed(digits)) - value) < 5e-5) return printLength(mm, unit, digits);
  }
  return printLength(mm, unit, most);
}

/** Nearest 64th of an inch as a fraction, `1 3/8`, for sheets that show both units. */
export function printInchFraction(mm: number): string {
  const sixtyFourths = Math.round((mm / MM_PER_INCH) * 64);
  const whole = Math.trunc(sixtyFourths / 64);
  let top = Math.abs(sixtyFourths) % 64;
  if (top === 0) return String(whole);
  let bottom = 64;
  while (top % 2 === 0) [top, bottom] = [top / 2, bottom / 2];
  return whole === 0 ? `${sixtyFourths < 0 ? '\u2212' : ''}${top}/${bottom}` : `${whole} ${top}/${bottom}`;
}
