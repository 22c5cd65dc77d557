import { useId } from 'react';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { ruleTicks, type RuleTick } from '../../bench/rule-ticks.ts';
import '../../bench/bench.css';
import type { RackScale } from './rack-scale.ts';

const HEIGHT = 24;
const TICK_LENGTH: Record<RuleTick['size'], number> = { small: 4.5, middle: 7.5, big: 12 };

/** The steel rule at the head of a rack, zero at the feet. */
export function RackRule({ scale, unit }: { scale: RackScale; unit: LengthUnit }) {
  const steel = useId();
  const { widthPx, pxPerMm } = scale;
  const zero = widthPx - 6;
  const ticks = ruleTicks((zero - 1) / pxPerMm, pxPerMm, unit);
  return (
    <svg
      width={widthPx}
      height={HEIGHT + 2}
      viewBox={`0 -1 ${widthPx} ${HEIGHT + 2}`}
      aria-hidden="true"
      className="block"
    >
      <defs>
        <linearGradient id={steel} x1="0" y1="0" x2="0" y2="1">
          <stop offset="0" stopColor="var(--s1)" />
          <stop offset="0.5" stopColor="var(--s2)" />
          <stop offset="1" stopColor="var(--s3)" />
        </linearGradient>
      </defs>
      <rect x="0.5" width={zero - 0.5} height={HEIGHT} fill={`url(#${steel})`} stroke="var(--steel-edge)" />
      {ticks.map((tick) => {
        const at = zero - tick.mm * pxPerMm;
        return (
          <g key={tick.mm}>
            <line
              x1={at}
              x2={at}
              y2={TICK_LENGTH[tick.size]}
              className={tick.size === 'big' ? 'bench-tick-big' : 'bench-tick'}
            />
            {tick.figure !== null && at > 14 && (
              <text
                x={tick.mm === 0 ? at - 4 : at}
                y="21"
                textAnchor={tick.mm === 0 ? 'end' : 'middle'}
                className="bench-rule-figure"
              >
                {tick.figure}
              </text>
            )}
          </g>
        );
      })}
    </svg>
  );
}
