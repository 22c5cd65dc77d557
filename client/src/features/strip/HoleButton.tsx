import type { PointerEvent } from 'react';
import { planHole } from '../../bench/body-paths.ts';
import type { BenchFrame } from '../../bench/bench-geometry.ts';
import type { BodyShape } from '../../bench/drawn-body.ts';
import type { LabelledHole } from '../../bench/hole-labels.ts';

interface HoleButtonProps {
  frame: BenchFrame;
  shape: BodyShape;
  labelled: LabelledHole;
  name: string;
  isChosen: boolean;
  canEdit: boolean;
  drag: {
    onPointerDown: (event: PointerEvent<HTMLElement>, labelled: LabelledHole) => void;
    onPointerMove: (event: PointerEvent<HTMLElement>) => void;
    onPointerUp: () => void;
    onPointerCancel: () => void;
  };
  onChoose: () => void;
}

/** Least side of a hole's button, px: a fingertip's worth. */
const LEAST_PX = 44;
/** Room outside the hole to take it by its edge, px. */
const EDGE_PX = 9;

/** The control behind a drawn hole: choose, drag, and by its keys move and widen. */
export function HoleButton({
  frame,
  shape,
  labelled,
  name,
  isChosen,
  canEdit,
  drag,
  onChoose,
}: HoleButtonProps) {
  const { hole } = labelled;
  const { cx, cy, rx } = planHole(shape, hole, {
    x: frame.x,
    across: frame.acrossPxPerMm,
    axisY: frame.measures.planY,
  });
  const side = Math.max(LEAST_PX, 2 * (rx + EDGE_PX));
  return (
    <button
      type="button"
      aria-label={name}
      aria-pressed={isChosen}
      data-hole={hole.id}
      onClick={onChoose}
      onPointerDown={(event) => drag.onPointerDown(event, labelled)}
      onPointerMove={drag.onPointerMove}
      onPointerUp={drag.onPointerUp}
      onPointerCancel={drag.onPointerCancel}
      className="rounded-disc absolute top-0 left-0 touch-none select-none"
      style={{
        width: side,
        height: side,
        transform: `translate(${cx - side / 2}px, ${cy - side / 2}px)`,
        cursor: canEdit ? 'grab' : 'pointer',
      }}
    />
  );
}
