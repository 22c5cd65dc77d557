import type { DesignDocument, Fingering, ToneHole } from '#shared/document/design-document.ts';
import { numberedHoles } from './bench-position.ts';
import type { Pen } from './pen.ts';
import type { CellBox } from './table.ts';

type Cover = 'covered' | 'half' | 'open';

/** Disc and pitch as they are with room for them; many holes share the width. Shares of a pitch. */
const MOST_PITCH_MM = 3.3;
const DISC_SHARE = 0.37;
const HAND_GAP_SHARE = 0.4;
const RING = { widthMm: 0.27 };

function coverOf(fingering: Fingering, hole: ToneHole): Cover {
  if (fingering.covered.includes(hole.id)) return 'covered';
  return fingering.half.some((half) => half.hole === hole.id) ? 'half' : 'open';
}

/** The picture in words, for those who hear it read. */
export function fingeringAlt(document: DesignDocument, fingering: Fingering): string {
  const covers = numberedHoles(document).map(({ hole }) => coverOf(fingering, hole));
  return covers.length === 0 ? 'No holes.' : `Fingering, head at the left: ${covers.join(' ')}.`;
}

/** A row of holes, head at the left: covered ones black, half-covered ones half; thumb holes lower, with a bar. */
export function drawFingering(
  pen: Pen,
  { document, fingering, box }: { document: DesignDocument; fingering: Fingering; box: CellBox },
): void {
  const holes = numberedHoles(document).map(({ hole }) => hole);
  const [left, top] = box.at;
  const places = placesOf(holes);
  const span = (places.at(-1) ?? 0) + 1;
  const pitchMm = Math.min(MOST_PITCH_MM, (box.widthMm - 2) / span);
  const start = left + (box.widthMm - span * pitchMm) / 2;
  const radiusMm = pitchMm * DISC_SHARE;
  holes.forEach((hole, index) => {
    const x = start + ((places[index] ?? 0) + 0.5) * pitchMm;
    const isThumb = hole.cover === 'thumb';
    const y = top + box.heightMm / 2 + (isThumb ? 0.9 : 0);
    pen.circle([x, y], radiusMm, RING);
    const cover = coverOf(fingering, hole);
    if (cover === 'covered') pen.fillCircle([x, y], radiusMm);
    if (cover === 'half') fillLeftHalf(pen, { x, y, radiusMm });
    if (isThumb) {
      const barY = y - radiusMm - 0.7;
      pen.line([x - radiusMm, barY], [x + radiusMm, barY], RING);
    }
  });
}

/** Places in pitches; a little more room between two hands. */
function placesOf(holes: readonly ToneHole[]): number[] {
  let at = -1;
  return holes.map((hole, index) => {
    const before = holes[index - 1];
    at += before !== undefined && before.hand !== hole.hand ? 1 + HAND_GAP_SHARE : 1;
    return at;
  });
}

function fillLeftHalf(pen: Pen, { x, y, radiusMm }: { x: number; y: number; radiusMm: number }): void {
  pen.clipped([x - radiusMm, y - radiusMm], radiusMm, 2 * radiusMm, () => pen.fillCircle([x, y], radiusMm));
}
