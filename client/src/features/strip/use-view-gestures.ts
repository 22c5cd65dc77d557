import { useEffect, useRef, type PointerEvent, type RefObject } from 'react';
import type { BenchFrame } from '../../bench/bench-geometry.ts';
import { panView, zoomView, type BenchView } from '../../bench/bench-view.ts';

interface GestureOptions {
  strip: RefObject<HTMLElement | null>;
  frame: BenchFrame;
  view: BenchView;
  onView: (view: BenchView) => void;
  /** A press and release on one spot, px from the strip's left edge. */
  onTap: (x: number) => void;
}

interface Press {
  x: number;
  startX: number;
}

const TAP_PX = 4;
/** Zoom of one notch of a usual wheel (100 px). */
const WHEEL_ZOOM = 1.0018;

/** Wheel and pinch zoom about the pointer; dragging the bare instrument pans. */
export function useViewGestures({ strip, frame, view, onView, onTap }: GestureOptions) {
  const presses = useRef(new Map<number, Press>());
  const hasMoved = useRef(false);
  const latest = useRef({ frame, view, onView });
  useEffect(() => {
    latest.current = { frame, view, onView };
  });

  useEffect(() => {
    const element = strip.current;
    if (element === null) return undefined;
    // React listens to the wheel passively, and then the page would scroll as well.
    const onWheel = (event: WheelEvent) => {
      const now = latest.current;
      const sideways = event.shiftKey ? event.deltaY : event.deltaX;
      const isPan = event.shiftKey || Math.abs(event.deltaX) > Math.abs(event.deltaY);
      if (isPan && now.view.kind === 'whole') return;
      event.preventDefault();
      if (isPan) {
        now.onView(panView(now.view, now.frame.body, sideways / now.frame.pxPerMm));
        return;
      }
      const about = now.frame.mm(event.clientX - element.getBoundingClientRect().left);
      now.onView(zoomView(now.view, now.frame.body, WHEEL_ZOOM ** -event.deltaY, about));
    };
    element.addEventListener('wheel', onWheel, { passive: false });
    return () => element.removeEventListener('wheel', onWheel);
  }, [strip]);

  const xOf = (event: PointerEvent) => event.clientX - (strip.current?.getBoundingClientRect().left ?? 0);

  const onPointerDown = (event: PointerEvent<SVGSVGElement>) => {
    if (event.button !== 0) return;
    if (presses.current.size === 0) hasMoved.current = false;
    event.currentTarget.setPointerCapture(event.pointerId);
    presses.current.set(event.pointerId, { x: xOf(event), startX: xOf(event) });
  };

  const onPointerMove = (event: PointerEvent<SVGSVGElement>) => {
    const press = presses.current.get(event.pointerId);
    if (press === undefined) return;
    const x = xOf(event);
    if (!hasMoved.current && Math.abs(x - press.startX) < TAP_PX) return;
    hasMoved.current = true;
    const other = [...presses.current].find(([id]) => id !== event.pointerId)?.[1];
    if (other === undefined) onView(panView(view, frame.body, (press.x - x) / frame.pxPerMm));
    else {
      const factor = Math.max(1, Math.abs(x - other.x)) / Math.max(1, Math.abs(press.x - other.x));
      onView(zoomView(view, frame.body, factor, frame.mm((x + other.x) / 2)));
    }
    press.x = x;
  };

  const onPointerUp = (event: PointerEvent<SVGSVGElement>) => {
    const press = presses.current.get(event.pointerId);
    presses.current.delete(event.pointerId);
    if (press !== undefined && !hasMoved.current) onTap(press.startX);
  };

  const onPointerCancel = (event: PointerEvent<SVGSVGElement>) => {
    presses.current.delete(event.pointerId);
  };

  return { onPointerDown, onPointerMove, onPointerUp, onPointerCancel };
}
