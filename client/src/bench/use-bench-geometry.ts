import { useMemo } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { benchFrame, benchGeometry, type BenchGeometry } from './bench-geometry.ts';
import type { BenchView } from './bench-view.ts';
import { drawnBody } from './drawn-body.ts';

/** Geometry of the bench. The frame stays the same object while only holes move, so that the body is not drawn again. */
export function useBenchGeometry(document: DesignDocument, widthPx: number, view: BenchView): BenchGeometry {
  const { bore, outside, mouthEnd } = document;
  const body = useMemo(() => drawnBody({ bore, outside, mouthEnd }), [bore, outside, mouthEnd]);
  const frame = useMemo(() => benchFrame(body, widthPx, view), [body, widthPx, view]);
  return useMemo(() => benchGeometry(document, frame), [document, frame]);
}
