import type { DesignDocument } from '#shared/document/design-document.ts';
import { fromFootMm } from '#shared/document/profile.ts';
import { printExactLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { formatCents } from '#shared/music/cents.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';

/** Reads a value of one document aloud: lengths from its own foot, holes by what stands over them. */
export interface Reader {
  document: DesignDocument;
  unit: LengthUnit;
}

type Keyed = Record<string, unknown>;

const isKeyed = (value: unknown): value is Keyed =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** A value of a design document as a maker reads it; `key` is the field it stands in. */
export function valueWords(value: unknown, key: string, reader: Reader): string {
  if (value === undefined) return 'not there';
  if (value === null) return key === 'chimneyMm' ? 'from the wall' : 'none';
  if (Array.isArray(value)) return listWords(value, key, reader);
  if (isKeyed(value)) return thingWords(value, reader);
  return plainWords(value, key, reader);
}

function plainWords(value: unknown, key: string, reader: Reader): string {
  if (typeof value === 'number') return numberWords(value, key, reader);
  if (typeof value === 'boolean') return value ? 'on' : 'off';
  const text = String(value);
  return text === '' ? 'empty' : text;
}

const UNITS: Record<string, string> = {
  temperatureC: ' °C',
  mouthTemperatureC: ' °C',
  a4Hz: ' Hz',
  angleDeg: '°',
  rampDeg: '°',
  lipAngleDeg: '°',
  pressurePa: ' Pa',
};

const SHARES = new Set(['relativeHumidity', 'co2Fraction', 'cover', 'lipCover', 'fraction']);

function numberWords(value: number, key: string, { document, unit }: Reader): string {
  const length = (mm: number) => `${printExactLength(mm, unit)} ${unit === 'mm' ? 'mm' : 'in'}`;
  if (key === 'positionMm') return `${length(fromFootMm(document, value))} from foot`;
  if (key.endsWith('Mm3')) return `${value} mm³`;
  if (key.endsWith('Mm')) return length(value);
  if (key === 'centsOffset') return `${formatCents(value)} cents`;
  if (SHARES.has(key)) return `${Number((value * 100).toFixed(2))} %`;
  return `${value}${UNITS[key] ?? ''}`.replace('-', '−');
}

function listWords(value: readonly unknown[], key: string, reader: Reader): string {
  if (value.length === 0) return 'none';
  if (key === 'stations') return value.map((station) => stationWords(station, reader)).join(', ');
  if (key === 'covered') return value.map((hole) => holeLabel(String(hole), reader)).join(' ');
  return value.map((entry) => valueWords(entry, '', reader)).join(', ');
}

function stationWords(station: unknown, reader: Reader): string {
  const { positionMm, diameterMm } = station as { positionMm: number; diameterMm: number };
  const printed = (mm: number) => printExactLength(mm, reader.unit);
  return `${printed(diameterMm)} at ${printed(fromFootMm(reader.document, positionMm))}`;
}

function holeLabel(id: string, { document }: Reader): string {
  return labelledHoles(document).find(({ hole }) => hole.id === id)?.label ?? id;
}

/** A whole hole, fingering, undercut or mouth end: enough to know it by. */
function thingWords({ note, register, hole, fraction, ...rest }: Keyed, reader: Reader): string {
  if (typeof note === 'string') return `${note}, register ${String(register)}`;
  if (typeof hole === 'string') {
    return `${holeLabel(hole, reader)} by ${numberWords(Number(fraction), 'fraction', reader)}`;
  }
  return Object.entries(rest)
    .filter(([key, entry]) => typeof entry === 'number' || key === 'kind')
    .map(([key, entry]) => valueWords(entry, key, reader))
    .join(', ');
}
