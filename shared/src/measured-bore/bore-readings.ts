import { readCell } from './measurement-cell.ts';
import type { MeasurementColumn } from './measurement-columns.ts';
import type { MeasurementRow, MeasurementTable } from './measurement-table.ts';

/** One diameter, measured once. */
export interface TableReading {
  row: number;
  column: number;
  /** As the table says, mm. */
  distanceMm: number;
  diameterMm: number;
}

export interface RowMessage {
  row: number;
  message: string;
}

export interface TableReadings {
  readings: TableReading[];
  /** What was left out, and why. */
  faults: RowMessage[];
  /** What was used, but looks like a slip of the pen. */
  doubts: RowMessage[];
}

/** Longest instrument and widest bore that a design may have, mm. */
const LONGEST_MM = 5000;
const WIDEST_MM = 500;

/** Every diameter of the table with its distance, and what is wrong, row by row. */
export function readReadings(table: MeasurementTable, columns: readonly MeasurementColumn[]): TableReadings {
  const distance = columns.find(({ kind }) => kind === 'distance');
  const diameters = columns.filter(({ kind }) => kind === 'diameter' || kind === 'radius');
  const found: TableReadings = { readings: [], faults: [], doubts: [] };
  if (distance === undefined || diameters.length === 0) return found;
  for (const row of table.rows) readRow({ row, distance, diameters, decimalMark: table.decimalMark }, found);
  found.doubts.push(...stepsBack(found.readings));
  return found;
}

interface RowRules {
  row: MeasurementRow;
  distance: MeasurementColumn;
  diameters: readonly MeasurementColumn[];
  decimalMark: MeasurementTable['decimalMark'];
}

function readRow({ row, distance, diameters, decimalMark }: RowRules, found: TableReadings): void {
  const fault = (message: string) => found.faults.push({ row: row.row, message });
  const cellOf = ({ index }: MeasurementColumn) => row.cells[index] ?? '';
  const filled = diameters.filter((column) => cellOf(column) !== '');
  if (cellOf(distance) === '') {
    fault(
      filled.length === 0
        ? 'Neither distance nor diameter. The row was left out.'
        : 'No distance. Give one, or clear the row.',
    );
    return;
  }
  const place = readCell(cellOf(distance), { unit: distance.unit, decimalMark });
  if (place.status === 'unreadable') {
    fault(`The distance ${place.message} The row was left out.`);
    return;
  }
  if (Math.abs(place.mm) > LONGEST_MM) {
    fault(`The distance ${cellOf(distance)} is longer than any instrument here. The row was left out.`);
    return;
  }
  if (filled.length === 0) fault('No diameter. Give one, or clear the row.');
  for (const column of filled) {
    const reading = readDiameter(cellOf(column), column, decimalMark);
    if (typeof reading === 'string') fault(`${nameOf(column)}: ${reading}`);
    else
      found.readings.push({
        row: row.row,
        column: column.index,
        distanceMm: place.mm,
        diameterMm: reading,
      });
  }
}

export const nameOf = ({ title, index }: Pick<MeasurementColumn, 'title' | 'index'>) =>
  title ?? `Column ${index + 1}`;

function readDiameter(
  cell: string,
  { unit, kind }: MeasurementColumn,
  decimalMark: MeasurementTable['decimalMark'],
): number | string {
  const reading = readCell(cell, { unit, decimalMark });
  if (reading.status === 'unreadable') return `${reading.message} It was left out.`;
  const mm = reading.mm * (kind === 'radius' ? 2 : 1);
  if (mm <= 0) return `${cell} is no diameter. It was left out.`;
  return mm > WIDEST_MM ? `${cell} is wider than any bore here. It was left out.` : mm;
}

/** Distances are put in order; one that goes against the others may be a slip. */
function stepsBack(readings: readonly TableReading[]): RowMessage[] {
  const places = readings.filter(({ row }, index) => readings[index - 1]?.row !== row);
  const steps = places.slice(1).map(({ distanceMm }, index) => distanceMm - (places[index]?.distanceMm ?? 0));
  const up = steps.filter((step) => step > 0).length;
  const down = steps.filter((step) => step < 0).length;
  // A table that goes there and back again was measured twice: nothing can be said of its order.
  if (Math.min(up, down) * 4 > Math.max(up, down)) return [];
  const wrongWay = up >= down ? -1 : 1;
  return steps.flatMap((step, index) => {
    const [before, place] = [places[index], places[index + 1]];
    if (Math.sign(step) !== wrongWay || before === undefined || place === undefined) return [];
    const message = `${printPlace(place.distanceMm)} comes after ${printPlace(before.distanceMm)}. It was put in order; see whether it is a slip.`;
    return [{ row: place.row, message }];
  });
}

const printPlace = (mm: number) => String(Math.round(mm * 1000) / 1000);
