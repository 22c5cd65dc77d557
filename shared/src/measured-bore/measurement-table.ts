import { dsvFormat } from 'd3';

/** What stands between two columns of a table of measurements. */
export const SEPARATORS = ['tab', 'semicolon', 'space', 'comma'] as const;
export type Separator = (typeof SEPARATORS)[number];

export const DECIMAL_MARKS = ['point', 'comma'] as const;
export type DecimalMark = (typeof DECIMAL_MARKS)[number];

/** Far above what anybody measures by hand; a film or a log chosen by mistake must not be read to its end. */
export const MEASUREMENT_LIMITS = { bytes: 1_000_000, rows: 2000, columns: 20 } as const;

export interface MeasurementRow {
  /** As a spreadsheet counts, from 1 and with blank rows. */
  row: number;
  cells: string[];
}

export interface MeasurementTable {
  separator: Separator;
  decimalMark: DecimalMark;
  /** What stands over the columns; null where the table begins with figures. */
  header: string[] | null;
  /** Rows below the heading that say anything at all. */
  rows: MeasurementRow[];
  columnCount: number;
  /** Everything reads, but perhaps not as it was meant. */
  doubt: string | null;
}

export type TableReading =
  { status: 'read'; table: MeasurementTable } | { status: 'refused'; message: string };

export interface TableChoices {
  separator: Separator | null;
  decimalMark: DecimalMark | null;
}

const DELIMITERS: Record<Exclude<Separator, 'space'>, string> = { tab: '\t', semicolon: ';', comma: ',' };
const FIGURE =
  /^[+\-\u2212]?(\d+([.,]\d*)?|[.,]\d+|(\d+\s+)?\d+\s*\/\s*\d+)\s*(mm|cm|in\.?|inch(es)?|"|\u2033|'')?$|^#\s*\d+$/i;

/** A number, a fraction or a drill's number, with or without its unit: what a cell may hold. */
export const isFigure = (cell: string) => FIGURE.test(cell.trim());

/**
 * Finds rows, columns and heading of a table that was saved or copied from a spreadsheet or typed by hand.
 *
 * @param choices - what the person says separates columns and decimals; null where it is to be recognised
 */
export function readMeasurementTable(text: string, choices: TableChoices): TableReading {
  const lines = text.replace(/^\uFEFF/, '');
  const separator = choices.separator ?? likeliestSeparator(lines);
  const rows = splitRows(lines, separator)
    .map((cells, index) => ({ row: index + 1, cells: cells.map((cell) => cell.trim()) }))
    .filter(({ cells }) => cells.some((cell) => cell !== ''));
  const refusal = tooLarge(rows);
  if (refusal !== null) return { status: 'refused', message: refusal };
  const first = rows.findIndex((_, index) => isDataRow(rows, index));
  if (first < 0) {
    return {
      status: 'refused',
      message:
        'No row has both a distance and a diameter. Give a row to each place: the distance first, then one or more diameters.',
    };
  }
  const data = rows.slice(first);
  const decimalMark = choices.decimalMark ?? likeliestDecimalMark(data);
  const columnCount = Math.max(...data.map(({ cells }) => cells.length));
  const header =
    rows.slice(0, first).findLast(({ cells }) => cells.filter(Boolean).length > 1)?.cells ?? null;
  const doubt = commaDoubt(separator, columnCount, data);
  return { status: 'read', table: { separator, decimalMark, header, rows: data, columnCount, doubt } };
}

function tooLarge(rows: readonly MeasurementRow[]): string | null {
  const { rows: mostRows, columns: mostColumns } = MEASUREMENT_LIMITS;
  if (rows.length > mostRows)
    return `The table has ${rows.length} rows; ${mostRows} at most are read. Keep every second row, or the part of the bore that matters.`;
  const wide = rows.find(({ cells }) => cells.length > mostColumns);
  if (wide === undefined) return null;
  return `Row ${wide.row} has ${wide.cells.length} columns; ${mostColumns} at most are read. Keep the distance and the diameters.`;
}

function splitRows(text: string, separator: Separator): string[][] {
  if (separator !== 'space') return dsvFormat(DELIMITERS[separator]).parseRows(text);
  return text.split(/\r\n|\r|\n/).map((line) => line.trim().split(/\s+/));
}

/** Enough rows to tell by. */
const LOOKED_AT = 200;

/** The separator by which most rows fall into the same number of columns with figures in at least two of them. */
function likeliestSeparator(text: string): Separator {
  const sample = text
    .split(/\r\n|\r|\n/)
    .slice(0, LOOKED_AT)
    .join('\n');
  let found: { separator: Separator; rows: number } = { separator: 'comma', rows: 0 };
  for (const separator of SEPARATORS) {
    const widths = splitRows(sample, separator)
      .filter((cells) => cells.filter(isFigure).length > 1)
      .map((cells) => cells.length);
    const rows = mostAlike(widths);
    // The earlier in the list, the less likely it stands inside a figure or a word: a tie goes to the earlier.
    if (rows > found.rows) found = { separator, rows };
  }
  return found.separator;
}

function mostAlike(widths: readonly number[]): number {
  const counts = new Map<number, number>();
  for (const width of widths) counts.set(width, (counts.get(width) ?? 0) + 1);
  return Math.max(0, ...counts.values());
}

const HAS_WORD = /\p{L}{3}/u;

/** Two figures make a row of data, save in a heading such as `Distance, 0, 90` that names gauge directions by their angle. */
function isDataRow(rows: readonly MeasurementRow[], index: number): boolean {
  const cells = rows[index]?.cells ?? [];
  if (cells.filter(isFigure).length < 2) return false;
  const below = rows[index + 1]?.cells ?? [];
  const isHeading =
    index === 0 &&
    cells.some((cell, column) => HAS_WORD.test(cell) && !isFigure(cell) && isFigure(below[column] ?? ''));
  return !isHeading;
}

function likeliestDecimalMark(rows: readonly MeasurementRow[]): DecimalMark {
  const figures = rows.flatMap(({ cells }) => cells.filter(isFigure));
  const withComma = figures.filter((cell) => cell.includes(',')).length;
  const withPoint = figures.filter((cell) => /\d\.|\.\d/.test(cell)).length;
  return withComma > withPoint ? 'comma' : 'point';
}

/** `10,5,12,7` may be four figures or two: it must not pass in silence. */
function commaDoubt(separator: Separator, columnCount: number, rows: readonly MeasurementRow[]) {
  const hasDecimals = rows.some(({ cells }) => cells.some((cell) => /\d[.,]\d/.test(cell)));
  if (separator !== 'comma' || columnCount < 3 || hasDecimals) return null;
  return 'Commas stand between the columns, and no figure has decimals. If commas stand inside the figures as well, save the table again with semicolons or tabs between the columns.';
}
