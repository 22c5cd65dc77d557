import type { DesignDocument, Station, ToneHole } from './design-document.ts';
import { boreEnds, chimneyMm, diameterAt } from './profile.ts';
import { titleInSentence } from './title-in-sentence.ts';

/** One thing that is wrong: where (path of keys and indices), and what to do, in a maker's words. */
export interface DocumentFault {
  path: (string | number)[];
  message: string;
}

/** Widest hole the tone-hole formulas hold for, as a share of the bore. */
export const WIDEST_HOLE_SHARE = 0.95;

const mm = (value: number) => value.toFixed(1);

/**
 * What the parts of a document get wrong about one another, all at once; empty when it can be predicted.
 *
 * Every message names the thing, the figure and the figure that would do.
 */
export function documentFaults(document: DesignDocument): DocumentFault[] {
  return [
    ...stationFaults(document.bore.stations, 'bore'),
    ...stationFaults(document.outside.stations, 'outside'),
    ...mouthEndFaults(document),
    ...wallFaults(document),
    ...document.holes.flatMap((hole, index) => holeFaults(document, hole, index)),
    ...overlapFaults(document),
    ...fingeringFaults(document),
    ...pitchFaults(document),
    ...airFaults(document),
  ];
}

function stationFaults(stations: readonly Station[], part: 'bore' | 'outside'): DocumentFault[] {
  const faults: DocumentFault[] = [];
  stations.forEach((station, index) => {
    const before = stations[index - 1];
    if (before === undefined) return;
    const path = [part, 'stations', index, 'positionMm'];
    if (station.positionMm < before.positionMm) {
      faults.push({
        path,
        message: `Station ${index + 1} of the ${part} lies before station ${index}. Give a position of ${mm(before.positionMm)} or more.`,
      });
    } else if (stations[index - 2]?.positionMm === station.positionMm) {
      faults.push({
        path,
        message: `Three stations of the ${part} lie at ${mm(station.positionMm)}. A step needs two.`,
      });
    }
  });
  const first = stations[0];
  const last = stations.at(-1);
  if (
    first !== undefined &&
    last !== undefined &&
    last.positionMm <= first.positionMm &&
    faults.length === 0
  ) {
    faults.push({
      path: [part, 'stations'],
      message: `The ${part} has no length. Move its last station footward.`,
    });
  }
  return faults;
}

function mouthEndFaults(document: DesignDocument): DocumentFault[] {
  const { mouthEnd } = document;
  const { mouthMm, footMm } = boreEnds(document);
  const faults: DocumentFault[] = [];
  if (footMm <= 0) {
    faults.push({
      path: ['bore', 'stations'],
      message: 'The bore ends before the mouth end. Its last position is more than 0.',
    });
  }
  if (mouthEnd.kind === 'window' && Math.abs(mouthMm + mouthEnd.lengthMm) > 0.05) {
    faults.push({
      path: ['bore', 'stations', 0, 'positionMm'],
      message: `The bore begins at the block face, ${mm(mouthEnd.lengthMm)} before the lip. Make its first position ${(-mouthEnd.lengthMm).toFixed(1)}.`,
    });
  }
  if (mouthEnd.kind !== 'window' && mouthEnd.kind !== 'embouchure' && Math.abs(mouthMm) > 0.05) {
    faults.push({
      path: ['bore', 'stations', 0, 'positionMm'],
      message: 'The bore begins at 0 with this mouth end.',
    });
  }
  return [...faults, ...embouchureFaults(document)];
}

function embouchureFaults(document: DesignDocument): DocumentFault[] {
  const { mouthEnd } = document;
  if (mouthEnd.kind !== 'embouchure') return [];
  const faults: DocumentFault[] = [];
  if (boreEnds(document).mouthMm > 0) {
    faults.push({
      path: ['bore', 'stations', 0, 'positionMm'],
      message: 'The bore begins after the embouchure hole. Make its first position 0 or less.',
    });
  }
  if (mouthEnd.stopperMm < mouthEnd.lengthMm / 2) {
    faults.push({
      path: ['mouthEnd', 'stopperMm'],
      message: `The stopper stands in the embouchure hole. Set it ${mm(mouthEnd.lengthMm / 2)} or more from the middle of the hole.`,
    });
  }
  return faults;
}

function wallFaults(document: DesignDocument): DocumentFault[] {
  const { mouthMm, footMm } = boreEnds(document);
  const places = [...document.bore.stations, ...document.outside.stations]
    .map((station) => station.positionMm)
    .filter((position) => position >= mouthMm && position <= footMm);
  const thin = places.find(
    (position) =>
      diameterAt(document.outside.stations, position) <= diameterAt(document.bore.stations, position),
  );
  if (thin === undefined) return [];
  const bore = diameterAt(document.bore.stations, thin);
  return [
    {
      path: ['outside', 'stations'],
      message: `The bore breaks through the outside at ${mm(thin)} from the mouth end. Make the outside there wider than ${mm(bore)}.`,
    },
  ];
}

function holeName(hole: ToneHole, index: number): string {
  return `Hole ${hole.name === '' ? String(index + 1) : hole.name}`;
}

/**
 * Between which places the centre of a hole leaves the hole whole, mm, on a tenth.
 *
 * What lies before the mouth's own opening is no part of the sounding column: a hole there would be worked out as if it were.
 */
function holePlaces(document: DesignDocument, hole: ToneHole): { leastMm: number; mostMm: number } {
  const { mouthEnd } = document;
  const openingEndMm = mouthEnd.kind === 'embouchure' ? mouthEnd.lengthMm / 2 : 0;
  const halfMm = hole.diameterMm / 2;
  return {
    leastMm: Math.ceil((openingEndMm + halfMm) * 10 - 1e-6) / 10,
    mostMm: Math.floor((boreEnds(document).footMm - halfMm) * 10 + 1e-6) / 10,
  };
}

