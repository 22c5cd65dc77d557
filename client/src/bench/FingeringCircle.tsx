import type { HoleMark } from './fingering-marks.ts';

interface FingeringCircleProps {
  x: number;
  y: number;
  radius: number;
  mark: HoleMark;
}

/** One hole of a fingering: filled where a finger lies, left half filled where it lies by half. */
export function FingeringCircle({ x, y, radius, mark }: FingeringCircleProps) {
  return (
    <>
      <circle
        cx={x}
        cy={y}
        r={radius}
        className="bench-open-hole"
        strokeDasharray={mark === 'never' ? '2 2' : undefined}
        strokeWidth={radius < 5 ? 1 : 1.3}
      />
      {mark === 'covered' && <circle cx={x} cy={y} r={radius} className="bench-covered-hole" />}
      {mark === 'half' && (
        <path
          d={`M${x} ${y - radius}A${radius} ${radius} 0 0 0 ${x} ${y + radius}Z`}
          className="bench-covered-hole"
        />
      )}
    </>
  );
}
