import type { BenchGeometry } from '../../bench/bench-geometry.ts';

export interface CellPlace {
  key: string;
  width: number;
  /** Where the figure's middle stands within the cell, px. */
  middle: number;
  /** Middle between this column and the next, within the cell; null for the last. */
  between: number | null;
  /** From this column to the next, px. */
  gap: number | null;
}

export interface TablePlaces {
  /** Left edge of the row labels, px from the bench's left. */
  left: number;
  labelWidth: number;
  cells: CellPlace[];
  right: number;
}

/** Most that a row label may take, px. */
const LABEL_PX = 112;

/** Cells of a real table whose figures stand exactly under columns that are not evenly spaced. */
export function tablePlaces(geometry: BenchGeometry): TablePlaces {
  const { columns, measures } = geometry;
  const reach = measures.columnReach;
  const edges = columns.map((column, index) => {
    const before = columns[index - 1];
    return before === undefined ? column.x - reach : (before.x + column.x) / 2;
  });
  const right = Math.min(geometry.hangRight, (columns.at(-1)?.x ?? 0) + reach);
  const start = edges[0] ?? geometry.hangLeft;
  const labelWidth = Math.min(LABEL_PX, start);
  return {
    left: start - labelWidth,
    labelWidth,
    right,
    cells: columns.map((column, index) => {
      const from = edges[index] ?? column.x;
      const next = columns[index + 1];
      return {
        key: column.key,
        width: (edges[index + 1] ?? right) - from,
        middle: column.x - from,
        between: next === undefined ? null : (column.x + next.x) / 2 - from,
        gap: next === undefined ? null : next.x - column.x,
      };
    }),
  };
}
