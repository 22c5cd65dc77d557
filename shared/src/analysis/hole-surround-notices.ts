import type { DesignDocument, Station, ToneHole } from '../document/design-document.ts';
import { woodBetweenMm } from '../document/hole-faults.ts';
import { holeTitle } from '../document/hole-labels.ts';
import { diameterAt } from '../document/profile.ts';
import { titleInSentence } from '../document/title-in-sentence.ts';
import type { Notice } from './prediction.ts';

/** Across a hole the formulas take bore and wall as even; beyond these ratios of largest to least it is said. Own judgement. */
const EVEN_BORE = 1.05;
const EVEN_WALL = 1.3;

/** Less wood than this between two holes is likely to break out, and was not among the bodies that were studied, mm. */
const LEAST_WOOD_MM = 0.5;

/** What stands round a hole that its formulas know nothing of: a step under it, another opening at its very edge. */
export function holeSurroundNotices(document: DesignDocument, hole: ToneHole): Notice[] {
  const title = holeTitle(document, hole.id);
  return [
    ...unevenNotices(document, hole, title),
    ...nearMouthNotices(document, hole, title),
    ...thinWoodNotices(document, hole, title),
  ];
}

function unevenNotices(document: DesignDocument, hole: ToneHole, title: string): Notice[] {
  const notices: Notice[] = [];
  const bore = acrossHole(document.bore.stations, hole);
  if (bore.most / bore.least > EVEN_BORE) {
    notices.push({
      code: 'hole-over-bore-change',
      message: `Under ${titleInSentence(title)} the bore goes from ${bore.least.toFixed(1)} to ${bore.most.toFixed(1)} mm. The formulas take it as even across a hole: its notes may be off by 20 cents. Move the hole or the step.`,
    });
  }
  if (hole.chimneyMm !== null) return notices;
  const outside = acrossHole(document.outside.stations, hole);
  const least = (outside.least - bore.most) / 2;
  const most = (outside.most - bore.least) / 2;
  if (most / least > EVEN_WALL && outside.most / outside.least > EVEN_BORE) {
    notices.push({
      code: 'hole-over-outside-change',
      message: `Across ${titleInSentence(title)} the wall goes from ${least.toFixed(1)} to ${most.toFixed(1)} mm. Its height in the middle is taken; type the height you measure, or expect its notes to be off by several cents.`,
    });
  }
  return notices;
}

/** Least and largest diameter of a profile from edge to edge of a hole. */
function acrossHole(stations: readonly Station[], hole: ToneHole): { least: number; most: number } {
  const half = (hole.undercut?.innerDiameterMm ?? hole.diameterMm) / 2;
  const [from, to] = [hole.positionMm - half, hole.positionMm + half];
  const diameters = stations
    .filter(({ positionMm }) => positionMm >= from && positionMm <= to)
    .map(({ diameterMm }) => diameterMm)
    .concat(diameterAt(stations, from), diameterAt(stations, to));
  return { least: Math.min(...diameters), most: Math.max(...diameters) };
}

function nearMouthNotices(document: DesignDocument, hole: ToneHole, title: string): Notice[] {
  const { mouthEnd } = document;
  if (mouthEnd.kind !== 'embouchure') return [];
  const wood = hole.positionMm - hole.diameterMm / 2 - mouthEnd.lengthMm / 2;
  if (wood >= diameterAt(document.bore.stations, 0) / 2) return [];
  return [
    {
      code: 'hole-near-embouchure',
      message: `${title} stands ${wood.toFixed(1)} mm from the edge of the embouchure hole. Openings so near the lips were not studied: its notes may be off by many cents.`,
    },
  ];
}

function thinWoodNotices(document: DesignDocument, hole: ToneHole, title: string): Notice[] {
  const at = document.holes.findIndex(({ id }) => id === hole.id);
  return document.holes.slice(0, at).flatMap((other) => {
    const wood = woodBetweenMm(document, other, hole);
    if (wood >= LEAST_WOOD_MM) return [];
    return [
      {
        code: 'holes-nearly-touch',
        message: `Only ${wood.toFixed(1)} mm of wood stands between ${titleInSentence(holeTitle(document, other.id))} and ${titleInSentence(title)}. It is likely to break out, and holes so near were not studied.`,
      },
    ];
  });
}
