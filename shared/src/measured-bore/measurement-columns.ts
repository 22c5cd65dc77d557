import { median } from 'd3';
import { MM_PER_INCH } from '../lengths/drills.ts';
import { readCell, type ColumnUnit } from './measurement-cell.ts';
import type { MeasurementTable } from './measurement-table.ts';

export const COLUMN_KINDS = ['distance', 'diameter', 'radius', 'unused'] as const;
export type ColumnKind = (typeof COLUMN_KINDS)[number];

export interface MeasurementColumn {
  index: number;
  /** What stands over it in the table; null without a heading. */
  title: string | null;
  kind: ColumnKind;
  unit: ColumnUnit;
}

/** What the person says of a column, where it was not recognised as meant. */
export type ColumnCorrections = Readonly<
  Record<number, { kind?: ColumnKind | undefined; unit?: ColumnUnit | undefined }>
>;

/** The bore as drawn: what the figures are likely to be near. */
export interface DrawnSize {
  diameterMm: number;
}

const TITLES: [ColumnKind, RegExp][] = [
  ['unused', /^(no\.?|nr\.?|row|index|#|note|notes|remark|remarks|comment|temp.*)$/i],
  ['radius', /radius|\brad\b/i],
  ['diameter', /diam|bore|\bdia\b|\u00d8|gauge|width|\u00b0|\bdeg|^d\s*\d*\b/i],
  ['distance', /dist|pos|\bfrom\b|depth|station|\bx\b|along|axis|length/i],
];
const UNITS: [ColumnUnit, RegExp][] = [
  ['mm', /\bmm\b|millimet/i],
  ['cm', /\bcm\b|centimet/i],
  ['inch', /\binch|\bins?\b|"|\u2033/i],
];

interface ColumnFigures {
  index: number;
  title: string | null;
  /** Every figure of the column as if it were mm. */
  values: number[];
}

/** What each column holds and in which unit: by its heading where it says so, else by its figures. */
export function recogniseColumns(
  table: MeasurementTable,
  drawn: DrawnSize,
  corrections: ColumnCorrections,
): MeasurementColumn[] {
  const columns = Array.from({ length: table.columnCount }, (_, index) => figuresOf(table, index));
  const kinds = likeliestKinds(columns, drawn);
  const recognised = columns.map((column, position) => {
    const { index, title } = column;
    const kind = corrections[index]?.kind ?? kinds[position] ?? 'unused';
    const titled = byTitle(UNITS, title);
    return { index, title, kind, titled, likely: titled ?? likeliestUnit(column, kind, drawn) };
  });
  // How long a stretch was measured says nothing of its unit: distances are in the diameters' unit unless they say another.
  const across = recognised.find(({ kind }) => kind === 'diameter' || kind === 'radius')?.likely ?? 'mm';
  return recognised.map(({ titled, likely, ...column }) => ({
    ...column,
    unit: corrections[column.index]?.unit ?? (column.kind === 'distance' ? (titled ?? across) : likely),
  }));
}

function figuresOf(table: MeasurementTable, index: number): ColumnFigures {
  const title = table.header?.[index] ?? '';
  const values = table.rows.flatMap(({ cells }) => {
    const reading = readCell(cells[index] ?? '', { unit: 'mm', decimalMark: table.decimalMark });
    return reading.status === 'read' ? [reading.mm] : [];
  });
  return { index, title: title === '' ? null : title, values };
}

function byTitle<Meaning>(
  meanings: readonly (readonly [Meaning, RegExp])[],
  title: string | null,
): Meaning | undefined {
  return title === null ? undefined : meanings.find(([, words]) => words.test(title))?.[0];
}

function likeliestKinds(columns: readonly ColumnFigures[], drawn: DrawnSize): ColumnKind[] {
  const titled = columns.map(({ title }) => byTitle(TITLES, title));
  const running = columns.filter(
    ({ values }, at) => runsOneWay(values) && (titled[at] ?? 'distance') === 'distance',
  );
  // A column that counts 1, 2, 3 runs one way too, but beside another such column it only counts.
  const distance =
    running.find(({ index }) => titled[index] === 'distance') ??
    running.find(({ values }) => !isCount(values)) ??
    running[0];
  return columns.map(({ index, values }) => {
    if (index === distance?.index) return 'distance';
    const byWords = titled[index];
    if (byWords !== undefined && byWords !== 'distance') return byWords;
    return isLikeDiameter(values, drawn) && index !== distance?.index ? 'diameter' : 'unused';
  });
}

/** Share of steps that must go the same way in a column of distances. */
const ONE_WAY = 0.8;

function runsOneWay(values: readonly number[]): boolean {
  const steps = values.slice(1).map((value, index) => value - (values[index] ?? value));
  const up = steps.filter((step) => step > 0).length;
  const down = steps.filter((step) => step < 0).length;
  return steps.length > 0 && Math.max(up, down) >= ONE_WAY * Math.max(1, up + down) && up + down > 0;
}

const isCount = (values: readonly number[]) =>
  values.every((value, index) => Number.isInteger(value) && value === (values[0] ?? 0) + index);

/** A measured bore is no more than so many times wider or narrower than the drawn one. */
const FARTHEST_RATIO = 3;

function isLikeDiameter(values: readonly number[], { diameterMm }: DrawnSize): boolean {
  const middle = median(values);
  if (middle === undefined || middle <= 0) return false;
  return [1, MM_PER_INCH].some(
    (factor) => Math.abs(Math.log((middle * factor) / diameterMm)) < Math.log(FARTHEST_RATIO),
  );
}

/** Without a word in the heading: the unit in which the diameters come nearer to the bore as drawn. */
function likeliestUnit({ values }: ColumnFigures, kind: ColumnKind, { diameterMm }: DrawnSize): ColumnUnit {
  const size = (median(values) ?? 0) * (kind === 'radius' ? 2 : 1);
  if (!(size > 0)) return 'mm';
  const apart = (factor: number) => Math.abs(Math.log((size * factor) / diameterMm));
  return apart(MM_PER_INCH) < apart(1) ? 'inch' : 'mm';
}
