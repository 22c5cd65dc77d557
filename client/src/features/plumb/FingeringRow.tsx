import type { Fingering } from '#shared/document/design-document.ts';
import type { BenchColumn, BenchGeometry } from '../../bench/bench-geometry.ts';
import { FingeringCircle } from '../../bench/FingeringCircle.tsx';
import { holeMark } from '../../bench/fingering-marks.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';
import { leaderLanes } from '../../bench/leader-lanes.ts';
import { classNames } from '../../ui/class-names.ts';

interface FingeringRowProps {
  geometry: BenchGeometry;
  holes: readonly LabelledHole[];
  fingering: Fingering | null;
  chosenKey: string | null;
}

/** The chosen note's fingering, every circle under its own hole, and the leaders from hole to column. */
export function FingeringRow({ geometry, holes, fingering, chosenKey }: FingeringRowProps) {
  const { columns, measures } = geometry;
  const { fingeringY, beamY } = measures;
  const hasCircles = fingering !== null && beamY > 40;
  const radius = measures.spacing > 75 ? 10 : 9;
  const lanes = leaderLanes(columns, geometry.lanesLeft);
  // Where some leaders run along the strip, all circles stand over their columns, or they would run together.
  const isOverColumns = lanes.some((lane) => lane !== null);
  return columns.map((column, index) => {
    const { key } = column;
    const lane = lanes[index] ?? null;
    const hole = holes.find((labelled) => labelled.hole.id === key)?.hole;
    const hasCircle = hasCircles && hole !== undefined;
    const start = hole === undefined ? Math.max(0, beamY - 20) : hasCircle ? fingeringY + radius + 2 : 0;
    return (
      <g key={key}>
        <path
          d={
            isOverColumns
              ? overColumn(column, lane, { start, beamY, hasCircle })
              : slanted(column, start, beamY)
          }
          className={classNames('bench-leader', key === chosenKey && 'is-chosen')}
        />
        {hasCircle && (
          <FingeringCircle
            x={isOverColumns ? column.x : column.holeX}
            y={fingeringY}
            radius={radius}
            mark={holeMark(fingering, hole)}
          />
        )}
      </g>
    );
  });
}

const slanted = ({ holeX, x }: BenchColumn, start: number, beamY: number) =>
  `M${holeX} ${start}V${beamY - 16}L${x} ${beamY - 3}V${beamY}`;

interface LaneEnds {
  start: number;
  beamY: number;
  hasCircle: boolean;
}

/** Along the strip, or slanting at once, to the column, then down; a circle on the way is left out. */
function overColumn(
  { holeX, x }: BenchColumn,
  lane: number | null,
  { start, beamY, hasCircle }: LaneEnds,
): string {
  const across = lane === null ? `M${holeX} 0L${x} 11` : `M${holeX} 0V${lane}H${x}`;
  return hasCircle ? `${across}M${x} ${start}V${beamY}` : `${across}V${beamY}`;
}
