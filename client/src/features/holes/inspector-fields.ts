import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import { boreEnds, fromFootMm } from '#shared/document/profile.ts';
import { changeHole, withUndercut } from '../../bench/hole-edits.ts';
import { lengthFormat } from '../../ui/length-format.ts';
import { plainFormat } from '../../ui/number-format.ts';

export const LENGTH_FORMATS = { mm: lengthFormat('mm'), inch: lengthFormat('inch') };
export const ANGLE_FORMAT = plainFormat({ suffix: 'deg', step: 1, digits: 0, example: '15 or −30' });

/** Sizes of a hole, by their keys below the hole in the document. */
export type HoleSize =
  'positionMm' | 'diameterMm' | 'chimneyMm' | 'undercut.innerDiameterMm' | 'undercut.depthMm' | 'angleDeg';

export const SIZE_WORDS: Record<HoleSize, string> = {
  positionMm: 'Position',
  diameterMm: 'Diameter',
  chimneyMm: 'Chimney',
  'undercut.innerDiameterMm': 'Undercut',
  'undercut.depthMm': 'Undercut',
  angleDeg: 'Angle',
};

/** The document with one size as it was typed: positions from the foot, null for what comes by itself. */
export function withSize(
  document: DesignDocument,
  id: string,
  size: HoleSize,
  value: number | null,
): DesignDocument {
  if (size === 'chimneyMm') return changeHole(document, id, { chimneyMm: value });
  if (value === null) return document;
  switch (size) {
    case 'positionMm':
      return changeHole(document, id, { positionMm: fromFootMm(document, value) });
    case 'undercut.innerDiameterMm':
      return withUndercut(document, id, value);
    case 'undercut.depthMm': {
      const undercut = document.holes.find((hole) => hole.id === id)?.undercut ?? null;
      return undercut === null
        ? document
        : changeHole(document, id, { undercut: { ...undercut, depthMm: value } });
    }
    default:
      return changeHole(document, id, { [size]: value });
  }
}

export const COVER_WORDS: Record<ToneHole['cover'], string> = {
  finger: 'a finger',
  thumb: 'the thumb',
  pad: 'a pad',
  vent: 'nothing (vent)',
  lid: 'a plug',
};

export const HAND_WORDS: Record<ToneHole['hand'], string> = { left: 'left hand', right: 'right hand' };

/** Changes that a cover brings with it: a pad has a height, a thumb hole faces away, a vent is in no fingering. */
export function withCover(document: DesignDocument, id: string, cover: ToneHole['cover']): DesignDocument {
  const changed = {
    ...document,
    holes: document.holes.map((hole) => (hole.id === id ? covered(hole, cover) : hole)),
  };
  return cover === 'vent' ? { ...changed, fingerings: withoutHole(document, id) } : changed;
}

function covered(hole: ToneHole, cover: ToneHole['cover']): ToneHole {
  return {
    ...hole,
    cover,
    angleDeg: cover === 'thumb' && hole.angleDeg === 0 ? 180 : hole.angleDeg,
    padHeightMm: cover === 'pad' ? (hole.padHeightMm ?? Math.round(hole.diameterMm * 3) / 10) : null,
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
  const { mouthMm } = boreEnds(document);
  return { min: 0.5, max: fromFootMm(document, Math.max(mouthMm, 0)) - 0.5 };
}