function holeFaults(document: DesignDocument, hole: ToneHole, index: number): DocumentFault[] {
  const { leastMm, mostMm } = holePlaces(document, hole);
  const path = (...keys: (string | number)[]) => ['holes', index, ...keys];
  const name = holeName(hole, index);
  if (document.holes.findIndex((other) => other.id === hole.id) < index) {
    return [
      { path: path('id'), message: `${name} has the same id as another hole. Give it one of its own.` },
    ];
  }
  if (hole.positionMm < leastMm || hole.positionMm > mostMm) {
    return [
      {
        path: path('positionMm'),
        message: `${name} lies outside the bore. Place it between ${mm(leastMm)} and ${mm(mostMm)} from the mouth end.`,
      },
    ];
  }
  const faults: DocumentFault[] = [];
  const bore = diameterAt(document.bore.stations, hole.positionMm);
  const widest = Math.floor(bore * WIDEST_HOLE_SHARE * 10) / 10;
  if (hole.diameterMm > bore * WIDEST_HOLE_SHARE) {
    faults.push({
      path: path('diameterMm'),
      message: `${name} is ${mm(hole.diameterMm)} and the bore there is ${mm(bore)}. Make it ${mm(widest)} or less.`,
    });
  }
  if (hole.cover === 'pad' && (hole.padHeightMm === null || hole.padHeightMm === undefined)) {
    faults.push({ path: path('padHeightMm'), message: `${name} has a pad. Give its height when open.` });
  }
  return [...faults, ...undercutFaults({ document, hole, name, path, widest })];
}

interface UndercutCheck {
  document: DesignDocument;
  hole: ToneHole;
  name: string;
  path: (...keys: (string | number)[]) => (string | number)[];
  widest: number;
}

function undercutFaults({ document, hole, name, path, widest }: UndercutCheck): DocumentFault[] {
  if (hole.undercut === null) return [];
  const { innerDiameterMm, depthMm } = hole.undercut;
  const height = chimneyMm(document, hole);
  const faults: DocumentFault[] = [];
  if (innerDiameterMm < hole.diameterMm) {
    faults.push({
      path: path('undercut', 'innerDiameterMm'),
      message: `${name} is undercut to ${mm(innerDiameterMm)}, less than its ${mm(hole.diameterMm)}. Make it ${mm(hole.diameterMm)} or more.`,
    });
  }
  if (innerDiameterMm > widest) {
    faults.push({
      path: path('undercut', 'innerDiameterMm'),
      message: `${name} is undercut to ${mm(innerDiameterMm)}, too near the bore's own width. Make it ${mm(widest)} or less.`,
    });
  }
  if (depthMm > height + 1e-9) {
    faults.push({
      path: path('undercut', 'depthMm'),
      message: `${name} is undercut ${mm(depthMm)} deep in a wall of ${mm(height)}. Make it ${mm(height)} or less.`,
    });
  }
  return faults;
}

function overlapFaults(document: DesignDocument): DocumentFault[] {
  const faults: DocumentFault[] = [];
  document.holes.forEach((hole, index) => {
    document.holes.slice(0, index).forEach((other, otherIndex) => {
      const wood = woodBetweenMm(document, hole, other);
      if (wood > 0) return;
      faults.push({
        path: ['holes', index, 'positionMm'],
        message: `${holeName(other, otherIndex)} and ${titleInSentence(holeName(hole, index))} run into each other by ${mm(-wood)}. Move one or choose smaller drills.`,
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

function fingeringFaults(document: DesignDocument): DocumentFault[] {
  const known = new Set(document.holes.map((hole) => hole.id));
  const open = new Set(document.holes.filter((hole) => hole.cover === 'vent').map((hole) => hole.id));
  return document.fingerings.flatMap((fingering, index) => {
    const faults: DocumentFault[] = [];
    if (document.fingerings.findIndex((other) => other.id === fingering.id) < index) {
      faults.push({
        path: ['fingerings', index, 'id'],
        message: `Two fingerings have the id ${fingering.id}.`,
      });
    }
    const touch = (hole: string, path: (string | number)[]) => {
      if (!known.has(hole))
        faults.push({ path, message: `${fingering.note} names hole ${hole}, which is not in this design.` });
      else if (open.has(hole))
        faults.push({ path, message: `${fingering.note} covers a vent hole, which no finger reaches.` });
    };
    fingering.covered.forEach((hole, at) => touch(hole, ['fingerings', index, 'covered', at]));
    fingering.half.forEach((half, at) => {
      touch(half.hole, ['fingerings', index, 'half', at, 'hole']);
      if (fingering.covered.includes(half.hole)) {
        faults.push({
          path: ['fingerings', index, 'half', at, 'hole'],
          message: `${fingering.note} has hole ${half.hole} both covered and half-covered. Keep one.`,
        });
      }
    });
    return faults;
  });
}

function pitchFaults(document: DesignDocument): DocumentFault[] {
  if (document.pitch.temperament !== 'own' || document.pitch.centsOffsets !== null) return [];
  return [
    {
      path: ['pitch', 'centsOffsets'],
      message: 'Own cents need twelve figures, one for each semitone from the tonic.',
    },
  ];
}

function airFaults(document: DesignDocument): DocumentFault[] {
  const { mouthTemperatureC, warmLengthMm } = document.air;
  if ((mouthTemperatureC === null) === (warmLengthMm === null)) return [];
  const missing = mouthTemperatureC === null ? 'mouthTemperatureC' : 'warmLengthMm';
  return [
    {
      path: ['air', missing],
      message: 'A column that is warm at the mouth needs both the temperature there and the warm length.',
    },
  ];
}
