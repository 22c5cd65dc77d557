import { useState } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { roomiestPosition } from '../../bench/hole-edits.ts';

export interface Placing {
  /** Where a hole is offered, mm from the mouth end; null for nowhere. */
  spotMm: number | null;
  /** The next touch of the instrument places a hole. */
  isPlacing: boolean;
  moveSpot: (positionMm: number | null) => void;
  start: () => void;
}

/** The offer of a new hole: on a spot that was touched, or where there is most room when it was asked for. */
export function usePlacing(document: DesignDocument): Placing {
  const [spotMm, setSpotMm] = useState<number | null>(null);
  const [isPlacing, setPlacing] = useState(false);
  return {
    spotMm,
    isPlacing,
    moveSpot: (positionMm) => {
      setSpotMm(positionMm);
      if (positionMm === null) setPlacing(false);
    },
    start: () => {
      setPlacing(true);
      setSpotMm(roomiestPosition(document));
    },
  };
}
