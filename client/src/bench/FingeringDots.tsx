import type { Fingering } from '#shared/document/design-document.ts';
import { FingeringCircle } from './FingeringCircle.tsx';
import { holeMark } from './fingering-marks.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';

interface FingeringDotsProps {
  fingering: Fingering;
  holes: readonly LabelledHole[];
  /** Room for the whole row, px; the circles shrink into it. */
  width: number;
}

const HAND_GAP = 0.35;

/** A whole fingering in small: circles in the order of the holes, a gap between the hands. Centred on 0, 0. */
export function FingeringDots({ fingering, holes, width }: FingeringDotsProps) {
  const places = placesOf(holes);
  const span = (places.at(-1) ?? 0) + 1;
  const step = Math.min(8.4, width / span);
  const start = (-(span - 1) / 2) * step;
  return (
    <>
      {holes.map(({ hole }, index) => (
        <FingeringCircle
          key={hole.id}
          x={start + (places[index] ?? 0) * step}
          y={0}
          radius={step * 0.39}
          mark={holeMark(fingering, hole)}
        />
      ))}
    </>
  );
}

function placesOf(holes: readonly LabelledHole[]): number[] {
  let place = -1;
  return holes.map(({ hole }, index) => {
    const before = holes[index - 1];
    place += before !== undefined && before.hole.hand !== hole.hand ? 1 + HAND_GAP : 1;
    return place;
  });
}
