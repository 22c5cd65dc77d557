import type { DesignDocument } from '#shared/document/design-document.ts';
import { boreEnds, diameterAt } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { classNames } from '../../ui/class-names.ts';

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
  const { columns, labelRight, hangRight, measures } = geometry;
  const holes = labelledHoles(document);
  const cell = Math.min(80, geometry.columnSpacing);
  const titleOf = (key: string) => holes.find(({ hole }) => hole.id === key)?.title ?? 'Foot';
  const placeOf = (key: string) =>
    document.holes.find(({ id }) => id === key)?.positionMm ?? boreEnds(document).footMm;
  return (
    <div role="table" aria-label="Bore and wall at the holes" className="relative mt-2">
      <div role="row" className="sr-only">
        <span role="columnheader">Size</span>
        {columns.map(({ key }) => (
          <span key={key} role="columnheader">
            {titleOf(key)}
          </span>
        ))}
      </div>
      {ROWS.map(({ label, digits, at }) => (
        <div key={label} role="row" className="relative" style={{ height: measures.rowHeight }}>
          <div
            aria-hidden="true"
            className="border-hair absolute top-0 border-t"
            style={{ left: Math.max(8, labelRight - 116), right: geometry.widthPx - hangRight }}
          />
          <div
            role="rowheader"
            className={classNames(
              'text-label text-ink2 absolute w-30 text-right',
              labelRight < 60 && 'sr-only',
            )}
            style={{ left: labelRight - 120, lineHeight: `${measures.rowHeight}px` }}
          >
            {label} <span className="text-small text-ink3">{unit === 'mm' ? 'mm' : 'in'}</span>
          </div>
          {columns.map(({ key, x }) => (
            <div
              key={key}
              role="cell"
              className={classNames('text-data absolute text-center', key === selection.hole && 'font-bold')}
              style={{ left: x - cell / 2, width: cell, lineHeight: `${measures.rowHeight}px` }}
            >
              {printLength(at(document, placeOf(key)), unit, unit === 'mm' ? digits : 3)}
            </div>
          ))}
        </div>
      ))}
    </div>
  );
}
