import type { LabelledHole } from '#shared/document/hole-labels.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import type { BenchColumn, BenchFrame } from '../../bench/bench-geometry.ts';
import type { BodyShape } from '../../bench/drawn-body.ts';
import { BodyDrawing } from './BodyDrawing.tsx';
import { HoleDrawing } from './HoleDrawing.tsx';

interface DrawnInstrumentProps {
  frame: BenchFrame;
  shape: BodyShape;
  holes: readonly LabelledHole[];
  unit: LengthUnit;
  /** Column of the chosen hole, which lights. */
  chosen?: BenchColumn | undefined;
}

/** Body, rule and holes to scale, cut off where the view ends: what every strip draws first. */
export function DrawnInstrument({ frame, shape, holes, unit, chosen }: DrawnInstrumentProps) {
  const { measures, viewLeft, viewRight } = frame;
  return (
    <>
      <clipPath id="bench-view">
        <rect x={viewLeft} width={viewRight - viewLeft + 2} height="400" />
      </clipPath>
      {chosen !== undefined && (
        <rect
          x={chosen.holeX - measures.columnReach + 3}
          width={measures.columnReach * 2 - 6}
          height={measures.stripHeight}
          className="bench-column"
        />
      )}
      <BodyDrawing frame={frame} shape={shape} unit={unit} />
      <g clipPath="url(#bench-view)">
        {holes.map(({ hole, label }) => (
          <HoleDrawing
            key={hole.id}
            frame={frame}
            shape={shape}
            hole={hole}
            label={label}
            isChosen={hole.id === chosen?.key}
          />
        ))}
      </g>
    </>
  );
}
