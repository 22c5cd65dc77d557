import { useRef, type KeyboardEvent, type PointerEvent } from 'react';
import type { Station } from '#shared/document/design-document.ts';

interface BoreKnotProps {
  station: Station;
  x: number;
  y: number;
  size: number;
  name: string;
  isChosen: boolean;
  readOnly: boolean;
  onChoose: () => void;
  onStep: (by: number) => void;
  onHold: (isHeld: boolean) => void;
  toStation: (x: number, y: number) => Station;
  /** One gesture is one step of Undo. */
  onMove: (to: Station, gesture: string) => void;
}

/** One press of a key, mm: along the pipe, and in width. With Shift five times as much. */
const STEP_ALONG_MM = 0.1;
const STEP_WIDE_MM = 0.01;
/** What a finger can hit, px. */
const GRIP = 22;

let gestures = 0;

/** A station as a square knot, because round things are holes. Dragged, or moved with Alt and the arrows. */
export function BoreKnot(props: BoreKnotProps) {
  const { station, x, y, size, isChosen, readOnly, onChoose, onMove } = props;
  const drag = useRef<{ gesture: string; dx: number; dy: number } | null>(null);

  const onPointerDown = (event: PointerEvent<SVGGElement>) => {
    onChoose();
    if (readOnly || event.button !== 0) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    const at = placeIn(event);
    gestures += 1;
    drag.current = { gesture: `drag${gestures}`, dx: x - at.x, dy: y - at.y };
    props.onHold(true);
  };
  const onPointerMove = (event: PointerEvent<SVGGElement>) => {
    if (drag.current === null) return;
    const at = placeIn(event);
    const to = props.toStation(at.x + drag.current.dx, at.y + drag.current.dy);
    onMove(
      { positionMm: snapped(to.positionMm, STEP_ALONG_MM), diameterMm: snapped(to.diameterMm, STEP_WIDE_MM) },
      drag.current.gesture,
    );
  };
  const letGo = () => {
    if (drag.current === null) return;
    drag.current = null;
    props.onHold(false);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const along = { ArrowLeft: -1, ArrowRight: 1 }[event.key] ?? 0;
    const wider = { ArrowUp: 1, ArrowDown: -1 }[event.key] ?? 0;
    if (along === 0 && wider === 0) return;
    event.preventDefault();
    event.stopPropagation();
    if (!event.altKey) {
      props.onStep(along === 0 ? -wider : along);
      return;
    }
    if (readOnly) return;
    const times = event.shiftKey ? 5 : 1;
    onMove(
      {
        positionMm: station.positionMm + along * STEP_ALONG_MM * times,
        diameterMm: station.diameterMm + wider * STEP_WIDE_MM * times,
      },
      'keys',
    );
  };
  return (
    <g
      role="button"
      tabIndex={isChosen || size > 5 ? 0 : -1}
      aria-label={props.name}
      aria-pressed={isChosen}
      onPointerDown={onPointerDown}
      onPointerMove={onPointerMove}
      onPointerUp={letGo}
      onPointerCancel={letGo}
      onKeyDown={onKeyDown}
      onFocus={onChoose}
      className="bore-grip"
    >
      <rect x={x - GRIP / 2} y={y - GRIP / 2} width={GRIP} height={GRIP} fill="transparent" />
      <rect
        x={x - size / 2}
        y={y - size / 2}
        width={size}
        height={size}
        rx={2}
        className={isChosen ? 'bore-knot is-chosen' : 'bore-knot'}
      />
    </g>
  );
}

const snapped = (mm: number, stepMm: number) => Math.round(mm / stepMm) * stepMm;

function placeIn(event: PointerEvent<SVGGElement>): { x: number; y: number } {
  const box = event.currentTarget.ownerSVGElement?.getBoundingClientRect();
  return { x: event.clientX - (box?.left ?? 0), y: event.clientY - (box?.top ?? 0) };
}
