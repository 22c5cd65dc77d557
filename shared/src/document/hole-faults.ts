import type { DesignDocument, MouthEnd, ToneHole } from './design-document.ts';
import type { DocumentFault, FaultCheck } from './fault-words.ts';
import { holeTitle, labelledHoles } from './hole-labels.ts';
import { boreEnds, chimneyMm, diameterAt } from './profile.ts';
import { titleInSentence } from './title-in-sentence.ts';

/** Widest hole the tone-hole formulas hold for, as a share of the bore. */
export const WIDEST_HOLE_SHARE = 0.95;

/** What the holes get wrong about bore, mouth end and one another. */
export function allHoleFaults(check: FaultCheck): DocumentFault[] {
  return [
    ...check.document.holes.flatMap((hole, index) => holeFaults(check, hole, index)),
    ...overlapFaults(check),
    ...ringFaults(check),
  ];
}

/** Both places as they are counted, the lesser figure first. */
function placesWords({ document, words }: FaultCheck, leastMm: number, mostMm: number): string {
  if (leastMm > mostMm) return 'The bore is too short for it. Make it smaller, or the bore longer.';
  return `Place it ${words.between(document, leastMm, mostMm)}.`;
}

/**
 * Between which places the centre of a hole leaves the hole whole, mm, on a tenth.
 *
 * What lies before the mouth's own opening is no part of the sounding column: a hole there would be worked out as if it were.
 */
function holePlaces(document: DesignDocument, hole: ToneHole): { leastMm: number; mostMm: number } {
  const { mouthEnd } = document;
  const openingEndMm = mouthOpeningEndMm(mouthEnd);
  const halfMm = hole.diameterMm / 2;
  return {
    leastMm: Math.ceil((openingEndMm + halfMm) * 10 - 1e-6) / 10,
    mostMm: Math.floor((boreEnds(document).footMm - halfMm) * 10 + 1e-6) / 10,
  };
}

/** Where the mouth end's own cut ends, mm: an embouchure hole's edge, the foot of the ramp before a window's lip. */
function mouthOpeningEndMm(mouthEnd: MouthEnd): number {
  switch (mouthEnd.kind) {
    case 'embouchure':
      return mouthEnd.lengthMm / 2;
    case 'window':
      return mouthEnd.wallMm / Math.tan((mouthEnd.rampDeg * Math.PI) / 180);
    default:
      return 0;
  }
}

function holeFaults(check: FaultCheck, hole: ToneHole, index: number): DocumentFault[] {
  const { document, words } = check;
  const { leastMm, mostMm } = holePlaces(document, hole);
  const path = (...keys: (string | number)[]) => ['holes', index, ...keys];
  const name = labelledHoles(document).find((labelled) => labelled.index === index)?.title ?? 'A hole';
  if (document.holes.findIndex((other) => other.id === hole.id) < index) {
    return [
      { path: path('id'), message: `${name} has the same id as another hole. Give it one of its own.` },
    ];
  }
  if (hole.positionMm < leastMm || hole.positionMm > mostMm) {
    return [
      {
        path: path('positionMm'),
        message: `${name} lies outside the bore, or cuts into its end. ${placesWords(check, leastMm, mostMm)}`,
      },
    ];
  }
  const faults: DocumentFault[] = [];
  const bore = diameterAt(document.bore.stations, hole.positionMm);
  const widest = Math.floor(bore * WIDEST_HOLE_SHARE * 10) / 10;
  if (hole.diameterMm > bore * WIDEST_HOLE_SHARE) {
    faults.push({
      path: path('diameterMm'),
      message: `${name} is ${words.length(hole.diameterMm)} and the bore there is ${words.length(bore)}. Make it ${words.length(widest)} or less.`,
    });
  }
  if (hole.cover === 'pad' && (hole.padHeightMm === null || hole.padHeightMm === undefined)) {
    faults.push({ path: path('padHeightMm'), message: `${name} has a pad. Give its height when open.` });
  }
  return [...faults, ...undercutFaults({ ...check, hole, name, path, widest })];
}

