import type { DesignDocument } from './design-document.ts';
import { MM_FROM_MOUTH_END, type DocumentFault, type FaultCheck, type FaultWords } from './fault-words.ts';
import { allHoleFaults } from './hole-faults.ts';
import { boreEnds, diameterAt } from './profile.ts';

/**
 * What the parts of a document get wrong about one another, all at once; empty when it can be predicted.
 *
 * Every message names the thing, the figure and the figure that would do.
 *
 * @param words - how lengths and places are written; as the document stores them when nothing else is given
 */
export function documentFaults(
  document: DesignDocument,
  words: FaultWords = MM_FROM_MOUTH_END,
): DocumentFault[] {
  const check = { document, words };
  return [
    ...stationFaults(check, 'bore'),
    ...stationFaults(check, 'outside'),
    ...mouthEndFaults(check),
    ...wallFaults(check),
    ...allHoleFaults(check),
    ...fingeringFaults(document),
    ...pitchFaults(document),
    ...airFaults(document),
  ];
}

function stationFaults({ document, words }: FaultCheck, part: 'bore' | 'outside'): DocumentFault[] {
  const { stations } = document[part];
  const faults: DocumentFault[] = [];
  stations.forEach((station, index) => {
    const before = stations[index - 1];
    if (before === undefined) return;
    const path = [part, 'stations', index, 'positionMm'];
    if (station.positionMm < before.positionMm) {
      faults.push({
        path,
        message: `Station ${index + 1} of the ${part} lies before station ${index}. Move it footward of ${words.place(document, before.positionMm)}.`,
      });
    } else if (stations[index - 2]?.positionMm === station.positionMm) {
      faults.push({
        path,
        message: `Three stations of the ${part} lie at ${words.place(document, station.positionMm)}. A step needs two.`,
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

function mouthEndFaults({ document, words }: FaultCheck): DocumentFault[] {
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
      message: `The bore begins at the block face, ${words.length(mouthEnd.lengthMm)} before the lip. Begin its table there.`,
    });
  }
  if (mouthEnd.kind !== 'window' && mouthEnd.kind !== 'embouchure' && Math.abs(mouthMm) > 0.05) {
    faults.push({
      path: ['bore', 'stations', 0, 'positionMm'],
      message: 'The bore begins at 0 with this mouth end.',
    });
  }
  return [...faults, ...embouchureFaults({ document, words })];
}

function embouchureFaults({ document, words }: FaultCheck): DocumentFault[] {
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
      message: `The stopper stands in the embouchure hole. Set it ${words.length(mouthEnd.lengthMm / 2)} or more from the middle of the hole.`,
    });
  }
  return faults;
}

function wallFaults({ document, words }: FaultCheck): DocumentFault[] {
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
      message: `The bore breaks through the outside at ${words.place(document, thin)}. Make the outside there wider than ${words.length(bore)}.`,
    },
  ];
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
