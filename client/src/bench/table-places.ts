import type { BenchGeometry } from './bench-geometry.ts';

export interface CellPlace {
  key: string;
  /** Where the figure's middle stands, px from the bench's left edge. */
  middle: number;
  /** Room for the figure, px. */
  room: number;
  /** Middle between this column and the next; null for the last. */
  between: number | null;
  /** From this column to the next, px. */
  gap: number | null;
}

export interface TablePlaces {
  /** Edges of the row labels, and of the lines under the rows. */
  left: number;
  labelWidth: number;
  right: number;
  cells: CellPlace[];
}

/** Most that a row label may take, px. */
const LABEL_PX = 112;

/** Where the figures of the table stand: exactly under columns that are not evenly spaced. */
export function tablePlaces(geometry: BenchGeometry): TablePlaces {
  const { columns, measures } = geometry;
  const reach = measures.columnReach;
  const start = (columns[0]?.x ?? geometry.hangLeft + reach) - reach;
  const labelWidth = Math.min(LABEL_PX, start);
  return {
    left: start - labelWidth,
    labelWidth,
    right: Math.min(geometry.hangRight, (columns.at(-1)?.x ?? 0) + reach),
    cells: columns.map((column, index) => {
      const next = columns[index + 1];
      return {
        key: column.key,
        middle: column.x,
        room: geometry.columnSpacing,
        between: next === undefined ? null : (column.x + next.x) / 2,
        gap: next === undefined ? null : next.x - column.x,
      };
    }),
  };
}
