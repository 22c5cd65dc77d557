import type { DesignDocument } from '#shared/document/design-document.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import { boreEnds, diameterAt } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import { ColumnFigures } from '../../bench/ColumnFigures.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';

interface Row {
  label: string;
  digits: number;
  at: (document: DesignDocument, positionMm: number) => number;
}

const boreAt = (document: DesignDocument, mm: number) => diameterAt(document.bore.stations, mm);

const ROWS: readonly Row[] = [
  { label: 'From foot', digits: 1, at: (document, mm) => boreEnds(document).footMm - mm },
  { label: 'Bore there', digits: 2, at: boreAt },
  {
    label: 'Wall there',
    digits: 2,
    at: (document, mm) => (diameterAt(document.outside.stations, mm) - boreAt(document, mm)) / 2,
  },
];

/** Bore and wall at every hole, each figure under its hole. */
export function BoreTable({ document, geometry, unit, selection }: PanelProps) {
  const placeOf = (key: string) =>
    document.holes.find(({ id }) => id === key)?.positionMm ?? boreEnds(document).footMm;
  const rows = ROWS.map(({ label, digits, at }) => ({
    label,
    unit: unit === 'mm' ? 'mm' : 'in',
    figure: (key: string) => printLength(at(document, placeOf(key)), unit, unit === 'mm' ? digits : 3),
  }));
  return (
    <ColumnFigures
      label="Bore and wall at the holes"
      geometry={geometry}
      selection={selection}
      holes={labelledHoles(document)}
      rows={rows}
    />
  );
}
