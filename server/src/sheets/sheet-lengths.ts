import { MM_PER_INCH } from '#shared/lengths/drills.ts';
import { printInchFraction, printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import type { SheetInput, SheetUnit } from './sheet-input.ts';

/** How a sheet writes lengths. */
export interface LengthWriting {
  /** The unit of every bold figure. */
  unit: LengthUnit;
  /** What stands after or under it: nothing, the other unit, or the nearest 64th of an inch. */
  besides: 'nothing' | 'other-unit' | 'fraction';
}

export interface WrittenLength {
  main: string;
  /** Empty when nothing stands besides. */
  besides: string;
}

export function lengthWriting(unit: SheetUnit, workshopUnit: LengthUnit): LengthWriting {
  if (unit === 'both') return { unit: workshopUnit, besides: 'other-unit' };
  return { unit, besides: unit === 'inch' ? 'fraction' : 'nothing' };
}

export function writingOf(input: SheetInput): LengthWriting {
  return lengthWriting(input.unit, input.workshop.unit);
}

/** A position or a span: to a tenth of a millimetre, or a thousandth of an inch. */
export function writeLength(mm: number, { unit, besides }: LengthWriting): WrittenLength {
  const main = printLength(mm, unit);
  if (besides === 'nothing') return { main, besides: '' };
  if (besides === 'fraction') return { main, besides: nearestFraction(mm) };
  const other = unit === 'mm' ? 'inch' : 'mm';
  return { main, besides: `(${printLength(mm, other)})` };
}

/** The nearest 64th of an inch, marked when it is not the length itself. */
function nearestFraction(mm: number): string {
  const sixtyFourths = (mm / MM_PER_INCH) * 64;
  const isExact = Math.abs(sixtyFourths - Math.round(sixtyFourths)) < 0.01;
  return `${isExact ? '' : '~'}${printInchFraction(mm)}`;
}

/** A diameter: as a length, but to a hundredth of a millimetre where a tenth would round it. */
export function writeDiameter(mm: number, writing: LengthWriting): WrittenLength {
  const written = writeLength(mm, writing);
  const isTenth = Math.abs(mm * 10 - Math.round(mm * 10)) < 0.05;
  if (writing.unit === 'inch' || isTenth) return written;
  return { ...written, main: printLength(mm, 'mm', 2) };
}

/** A span or a join within a sentence: without a decimal where there is none to write. */
export function spanInWords(mm: number, writing: LengthWriting): string {
  const isWhole = Math.abs(mm - Math.round(mm)) < 0.005;
  if (Math.abs(mm) < 0.005) return '0';
  if (writing.unit === 'inch' || !isWhole) return lengthInWords(mm, writing);
  const main = printLength(mm, 'mm', 0);
  return writing.besides === 'other-unit' ? `${main} (${printLength(mm, 'inch')})` : main;
}

/** A length within a sentence: the figure and what stands besides it. */
export function lengthInWords(mm: number, writing: LengthWriting): string {
  const { main, besides } = writeLength(mm, writing);
  return writing.besides === 'other-unit' ? `${main} ${besides}` : main;
}

export function diameterInWords(mm: number, writing: LengthWriting): string {
  const { main, besides } = writeDiameter(mm, writing);
  return writing.besides === 'other-unit' ? `${main} ${besides}` : main;
}

export function unitInWords({ unit, besides }: LengthWriting): string {
  const name = { mm: 'mm', inch: 'inches' } as const;
  if (besides !== 'other-unit') return name[unit];
  return unit === 'mm' ? 'mm (inches in brackets)' : 'inches (mm in brackets)';
}
