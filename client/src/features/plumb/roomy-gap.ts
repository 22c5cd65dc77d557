import type { BenchGeometry } from '../../bench/bench-geometry.ts';

/** The first gap between two columns with so much room, px; null where there is none or rows have no room for a key. */
export function roomyGap({ columns, measures }: BenchGeometry, roomPx: number) {
  if (measures.rowStep === 0) return null;
  const gaps = columns.slice(1).map((column, index) => ({ left: columns[index]?.x ?? 0, right: column.x }));
  return gaps.find(({ left, right }) => right - left >= roomPx) ?? null;
}
