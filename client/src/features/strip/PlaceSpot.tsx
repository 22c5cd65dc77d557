import { useEffect, useRef, type KeyboardEvent } from 'react';
import type { BenchFrame } from '../../bench/bench-geometry.ts';
import { Button } from '../../ui/Button.tsx';

interface PlaceSpotProps {
  frame: BenchFrame;
  positionMm: number;
  /** How far from the foot that is, as it would be written. */
  figure: string;
  takesFocus: boolean;
  onPlace: () => void;
  onMove: (byMm: number) => void;
  onLeave: () => void;
}

/** The offer to place a hole where the instrument was touched. Arrows move the spot, Escape takes the offer back. */
export function PlaceSpot({
  frame,
  positionMm,
  figure,
  takesFocus,
  onPlace,
  onMove,
  onLeave,
}: PlaceSpotProps) {
  const button = useRef<HTMLButtonElement>(null);
  useEffect(() => {
    if (takesFocus) button.current?.focus();
  }, [takesFocus]);
  const onKeyDown = (event: KeyboardEvent) => {
    const step = { ArrowLeft: -1, ArrowRight: 1 }[event.key];
    if (event.key === 'Escape') onLeave();
    else if (step !== undefined) onMove(step * (event.shiftKey ? 5 : 1));
    else return;
    event.preventDefault();
    event.stopPropagation();
  };
  const x = Math.min(frame.viewRight - 80, Math.max(frame.viewLeft + 80, frame.x(positionMm)));
  return (
    <div
      className="absolute top-0 left-0"
      style={{ transform: `translate(calc(${x}px - 50%), ${frame.measures.planY + 24}px)` }}
    >
      <Button ref={button} size="small" onClick={onPlace} onKeyDown={onKeyDown}>
        Place a hole here <span className="text-ink3 font-normal">{figure}</span>
      </Button>
    </div>
  );
}
