import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import { boreEnds, fromFootMm } from '#shared/document/profile.ts';
import { lengthFormat } from '../../ui/length-format.ts';
import { plainFormat } from '../../ui/number-format.ts';

export const LENGTH_FORMATS = { mm: lengthFormat('mm'), inch: lengthFormat('inch') };
export const ANGLE_FORMAT = plainFormat({ suffix: 'deg', step: 1, digits: 0, example: '15 or −30' });

export const COVER_WORDS: Record<ToneHole['cover'], string> = {
  finger: 'a finger',
  thumb: 'the thumb',
  pad: 'a pad',
  vent: 'nothing (vent)',
  lid: 'a plug',
};

export const HAND_WORDS: Record<ToneHole['hand'], string> = { left: 'left hand', right: 'right hand' };

/** Changes that a cover brings with it: a pad has a height, a thumb hole faces away, a vent is in no fingering. */
export function withCover(
  document: DesignDocument,
  hole: ToneHole,
  cover: ToneHole['cover'],
): DesignDocument {
  const turned = cover === 'thumb' && hole.angleDeg === 0 ? 180 : hole.angleDeg;
  const padHeightMm = cover === 'pad' ? (hole.padHeightMm ?? Math.round(hole.diameterMm * 3) / 10) : null;
  const changed = { ...hole, cover, angleDeg: turned, padHeightMm };
  return {
    ...document,
    holes: document.holes.map((other) => (other.id === hole.id ? changed : other)),
    fingerings: cover === 'vent' ? withoutHole(document, hole.id) : document.fingerings,
  };
}

function withoutHole(document: DesignDocument, id: string): DesignDocument['fingerings'] {
  return document.fingerings.map((fingering) => ({
    ...fingering,
    covered: fingering.covered.filter((hole) => hole !== id),
    half: fingering.half.filter((half) => half.hole !== id),
  }));
}

/** Room that a hole has along the bore, from the foot. */
export function footRange(document: DesignDocument): { min: number; max: number } {
  const { mouthMm, footMm } = boreEnds(document);
  return { min: 0.5, max: fromFootMm(document, Math.max(mouthMm, 0)) - (footMm > 1 ? 0.5 : 0) };
}
