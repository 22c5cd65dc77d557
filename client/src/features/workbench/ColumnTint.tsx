import { columnOf, type BenchGeometry } from '../../bench/bench-geometry.ts';
import { leaderLanes } from '../../bench/leader-lanes.ts';

interface ColumnTintProps {
  geometry: BenchGeometry;
  chosen: string | null;
}

/** The chosen column lit from the strip down to the last row of its table. */
export function ColumnTint({ geometry, chosen }: ColumnTintProps) {
  const column = columnOf(geometry, chosen);
  if (column === undefined) return null;
  const half = geometry.measures.columnReach - 3;
  const { beamY } = geometry.measures;
  const lanes = leaderLanes(geometry.columns, geometry.lanesLeft);
  const isInLane = lanes[geometry.columns.indexOf(column)] !== null;
  const { x } = column;
  // Where the leader runs along the strip, the column is lit by itself.
  const holeX = isInLane ? x : column.holeX;
  const bend = Math.max(0, beamY - 20);
  return (
    <svg
      width={geometry.widthPx}
      height="100%"
      aria-hidden="true"
      className="pointer-events-none absolute inset-0 h-full"
    >
      <path
        d={`M${holeX - half} 0H${holeX + half}V${bend}L${x + half} ${beamY}H${x - half}L${holeX - half} ${bend}Z`}
        className="bench-column"
      />
      <svg y={beamY} height="100%" overflow="hidden">
        <rect x={x - half} width={2 * half} height="100%" className="bench-column" />
      </svg>
    </svg>
  );
}
