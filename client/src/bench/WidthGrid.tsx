import { printLength } from '#shared/lengths/print-length.ts';
import type { PanelProps } from './panel-props.ts';
import './shelf.css';
import type { WidthScale } from './width-scale.ts';

interface WidthGridProps {
  scale: WidthScale;
  unit: PanelProps['unit'];
  from: number;
  to: number;
  /** Room for the figures at the left of the drawing. */
  isBeside: boolean;
}

/** Room that the figures take before the drawing, px; without it they stand at its right end. */
const FIGURES_PX = 56;

/** Lines across a shelf at round widths, with their figures. */
export function WidthGrid({ scale, unit, from, to, isBeside }: WidthGridProps) {
  const [first = 0, second = first + 1] = scale.ticks;
  const digits = unit === 'inch' ? 3 : second - first < 0.099 ? 2 : 1;
  return scale.ticks.map((mm) => (
    <g key={mm}>
      <line x1={from} x2={to} y1={scale.y(mm)} y2={scale.y(mm)} className="bore-grid" />
      <text
        x={isBeside ? 144 : from >= FIGURES_PX ? from - 8 : to - 12}
        y={scale.y(mm) + 4}
        textAnchor="end"
        className="bench-quiet-label bore-haloed"
      >
        {printLength(mm, unit, digits)}
      </text>
    </g>
  ));
}
