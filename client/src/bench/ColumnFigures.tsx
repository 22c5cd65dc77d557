import { classNames } from '../ui/class-names.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';
import type { PanelProps } from './panel-props.ts';

export interface FigureRow {
  label: string;
  unit: string;
  /** What stands in the column of a hole, or of `foot`. */
  figure: (column: string) => string;
  look?: 'strong' | 'quiet';
}

interface ColumnFiguresProps extends Pick<PanelProps, 'geometry' | 'selection'> {
  label: string;
  holes: readonly LabelledHole[];
  rows: readonly FigureRow[];
}

/** Room for a label over its figures where there is none at their left, px. */
const LABEL_OVER_PX = 18;
/** Less room than this at the left, and the label stands over its figures, px. */
const LABEL_BESIDE_PX = 60;

/** Figures that are worked out, each under its hole. */
export function ColumnFigures({ label, geometry, selection, holes, rows }: ColumnFiguresProps) {
  const { columns, labelRight, hangRight, measures } = geometry;
  const cell = Math.min(80, geometry.columnSpacing);
  const titleOf = (key: string) => holes.find(({ hole }) => hole.id === key)?.title ?? 'Foot';
  const isOver = labelRight < LABEL_BESIDE_PX;
  const top = isOver ? LABEL_OVER_PX : 0;
  return (
    <div role="table" aria-label={label} className="relative mt-2">
      <div role="row" className="sr-only">
        <span role="columnheader">Size</span>
        {columns.map(({ key }) => (
          <span key={key} role="columnheader">
            {titleOf(key)}
          </span>
        ))}
      </div>
      {rows.map((row) => (
        <div key={row.label} role="row" className="relative" style={{ height: measures.rowHeight + top }}>
          <div
            aria-hidden="true"
            className="border-hair absolute top-0 border-t"
            style={{ left: Math.max(8, labelRight - 116), right: geometry.widthPx - hangRight }}
          />
          <div
            role="rowheader"
            className={classNames(
              'text-label text-ink2 absolute whitespace-nowrap',
              isOver ? 'pt-0.5' : 'w-30 text-right',
            )}
            style={isOver ? { left: 8 } : { left: labelRight - 120, lineHeight: `${measures.rowHeight}px` }}
          >
            {row.label} <span className="text-small text-ink3">{row.unit}</span>
          </div>
          {columns.map(({ key, x }) => (
            <div
              key={key}
              role="cell"
              className={classNames(
                'text-data absolute text-center',
                (key === selection.hole || row.look === 'strong') && 'font-bold',
                row.look === 'quiet' && 'text-ink3',
              )}
              style={{ left: x - cell / 2, top, width: cell, lineHeight: `${measures.rowHeight}px` }}
            >
              {row.figure(key)}
            </div>
          ))}
        </div>
      ))}
    </div>
  );
}
