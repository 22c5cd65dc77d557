import { useRef, type PointerEvent } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { BenchFrame } from '../../bench/bench-geometry.ts';
import type { BenchView } from '../../bench/bench-view.ts';
import { drawnBody } from '../../bench/drawn-body.ts';
import type { DesignEdit } from '../../bench/panel-props.ts';

/** Ends drop on a tenth, as holes do. */
const STEP_MM = 0.1;
/** Further than this and it was no click, px. */
const CLICK_PX = 3;

export interface EndDragOptions {
  document: DesignDocument;
  frame: BenchFrame;
  desk: { view: BenchView; setView: (view: BenchView) => void };
  canEdit: boolean;
  label: string;
  /** The document as it was when the drag began, with the end so far toward the foot. */
  moved: (start: DesignDocument, byMm: number) => DesignDocument;
  /** Positions count from this end: as it moves, all the others are counted anew. */
  isOrigin: boolean;
  onEdit: (edit: DesignEdit) => void;
  onDragging: (isDragging: boolean) => void;
}

interface Drag {
  start: DesignDocument;
  startX: number;
  frame: BenchFrame;
  view: BenchView;
  mergeKey: string;
  isMoving: boolean;
}

let dragCount = 0;

/** Drags one end of the column along the instrument, which lies still meanwhile; one drag is one undo step. */
export function useEndDrag(options: EndDragOptions) {
  const drag = useRef<Drag | null>(null);
  const onPointerDown = (event: PointerEvent<HTMLElement>) => {
    if (event.button !== 0 || !options.canEdit) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    dragCount += 1;
    const { document: start, frame, desk } = options;
    const mergeKey = `end-${dragCount}`;
    drag.current = { start, startX: event.clientX, frame, view: desk.view, mergeKey, isMoving: false };
  };
  const onPointerMove = (event: PointerEvent<HTMLElement>) => {
    const current = drag.current;
    if (current === null) return;
    const alongPx = event.clientX - current.startX;
    if (!current.isMoving) {
      if (Math.abs(alongPx) < CLICK_PX) return;
      current.isMoving = true;
      options.onDragging(true);
    }
    const byMm = Math.round(alongPx / current.frame.pxPerMm / STEP_MM) * STEP_MM;
    const after = options.moved(current.start, byMm);
    options.desk.setView(heldView(current.frame, after, options.isOrigin ? byMm : 0));
    options.onEdit({ label: options.label, change: () => after, mergeKey: current.mergeKey });
  };
  const onPointerUp = () => {
    if (drag.current?.isMoving === true) {
      options.desk.setView(drag.current.view);
      options.onDragging(false);
    }
    drag.current = null;
  };
  return {
    onPointerDown,
    onPointerMove,
    onPointerUp,
    onPointerCancel: onPointerUp,
    onLostPointerCapture: onPointerUp,
  };
}

/** What was in view when the drag began, wider where an end has been pulled out of it. */
function heldView(frame: BenchFrame, after: DesignDocument, originMovedMm: number): BenchView {
  const fromMm = frame.mm(frame.viewLeft) - originMovedMm;
  const toMm = frame.mm(frame.viewRight) - originMovedMm;
  const { headMm, footMm } = drawnBody(after);
  const pulled = { head: headMm < frame.body.headMm - originMovedMm, foot: footMm > toMm };
  return {
    kind: 'stretch',
    fromMm: pulled.head ? Math.min(fromMm, headMm) : fromMm,
    toMm: pulled.foot ? footMm : toMm,
  };
}
