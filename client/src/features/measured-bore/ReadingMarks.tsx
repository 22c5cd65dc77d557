import { memo } from 'react';
import type { FittedBore, LoneReading } from '#shared/measured-bore/fit-stations.ts';
import type { BoreReading, MeasuredBore } from '#shared/measured-bore/read-measured-bore.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import type { WidthScale } from '../../bench/width-scale.ts';
import { heldY } from './measured-scale.ts';
import { printWidth } from './measured-words.ts';

interface MarksProps extends Pick<PanelProps, 'geometry'> {
  scale: WidthScale;
  fitted: FittedBore;
}

interface ReadingDotsProps extends MarksProps {
  measured: Extract<MeasuredBore, { status: 'read' }>;
}

/** More dots than this are drawn small. */
const MANY_READINGS = 400;

/** Every reading that counts; gauge directions differ by shape. */
export const ReadingDots = memo(function ReadingDots({
  geometry,
  scale,
  measured,
  fitted,
}: ReadingDotsProps) {
  const without = new Set([...fitted.leftOut, ...fitted.outside].map(({ key }) => key));
  const shapes = shapeOfColumn(measured.readings);
  const size = measured.readings.length > MANY_READINGS ? 1.6 : 2.3;
  return measured.readings
    .filter(({ key }) => !without.has(key))
    .map(({ key, column, positionMm, diameterMm }) => (
      <ReadingDot
        key={key}
        x={geometry.x(positionMm)}
        y={heldY(scale.y(diameterMm))}
        shape={shapes.get(column) ?? 0}
        size={size}
      />
    ));
});

/** Columns of diameters in the table's order: the first is a disc, the second a ring, further ones diamonds. */
export function shapeOfColumn(readings: readonly Pick<BoreReading, 'column'>[]): Map<number, number> {
  const columns = [...new Set(readings.map(({ column }) => column))].sort((a, b) => a - b);
  return new Map(columns.map((column, index) => [column, index]));
}

interface ReadingDotProps {
  x: number;
  y: number;
  shape: number;
  size: number;
}

export function ReadingDot({ x, y, shape, size }: ReadingDotProps) {
  if (shape === 0) return <circle cx={x} cy={y} r={size} className="measured-dot" />;
  if (shape === 1) return <circle cx={x} cy={y} r={size} className="measured-ring" />;
  const half = size * 1.3;
  return (
    <path
      d={`M${x} ${y - half}l${half} ${half}l${-half} ${half}l${-half} ${-half}Z`}
      className="measured-ring"
    />
  );
}

/** More figures than this would lie over each other; the words below name every one. */
const MOST_FIGURES = 12;
/** From a mark to the shelf's right edge where its figure still fits, px. */
const FIGURE_PX = 96;

/** Readings that stand alone, ringed and crossed where they were measured. */
export function LeftOutMarks({ geometry, scale, fitted, unit }: MarksProps & Pick<PanelProps, 'unit'>) {
  const { leftOut } = fitted;
  return leftOut.map((reading) => {
    const [x, y] = [geometry.x(reading.positionMm), heldY(scale.y(reading.diameterMm))];
    return (
      <g key={reading.key}>
        <LeftOutMark x={x} y={y} />
        {leftOut.length <= MOST_FIGURES && (
          <LeftOutFigure
            reading={reading}
            x={x}
            y={y}
            unit={unit}
            isLast={x > geometry.viewRight - FIGURE_PX}
          />
        )}
      </g>
    );
  });
}

export function LeftOutMark({ x, y }: { x: number; y: number }) {
  return (
    <>
      <circle cx={x} cy={y} r={7.5} className="measured-left-out" />
      <path d={`M${x - 3.2} ${y - 3.2}l6.4 6.4m0 -6.4l-6.4 6.4`} className="measured-cross" />
    </>
  );
}

interface LeftOutFigureProps extends Pick<PanelProps, 'unit'> {
  reading: LoneReading;
  x: number;
  y: number;
  isLast: boolean;
}

function LeftOutFigure({ reading, x, y, unit, isLast }: LeftOutFigureProps) {
  return (
    <text
      x={isLast ? x - 13 : x + 13}
      y={y + 4.5}
      textAnchor={isLast ? 'end' : 'start'}
      className="bench-label bench-label-strong bore-haloed"
    >
      {printWidth(reading.diameterMm, unit)}, left out
    </text>
  );
}
