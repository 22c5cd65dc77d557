import type { DesignDocument } from '#shared/document/design-document.ts';
import type { DrawnBody } from './drawn-body.ts';

/** What of the instrument is in view: all of it, or a stretch. */
export type BenchView = { kind: 'whole' } | { kind: 'stretch'; fromMm: number; toMm: number };

export const WHOLE: BenchView = { kind: 'whole' };

/** Shortest stretch that fills the bench, mm. */
const SHORTEST_MM = 25;

/** The finger holes and the foot, with a little of the pipe above the first hole. */
export function fingerHoleView(document: DesignDocument, body: DrawnBody): BenchView {
  const first = document.holes.reduce((least, hole) => Math.min(least, hole.positionMm), Infinity);
  if (!Number.isFinite(first)) return WHOLE;
  const fromMm = first - body.widestMm * 0.75;
  return fromMm <= body.headMm ? WHOLE : { kind: 'stretch', fromMm, toMm: body.footMm };
}

interface Span {
  fromMm: number;
  toMm: number;
}

/** What the view shows, as a span; the whole instrument ends at its foot. */
export function spanOf(view: BenchView, body: DrawnBody): Span {
  return view.kind === 'whole' ? { fromMm: body.headMm, toMm: body.footMm } : view;
}

/** Zooms by a factor (> 1 is nearer) about a place that stays where it is. */
export function zoomView(view: BenchView, body: DrawnBody, factor: number, aboutMm: number): BenchView {
  const span = spanOf(view, body);
  const length = span.toMm - span.fromMm;
  const wanted = Math.max(SHORTEST_MM, length / factor);
  if (wanted >= body.footMm - body.headMm) return WHOLE;
  const share = (aboutMm - span.fromMm) / length;
  return within({ fromMm: aboutMm - share * wanted, toMm: aboutMm + (1 - share) * wanted }, body);
}

export function panView(view: BenchView, body: DrawnBody, byMm: number): BenchView {
  if (view.kind === 'whole') return view;
  return within({ fromMm: view.fromMm + byMm, toMm: view.toMm + byMm }, body);
}

function within({ fromMm, toMm }: Span, body: DrawnBody): BenchView {
  const shift = Math.max(0, body.headMm - fromMm) - Math.max(0, toMm - body.footMm);
  return { kind: 'stretch', fromMm: fromMm + shift, toMm: toMm + shift };
}
