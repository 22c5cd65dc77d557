import { readLength, type LengthReading } from '../lengths/read-length.ts';
import { isFigure, type DecimalMark } from './measurement-table.ts';

export const COLUMN_UNITS = ['mm', 'cm', 'inch'] as const;
export type ColumnUnit = (typeof COLUMN_UNITS)[number];

export interface CellRules {
  /** Of a figure that does not say its own. */
  unit: ColumnUnit;
  decimalMark: DecimalMark;
}

const HAS_UNIT = /(mm|cm|in\.?|inch(es)?|"|\u2033|'')$|^#/i;

/**
 * Reads one measured length. Stricter than a field: in a table an `x` is a gap, not a drill, and `1-12` a date, not a sum.
 *
 * @returns the length in mm, or a sentence about the cell that begins with what stands in it
 */
export function readCell(cell: string, { unit, decimalMark }: CellRules): LengthReading {
  const text = cell.trim();
  const other = decimalMark === 'comma' ? '.' : ',';
  if (!isFigure(text))
    return { status: 'unreadable', message: `\u201c${text}\u201d cannot be read as a length.` };
  if (text.replace(/in\.$/i, 'in').includes(other)) {
    const [mark, wrong] = decimalMark === 'comma' ? ['a comma', 'a point'] : ['a point', 'a comma'];
    return {
      status: 'unreadable',
      message: `\u201c${text}\u201d has ${wrong}, and decimals here have ${mark}.`,
    };
  }
  if (unit === 'cm' && !HAS_UNIT.test(text)) return readLength(`${text} cm`, 'mm');
  return readLength(text, unit === 'inch' ? 'inch' : 'mm');
}
