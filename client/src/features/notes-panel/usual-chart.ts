import type { DesignDocument, Fingering } from '#shared/document/design-document.ts';
import { recorderChart, reedPipeChart, sixHoleChart } from '#shared/document/starter-charts.ts';

/**
 * The chart that pipes with these holes are usually fingered by, over a lowest note; null where there is none:
 * six finger holes, or seven and a thumb hole.
 */
export function usualChart(document: DesignDocument, lowestNote: string): Fingering[] | null {
  const inOrder = document.holes.toSorted((a, b) => a.positionMm - b.positionMm);
  const fingers = inOrder.filter(({ cover }) => cover === 'finger' || cover === 'pad');
  const thumbs = inOrder.filter(({ cover }) => cover === 'thumb');
  const isClosed = document.mouthEnd.kind === 'reed' || document.mouthEnd.kind === 'ideal-closed';
  const order = { lowestNote, holes: [...fingers, ...thumbs] };
  if (fingers.length === 7 && thumbs.length === 1)
    return isClosed ? reedPipeChart(order) : recorderChart(order);
  // Closed at the mouth end, six holes do not reach the twelfth above: there is no chart that all makers share.
  if (fingers.length === 6 && thumbs.length === 0 && !isClosed) return sixHoleChart(order);
  return null;
}

/** The lowest note of the chart that is there, else the tonic a maker starts from. */
export function lowestChartedNote(document: DesignDocument): string {
  const fullest = document.fingerings.reduce<Fingering | null>(
    (most, fingering) => (most === null || fingering.covered.length > most.covered.length ? fingering : most),
    null,
  );
  return fullest?.note ?? `${document.pitch.tonic}4`;
}
