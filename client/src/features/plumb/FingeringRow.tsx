import type { Fingering } from '#shared/document/design-document.ts';
import type { BenchGeometry } from '../../bench/bench-geometry.ts';
import { FingeringCircle } from '../../bench/FingeringCircle.tsx';
import { holeMark } from '../../bench/fingering-marks.ts';
import type { LabelledHole } from '../../bench/hole-labels.ts';
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
  const from = hasCircles ? fingeringY + radius + 2 : 0;
  return columns.map(({ key, holeX, x }) => {
    const hole = holes.find((labelled) => labelled.hole.id === key)?.hole;
    const start = hole === undefined ? Math.max(from, beamY - 20) : from;
    return (
      <g key={key}>
        <path
          d={`M${holeX} ${start}V${beamY - 16}L${x} ${beamY - 3}V${beamY}`}
          className={classNames('bench-leader', key === chosenKey && 'is-chosen')}
        />
        {hole !== undefined && hasCircles && (
          <FingeringCircle x={holeX} y={fingeringY} radius={radius} mark={holeMark(fingering, hole)} />
        )}
      </g>
    );
  });
}
