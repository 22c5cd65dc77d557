import { memo, type PointerEvent } from 'react';
import type { ToneHole } from '#shared/document/design-document.ts';
import { planHole } from '../../bench/body-paths.ts';
import type { BenchFrame } from '../../bench/bench-geometry.ts';
import type { BodyShape } from '../../bench/drawn-body.ts';

export interface HoleHandlers {
  onPointerDown: (event: PointerEvent<HTMLElement>) => void;
  onPointerMove: (event: PointerEvent<HTMLElement>) => void;
  onPointerUp: () => void;
  onPointerCancel: () => void;
}

interface HoleButtonProps {
  frame: BenchFrame;
  shape: BodyShape;
  hole: ToneHole;
  name: string;
  isChosen: boolean;
  canEdit: boolean;
  handlers: HoleHandlers;
  onChoose: (hole: string) => void;
}

/** Least side of a hole's button, px: a fingertip's worth. */
const LEAST_PX = 44;
/** Room outside the hole to take it by its edge, px. */
const EDGE_PX = 9;

/** The control behind a drawn hole: choose, drag, and by its keys move and widen. */
export const HoleButton = memo(function HoleButton(props: HoleButtonProps) {
  const { frame, shape, hole, name, isChosen, canEdit, handlers, onChoose } = props;
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
      onClick={() => onChoose(hole.id)}
      {...handlers}
      className="rounded-disc absolute top-0 left-0 touch-none select-none"
      style={{
        width: side,
        height: side,
        transform: `translate(${cx - side / 2}px, ${cy - side / 2}px)`,
        cursor: canEdit ? 'grab' : 'pointer',
      }}
    />
  );
});
