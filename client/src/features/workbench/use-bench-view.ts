import { useMemo, useState } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { BenchGeometry } from '../../bench/bench-geometry.ts';
import { fingerHoleView, WHOLE, zoomView, type BenchView } from '../../bench/bench-view.ts';
import { drawnBody } from '../../bench/drawn-body.ts';
import { useBenchGeometry } from '../../bench/use-bench-geometry.ts';

/** Below this the finger holes alone fill the bench, px. */
const PHONE_PX = 700;
/** On a tablet more holes than this have no room for their columns unless the head is left out. */
const TABLET_PX = 1100;
const TABLET_HOLES = 9;

export interface BenchViewDesk {
  view: BenchView;
  geometry: BenchGeometry;
  setView: (view: BenchView) => void;
  /** Zooms about the middle of what is seen; 0 shows the whole. */
  zoom: (factor: number) => void;
  showHoles: () => void;
}

/** What of the instrument is in view; until somebody zooms, what the width has room for. */
export function useBenchView(document: DesignDocument, widthPx: number): BenchViewDesk {
  const [chosen, setView] = useState<BenchView | null>(null);
  // As the design was opened: while holes are dragged the view must not move under the hand.
  const [opened] = useState(document);
  const starting = useMemo(() => startingView(opened, widthPx), [opened, widthPx]);
  const view = chosen ?? starting;
  const geometry = useBenchGeometry(document, widthPx, view);
  const middleMm = geometry.mm((geometry.viewLeft + geometry.viewRight) / 2);
  return {
    view,
    geometry,
    setView,
    zoom: (factor) => setView(factor === 0 ? WHOLE : zoomView(view, geometry.body, factor, middleMm)),
    showHoles: () => setView(fingerHoleView(document, geometry.body)),
  };
}

function startingView(document: DesignDocument, widthPx: number): BenchView {
  const isCrowded = widthPx < TABLET_PX && document.holes.length > TABLET_HOLES;
  return widthPx < PHONE_PX || isCrowded ? fingerHoleView(document, drawnBody(document)) : WHOLE;
}
