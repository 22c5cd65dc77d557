import { memo } from 'react';
import { classNames } from '../ui/class-names.ts';

interface BobProps {
  register: number;
  /** 1 on the chart; 0.85 in legends. */
  scale?: number;
  /** Cross and half fingerings hang smaller. */
  small?: boolean;
  /** Outline only: what is no longer, or not yet, worked out. */
  hollow?: boolean;
}

/** A register's bob: disc, ring, diamond; higher registers a hollow diamond. Shape says it as well as hue. */
export const Bob = memo(function Bob({ register, scale = 1, small = false, hollow = false }: BobProps) {
  const size = scale * (small ? 0.64 : 1);
  const look = hollow && 'bench-bob-hollow';
  if (register === 1) return <circle r={7.8 * size} className={classNames('bench-bob1', look)} />;
  if (register === 2)
    return <circle r={6.3 * size} className={classNames('bench-bob2', look)} strokeWidth={2.8 * size} />;
  const half = 6.7 * size;
  return (
    <path
      d={`M0 ${-half}L${half} 0L0 ${half}L${-half} 0Z`}
      className={classNames(register === 3 ? 'bench-bob3' : 'bench-bob4', look)}
    />
  );
});

/** A bob in a line of text. */
export function BobMark({ register, small = false }: { register: number; small?: boolean }) {
  return (
    <svg
      width="17"
      height="17"
      viewBox="-8.5 -8.5 17 17"
      aria-hidden="true"
      className="inline-block shrink-0"
    >
      <Bob register={register} scale={0.85} small={small} />
    </svg>
  );
}
