import type { DesignDocument } from '../document/design-document.ts';
import { boreEnds, diameterAt } from '../document/profile.ts';
import { readReadings, type RowMessage, type TableReading } from './bore-readings.ts';
import { recogniseColumns, type ColumnCorrections, type MeasurementColumn } from './measurement-columns.ts';
import { readMeasurementTable, type MeasurementTable, type TableChoices } from './measurement-table.ts';

export const ENDS = ['mouth', 'foot'] as const;
/** The end that distances run from. */
export type MeasuredFrom = (typeof ENDS)[number];

/** How the table is to be understood, where the person says so; null and missing parts are recognised. */
export interface MeaningChoices extends TableChoices {
  columns: ColumnCorrections;
  from: MeasuredFrom | null;
  /** What the table calls the place of the mouth's acting edge, or of the foot where distances run from there, mm. */
  zeroMm: number | null;
}

/** How the table's distances lie on the instrument. */
export interface MeasuredPlace {
  from: MeasuredFrom;
  zeroMm: number;
  /** Neither the table nor the person said it. */
  isGuess: boolean;
}

/** One diameter on the instrument. */
export interface BoreReading extends TableReading {
  /** Row and column: what a reading is known by while limits change. */
  key: string;
  /** From the mouth's acting edge, as in the design. */
  positionMm: number;
}

export type MeasuredBore =
  | { status: 'refused'; message: string; table: MeasurementTable | null; columns: MeasurementColumn[] }
  | {
      status: 'read';
      table: MeasurementTable;
      columns: MeasurementColumn[];
      place: MeasuredPlace;
      /** In order of position. */
      readings: BoreReading[];
      faults: RowMessage[];
      doubts: RowMessage[];
    };

/** Reads a table of bore measurements against the bore as drawn. */
export function readMeasuredBore(
  text: string,
  drawn: Pick<DesignDocument, 'bore'>,
  choices: MeaningChoices,
): MeasuredBore {
  const reading = readMeasurementTable(text, choices);
  if (reading.status === 'refused')
    return { status: 'refused', message: reading.message, table: null, columns: [] };
  const { table } = reading;
  const columns = recogniseColumns(table, drawnSize(drawn), choices.columns);
  const missing = missingColumn(columns);
  if (missing !== null) return { status: 'refused', message: missing, table, columns };
  const { readings, faults, doubts } = readReadings(table, columns);
  if (readings.length === 0) {
    const message = `No row could be read. Row ${faults[0]?.row ?? 1}: ${faults[0]?.message ?? 'it is empty.'}`;
    return { status: 'refused', message, table, columns };
  }
  const place = placeOf(readings, { drawn, columns, choices });
  return { status: 'read', table, columns, place, readings: placed(readings, place, drawn), faults, doubts };
}

function drawnSize(drawn: Pick<DesignDocument, 'bore'>) {
  const { mouthMm, footMm } = boreEnds(drawn);
  return { diameterMm: diameterAt(drawn.bore.stations, (mouthMm + footMm) / 2) };
}

function missingColumn(columns: readonly MeasurementColumn[]): string | null {
  const distances = columns.filter(({ kind }) => kind === 'distance').length;
  if (distances === 0) return 'No column is known to hold distances. Choose the one that does.';
  if (distances > 1) return 'Two columns are said to hold distances. Keep one.';
  const hasDiameter = columns.some(({ kind }) => kind === 'diameter' || kind === 'radius');
  return hasDiameter ? null : 'No column is known to hold diameters. Choose those that do.';
}

interface PlaceSource {
  drawn: Pick<DesignDocument, 'bore'>;
  columns: readonly MeasurementColumn[];
  choices: MeaningChoices;
}

/** A measured end that overshoots the drawn one by less is a measuring error, mm. */
const OVERSHOOT_MM = 0.5;

/**
 * Distances run from the mouth end unless the heading names the foot. A table longer than the bore began at the
 * instrument's very end: its last reading is then taken to lie at the foot, which a person has to see and may correct.
 */
function placeOf(readings: readonly TableReading[], { drawn, columns, choices }: PlaceSource): MeasuredPlace {
  const title = columns.find(({ kind }) => kind === 'distance')?.title ?? '';
  const from = choices.from ?? (/\bfoot\b/i.test(title) ? 'foot' : 'mouth');
  if (choices.zeroMm !== null) return { from, zeroMm: choices.zeroMm, isGuess: false };
  if (from === 'foot') return { from, zeroMm: 0, isGuess: true };
  const beyondMm = Math.max(...readings.map(({ distanceMm }) => distanceMm)) - boreEnds(drawn).footMm;
  return { from, zeroMm: beyondMm > OVERSHOOT_MM ? Math.round(beyondMm * 1000) / 1000 : 0, isGuess: true };
}

function placed(
  readings: readonly TableReading[],
  { from, zeroMm }: MeasuredPlace,
  drawn: Pick<DesignDocument, 'bore'>,
): BoreReading[] {
  const { footMm } = boreEnds(drawn);
  const positionOf = (distanceMm: number) =>
    from === 'foot' ? footMm - (distanceMm - zeroMm) : distanceMm - zeroMm;
  return readings
    .map((reading) => ({
      ...reading,
      key: `${reading.row}:${reading.column}`,
      positionMm: positionOf(reading.distanceMm),
    }))
    .sort((a, b) => a.positionMm - b.positionMm);
}
