import { memo } from 'react';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { ruleTicks, type RuleTick } from './rule-ticks.ts';

interface SteelRuleProps {
  /** Where the zero stands, px; lengths count leftward from it. */
  zeroX: number;
  leftX: number;
  y: number;
  height: number;
  pxPerMm: number;
  unit: LengthUnit;
  /** Ticks outside are not drawn. */
  seen: readonly [number, number];
}

const REACH: Record<RuleTick['size'], number> = { small: 0.22, middle: 0.38, big: 0.52 };

/** A steel rule with its zero at the foot. */
export const SteelRule = memo(function SteelRule(props: SteelRuleProps) {
  const { zeroX, leftX, y, height, pxPerMm, unit, seen } = props;
  const ticks = ruleTicks((zeroX - leftX) / pxPerMm, pxPerMm, unit)
    .map((tick) => ({ ...tick, x: zeroX - tick.mm * pxPerMm }))
    .filter(({ x }) => x >= seen[0] && x <= seen[1]);
  const lines = (size: RuleTick['size']) =>
    ticks
      .filter((tick) => tick.size === size)
      .map(({ x }) => `M${x.toFixed(2)} ${y}v${(height * REACH[size]).toFixed(1)}`)
      .join('');
  return (
    <g>
      <rect x={leftX} y={y} width={zeroX - leftX} height={height} className="bench-rule" />
      <path d={lines('small') + lines('middle')} className="bench-tick" />
      <path d={lines('big')} className="bench-tick-big" />
      {ticks
        .filter(({ figure, x }) => figure !== null && x - leftX > 8)
        .map(({ x, figure, mm }) => (
          <text
            key={figure}
            x={mm === 0 ? x - 4 : x}
            y={y + height - 3.2}
            textAnchor={mm === 0 ? 'end' : 'middle'}
            className="bench-rule-figure"
          >
            {figure}
          </text>
        ))}
    </g>
  );
});