interface UndercutCheck extends FaultCheck {
  hole: ToneHole;
  name: string;
  path: (...keys: (string | number)[]) => (string | number)[];
  widest: number;
}

function undercutFaults({ document, words, hole, name, path, widest }: UndercutCheck): DocumentFault[] {
  if (hole.undercut === null) return [];
  const { innerDiameterMm, depthMm } = hole.undercut;
  const height = chimneyMm(document, hole);
  const faults: DocumentFault[] = [];
  if (innerDiameterMm < hole.diameterMm) {
    faults.push({
      path: path('undercut', 'innerDiameterMm'),
      message: `${name} is undercut to ${words.length(innerDiameterMm)}, less than its ${words.length(hole.diameterMm)}. Make it ${words.length(hole.diameterMm)} or more.`,
    });
  }
  if (innerDiameterMm > widest) {
    faults.push({
      path: path('undercut', 'innerDiameterMm'),
      message: `${name} is undercut to ${words.length(innerDiameterMm)}, too near the bore's own width. Make it ${words.length(widest)} or less.`,
    });
  }
  if (depthMm > height + 1e-9) {
    faults.push({
      path: path('undercut', 'depthMm'),
      message: `${name} is undercut ${words.length(depthMm)} deep in a wall of ${words.length(height)}. Make it ${words.length(height)} or less.`,
    });
  }
  return faults;
}

function overlapFaults({ document, words }: FaultCheck): DocumentFault[] {
  const faults: DocumentFault[] = [];
  document.holes.forEach((hole, index) => {
    document.holes.slice(0, index).forEach((other) => {
      const wood = woodBetweenMm(document, hole, other);
      if (wood > 0) return;
      faults.push({
        path: ['holes', index, 'positionMm'],
        message: `${holeTitle(document, other.id)} and ${titleInSentence(holeTitle(document, hole.id))} run into each other by ${words.length(-wood)}. Move one or choose smaller drills.`,
      });
    });
  });
  return faults;
}

/** Wood left between two holes at the bore wall, mm; negative where they run into each other. */
export function woodBetweenMm(document: DesignDocument, a: ToneHole, b: ToneHole): number {
  const middle = (a.positionMm + b.positionMm) / 2;
  const radius = diameterAt(document.bore.stations, middle) / 2;
  const turn = ((((a.angleDeg - b.angleDeg) % 360) + 540) % 360) - 180;
  const distance = Math.hypot(a.positionMm - b.positionMm, radius * ((turn * Math.PI) / 180));
  const widthOf = (hole: ToneHole) => hole.undercut?.innerDiameterMm ?? hole.diameterMm;
  return distance - (widthOf(a) + widthOf(b)) / 2;
}

/** Holes round one place of the bore may together take this share of its circumference. Own judgement. */
const MOST_OF_A_RING = 0.9;

/** Three holes side by side round the tube can each leave wood to the next and none to hold the tube together. */
function ringFaults({ document }: FaultCheck): DocumentFault[] {
  const ring = document.holes
    .map((hole, index) => ({ index, holes: ringOf(document, hole) }))
    .find(({ holes }) => holes.length > 2 && shareOfRing(document, holes) > MOST_OF_A_RING);
  if (ring === undefined) return [];
  const titles = ring.holes.map(({ id }) => titleInSentence(holeTitle(document, id))).join(', ');
  return [
    {
      path: ['holes', ring.index, 'positionMm'],
      message: `Round one place of the bore there is almost no wood left between ${titles}. Move one along the bore, or choose smaller drills.`,
    },
  ];
}

function ringOf(document: DesignDocument, hole: ToneHole): ToneHole[] {
  return document.holes.filter(
    ({ positionMm }) => Math.abs(positionMm - hole.positionMm) < hole.diameterMm / 2,
  );
}

function shareOfRing(document: DesignDocument, holes: readonly ToneHole[]): number {
  const arcs = holes.map((hole) => {
    const bore = diameterAt(document.bore.stations, hole.positionMm);
    return Math.asin(Math.min(1, hole.diameterMm / bore)) / Math.PI;
  });
  return arcs.reduce((sum, arc) => sum + arc, 0);
}
