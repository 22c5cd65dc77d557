import { memo } from 'react';
import type { ToneHole } from '#shared/document/design-document.ts';
import { chimneyPaths, planHole, type ChimneyPaths, type Place } from '../../bench/body-paths.ts';
import type { BenchFrame } from '../../bench/bench-geometry.ts';
import type { BodyShape } from '../../bench/drawn-body.ts';
import { classNames } from '../../ui/class-names.ts';

interface HoleDrawingProps {
  frame: BenchFrame;
  shape: BodyShape;
  hole: ToneHole;
  label: string;
  isChosen: boolean;
}

/** One hole in plan and section, its number above and its line dropped to the rule. */
export const HoleDrawing = memo(function HoleDrawing({
  frame,
  shape,
  hole,
  label,
  isChosen,
}: HoleDrawingProps) {
  const { measures } = frame;
  const plan: Place = { x: frame.x, across: frame.acrossPxPerMm, axisY: measures.planY };
  const { behind, ...ellipse } = planHole(shape, hole, plan);
  const chimney = measures.hasSection
    ? chimneyPaths(shape, hole, { ...plan, axisY: measures.sectionY })
    : null;
  const chosen = isChosen && 'is-chosen';
  return (
    <g>
      {chimney !== null && <Chimney {...chimney} />}
      {behind ? (
        <ellipse {...ellipse} className="bench-hole-behind" />
      ) : (
        <>
          <ellipse {...ellipse} rx={ellipse.rx + 1.2} ry={ellipse.ry + 1.2} className="bench-eased" />
          <ellipse {...ellipse} className="bench-hole" />
        </>
      )}
      {isChosen && (
        <ellipse {...ellipse} rx={ellipse.rx + 5} ry={ellipse.ry + 5} className="bench-chosen-ring" />
      )}
      <line
        x1={ellipse.cx}
        x2={ellipse.cx}
        y1={ellipse.cy + ellipse.ry + (isChosen ? 6 : 2)}
        y2={measures.ruleY}
        className={classNames('bench-drop', chosen)}
      />
      <text x={ellipse.cx} y={17} textAnchor="middle" className={classNames('bench-hole-label', chosen)}>
        {label}
      </text>
    </g>
  );
});

function Chimney({ collar, opening, sides }: ChimneyPaths) {
  return (
    <>
      {collar !== null && <path d={collar} className="bench-hatch" />}
      <path d={opening} className="bench-air" />
      <path d={sides} className="bench-edge" />
    </>
  );
}
