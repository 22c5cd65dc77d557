import { PAD_RANGE } from '../acoustics/tone-hole/pad.ts';
import { TONE_HOLE_RANGE } from '../acoustics/tone-hole/tone-hole-range.ts';
import { UNDERCUT_RANGE, UNUSUAL_UNDERCUT_CENTS } from '../acoustics/tone-hole/undercut.ts';
import type { DesignDocument, ToneHole } from '../document/design-document.ts';
import { holeTitle } from '../document/hole-labels.ts';
import { chimneyMm, diameterAt } from '../document/profile.ts';
import { holeSurroundNotices } from './hole-surround-notices.ts';
import type { Notice } from './prediction.ts';
import { isOutside } from './range.ts';
import { PAD_TO_HOLE_RATIO } from './to-column.ts';
import { titleInSentence } from '../document/title-in-sentence.ts';

/** Sizes of a hole that its formulas ask for, mm. */
interface HoleMeasures {
  radius: number;
  /** At the bore, wider where undercut. */
  inner: number;
  bore: number;
  outer: number;
  chimney: number;
}

/** Notices about one hole: each formula that is asked outside the range it was made from. */
export function holeNotices(document: DesignDocument, hole: ToneHole): Notice[] {
  const title = holeTitle(document, hole.id);
  const measures = holeMeasures(document, hole);
  return [
    ...sizeNotices(title, measures),
    ...undercutNotices(title, hole, measures),
    ...padNotices(title, hole, measures),
    ...holeSurroundNotices(document, hole),
  ].map((notice) => ({ ...notice, hole: hole.id }));
}

export function holeMeasures(document: DesignDocument, hole: ToneHole): HoleMeasures {
  return {
    radius: hole.diameterMm / 2,
    inner: (hole.undercut?.innerDiameterMm ?? hole.diameterMm) / 2,
    bore: diameterAt(document.bore.stations, hole.positionMm) / 2,
    outer: diameterAt(document.outside.stations, hole.positionMm) / 2,
    chimney: chimneyMm(document, hole),
  };
}

function sizeNotices(title: string, { radius, inner, bore, chimney }: HoleMeasures): Notice[] {
  const { radiusRatio, chimneyRatio } = TONE_HOLE_RANGE;
  const notices: Notice[] = [];
  if (inner / bore > radiusRatio.to + 1e-9) {
    notices.push({
      code: 'hole-wider-than-formula',
      message: `${title} is ${(inner / bore).toFixed(2)} of the bore's width; the formulas were made up to ${radiusRatio.to}. Its notes may be off by a few cents.`,
    });
  }
  if (inner / bore < radiusRatio.from - 1e-9) {
    notices.push({
      code: 'hole-narrower-than-formula',
      message: `${title} is ${(inner / bore).toFixed(2)} of the bore's width; the formulas were made from ${radiusRatio.from}. They carry on smoothly below it, and the error is small.`,
    });
  }
  if (isOutside(chimney / radius, chimneyRatio)) {
    notices.push({
      code: 'hole-chimney-outside-formula',
      message: `The chimney of ${titleInSentence(title)} is ${(chimney / radius).toFixed(2)} hole radii high; the formulas were made for ${chimneyRatio.from} to ${chimneyRatio.to}. Its notes may be off by a few cents.`,
    });
  }
  return notices;
}

function undercutNotices(title: string, hole: ToneHole, measures: HoleMeasures): Notice[] {
  if (hole.undercut === null) return [];
  const { radius, inner, bore, chimney } = measures;
  const outside =
    isOutside(radius / bore, UNDERCUT_RANGE.radiusRatio) ||
    isOutside(chimney / radius, UNDERCUT_RANGE.chimneyRatio) ||
    isOutside((inner - radius) / radius, UNDERCUT_RANGE.flareRatio) ||
    isOutside(hole.undercut.depthMm / chimney, UNDERCUT_RANGE.depthRatio);
  if (!outside) return [];
  return [
    {
      code: 'undercut-outside-formula',
      message: `The undercut of ${titleInSentence(title)} is not of a shape that was studied. Take its notes as right to ± ${UNUSUAL_UNDERCUT_CENTS} cents.`,
    },
  ];
}

function padNotices(title: string, hole: ToneHole, { radius }: HoleMeasures): Notice[] {
  if (hole.cover !== 'pad') return [];
  const notices: Notice[] = [
    {
      code: 'pad-width-assumed',
      message: `The pad over ${titleInSentence(title)} is taken as flat and ${PAD_TO_HOLE_RATIO} times as wide as the hole, with no raised rim.`,
    },
  ];
  if (isOutside((hole.padHeightMm ?? 0) / radius, PAD_RANGE.height)) {
    notices.push({
      code: 'pad-height-outside-formula',
      message: `The pad over ${titleInSentence(title)} stands lower or higher than those studied, ${(PAD_RANGE.height.from * radius).toFixed(1)} to ${(PAD_RANGE.height.to * radius).toFixed(1)} here. Its notes may be off by several cents.`,
    });
  }
  return notices;
}
