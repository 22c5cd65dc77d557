import { memo } from 'react';
import { Bob } from '../../bench/Bob.tsx';
import type { NoteLane } from './note-lane.ts';

interface NoteLaneDrawingProps {
  lane: NoteLane;
  height: number;
  bandCents: number;
  register: number;
  cents: number | null;
}

/** One row of the scale: the band, the vertical, and the bob lying out on its thread. The figure beside it says the same. */
export const NoteLaneDrawing = memo(function NoteLaneDrawing(props: NoteLaneDrawingProps) {
  const { lane, height, bandCents, register, cents } = props;
  const [from, to] = [lane.x(-bandCents), lane.x(bandCents)];
  const middle = height / 2;
  return (
    <svg
      width="100%"
      height={height}
      className="pointer-events-none absolute inset-0 overflow-visible"
      aria-hidden="true"
    >
      <rect x={from} width={to - from} height={height} className="bench-band" />
      <line x1={from} x2={from} y2={height} className="bench-band-edge" />
      <line x1={to} x2={to} y2={height} className="bench-band-edge" />
      <line x1={lane.zeroX} x2={lane.zeroX} y2={height} className="bench-true" />
      {cents !== null && (
        <>
          <line
            x1={lane.zeroX}
            x2={lane.x(cents)}
            y1={middle}
            y2={middle}
            className={`bench-thread is-register${Math.min(register, 4)}`}
          />
          <g transform={`translate(${lane.x(cents)} ${middle})`}>
            <Bob register={register} scale={0.85} />
          </g>
          {Math.abs(cents) > lane.heldAtCents && (
            <path
              d={`M${lane.x(cents) + Math.sign(cents) * 9} ${middle - 4.5}l${Math.sign(cents) * 4.5} 4.5l${-Math.sign(cents) * 4.5} 4.5`}
              className={`bench-held is-register${Math.min(register, 4)}`}
            />
          )}
        </>
      )}
    </svg>
  );
});
