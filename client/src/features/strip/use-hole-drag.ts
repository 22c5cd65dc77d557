import { titleInSentence } from '#shared/document/title-in-sentence.ts';
import { useMemo, useRef, type PointerEvent } from 'react';
import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import { woodBetweenMm } from '#shared/document/hole-faults.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import type { BenchFrame } from '../../bench/bench-geometry.ts';
import { snapToDrill } from '../../bench/drill-choice.ts';
import { changeHole, snapPosition, widestHoleMm } from '../../bench/hole-edits.ts';
import { type LabelledHole } from '#shared/document/hole-labels.ts';
import type { DesignEdit } from '../../bench/panel-props.ts';
import { useStable } from '../../bench/use-stable.ts';
import type { HoleHandlers } from './HoleButton.tsx';

interface HoleDragOptions {
  document: DesignDocument;
  holes: readonly LabelledHole[];
  frame: BenchFrame;
  unit: LengthUnit;
  canEdit: boolean;
  onEdit: (edit: DesignEdit) => void;
  onChoose: (hole: string) => void;
  onDragging: (isDragging: boolean) => void;
}

interface Drag {
  hole: ToneHole;
  title: string;
  mode: 'move' | 'size';
  /** Where the pointer went down, and how far from the hole's centre. */
  startX: number;
  startY: number;
  offsetX: number;
  startReach: number;
  mergeKey: string;
  isMoving: boolean;
}

/** Further than this and it was no click, px. */
const CLICK_PX = 3;

let dragCount = 0;

/** Drags a hole along the instrument, or by its edge for its diameter. One drag is one undo step. */
export function useHoleDrag(options: HoleDragOptions): HoleHandlers {
  const drag = useRef<Drag | null>(null);

  const onPointerDown = useStable((event: PointerEvent<HTMLElement>) => {
    const at = placeInStrip(event);
    const nearest = nearestHole(options, at.x);
    if (event.button !== 0 || nearest === undefined) return;
    const { hole, title } = nearest;
    options.onChoose(hole.id);
    if (!options.canEdit) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    const centreX = options.frame.x(hole.positionMm);
    const reach = Math.hypot(at.x - centreX, at.y - options.frame.measures.planY);
    dragCount += 1;
    drag.current = {
      hole,
      title,
      mode: grabsEdge(reach, hole, options.frame, event.pointerType) ? 'size' : 'move',
      startX: at.x,
      startY: at.y,
      offsetX: at.x - centreX,
      startReach: reach,
      mergeKey: `drag-${dragCount}`,
      isMoving: false,
    };
  });

  const onPointerMove = useStable((event: PointerEvent<HTMLElement>) => {
    const current = drag.current;
    if (current === null) return;
    const at = placeInStrip(event);
    if (!current.isMoving) {
      if (Math.hypot(at.x - current.startX, at.y - current.startY) < CLICK_PX) return;
      current.isMoving = true;
      options.onDragging(true);
    }
    const edit = current.mode === 'move' ? moved(current, at.x, options) : resized(current, at, options);
    if (edit !== null) options.onEdit(edit);
  });

  const onPointerUp = useStable(() => {
    if (drag.current?.isMoving === true) options.onDragging(false);
    drag.current = null;
  });

  return useMemo(
    () => ({ onPointerDown, onPointerMove, onPointerUp, onPointerCancel: onPointerUp }),
    [onPointerDown, onPointerMove, onPointerUp],
  );
}

interface StripPoint {
  x: number;
  y: number;
}

/** Buttons lie directly in the strip, so their parent is what positions count from. */
function placeInStrip(event: PointerEvent<HTMLElement>): StripPoint {
  const box = event.currentTarget.parentElement?.getBoundingClientRect();
  return { x: event.clientX - (box?.left ?? 0), y: event.clientY - (box?.top ?? 0) };
}

/** Targets of near holes overlap: the one whose centre is nearest is meant. */
function nearestHole({ holes, frame }: HoleDragOptions, x: number): LabelledHole | undefined {
  return holes.reduce<LabelledHole | undefined>((best, labelled) => {
    const distance = Math.abs(frame.x(labelled.hole.positionMm) - x);
    return best === undefined || distance < Math.abs(frame.x(best.hole.positionMm) - x) ? labelled : best;
  }, undefined);
}

function grabsEdge(reach: number, hole: ToneHole, frame: BenchFrame, pointerType: string): boolean {
  const radius = (hole.diameterMm * frame.pxPerMm) / 2;
  // A fingertip hides the edge: its grip for the diameter lies outside the hole.
  return pointerType === 'touch' ? reach > Math.max(20, radius + 6) : reach > Math.max(6, radius * 0.75);
}

/** A drag stops where two holes would run into each other, and goes on beyond. */
function runsIntoAnother(document: DesignDocument, hole: ToneHole): boolean {
  return document.holes.some((other) => other.id !== hole.id && woodBetweenMm(document, hole, other) <= 0);
}

function moved(drag: Drag, x: number, { document, frame }: HoleDragOptions): DesignEdit | null {
  const positionMm = snapPosition(document, frame.mm(x - drag.offsetX));
  const present = document.holes.find((hole) => hole.id === drag.hole.id);
  if (present === undefined || present.positionMm === positionMm) return null;
  if (runsIntoAnother(document, { ...present, positionMm })) return null;
  return {
    label: `Move ${titleInSentence(drag.title)}`,
    change: (before) => changeHole(before, drag.hole.id, { positionMm }),
    mergeKey: drag.mergeKey,
  };
}

function resized(drag: Drag, at: StripPoint, { document, frame, unit }: HoleDragOptions): DesignEdit | null {
  const present = document.holes.find((hole) => hole.id === drag.hole.id);
  if (present === undefined) return null;
  const reach = Math.hypot(at.x - frame.x(present.positionMm), at.y - frame.measures.planY);
  const wanted = drag.hole.diameterMm + (2 * (reach - drag.startReach)) / frame.pxPerMm;
  const diameterMm = snapToDrill(Math.max(0.5, wanted), unit, widestHoleMm(document, present.positionMm));
  if (present.diameterMm === diameterMm) return null;
  if (diameterMm > present.diameterMm && runsIntoAnother(document, { ...present, diameterMm })) return null;
  return {
    label: `Drill size of ${titleInSentence(drag.title)}`,
    change: (before) => changeHole(before, drag.hole.id, { diameterMm }),
    mergeKey: drag.mergeKey,
  };
}
