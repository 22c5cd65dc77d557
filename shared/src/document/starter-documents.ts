import { noteFrequencyHz } from '../music/temperament.ts';
import type {
  Air,
  DesignDocument,
  Fingering,
  MouthEnd,
  Pitch,
  Station,
  ToneHole,
} from './design-document.ts';
import { recorderChart, reedPipeChart, sixHoleChart } from './starter-charts.ts';

export const STARTER_KINDS = ['whistle', 'flute', 'end-blown', 'recorder', 'reed-pipe'] as const;
export type StarterKind = (typeof STARTER_KINDS)[number];

export interface StarterOrder {
  kind: StarterKind;
  name: string;
  lowestNote: string;
  pitch: Pitch;
  air: Air;
  /** Bore at the head, mm; the usual one for the note when left out. */
  boreMm?: number | undefined;
}

/** What makes one kind of instrument look and play as it does. Proportions are common practice among makers. */
interface Proportions {
  /** Half a wavelength (a quarter for reed pipes) over the bore. */
  lengthPerBore: number;
  /** Bore at the foot over bore at the head; 1 for a cylinder. */
  footShare: number;
  wallShare: number;
  /** Diameters of the holes over the bore at the head, from the mouth end. */
  holes: readonly number[];
  thumb: boolean;
  wavelengthShare: 0.5 | 0.25;
  /** What the mouth end adds to the air column, in bores. */
  mouthAdds: number;
  mouthEnd: (boreMm: number, wallMm: number) => MouthEnd;
  chart: (order: { lowestNote: string; holes: readonly ToneHole[] }) => Fingering[];
}

const tenth = (value: number) => Math.round(value * 10) / 10;

const windowOf = (boreMm: number, wallMm: number): MouthEnd => ({
  kind: 'window',
  widthMm: tenth(boreMm * 0.63),
  lengthMm: tenth(boreMm * 0.33),
  wallMm: tenth(Math.min(wallMm, boreMm * 0.2)),
  rampDeg: 20,
  correctionScale: 1,
});

const SIX_HOLES = [0.55, 0.67, 0.59, 0.51, 0.71, 0.47] as const;

const PROPORTIONS: Record<StarterKind, Proportions> = {
  whistle: {
    lengthPerBore: 22,
    footShare: 1,
    wallShare: 0.19,
    holes: SIX_HOLES,
    thumb: false,
    wavelengthShare: 0.5,
    mouthAdds: 1.5,
    mouthEnd: windowOf,
    chart: sixHoleChart,
  },
  flute: {
    lengthPerBore: 23.5,
    footShare: 0.84,
    wallShare: 0.24,
    holes: [0.5, 0.52, 0.44, 0.42, 0.52, 0.4],
    thumb: false,
    wavelengthShare: 0.5,
    mouthAdds: 2.2,
    mouthEnd: (boreMm) => ({
      kind: 'embouchure',
      lengthMm: tenth(boreMm * 0.53),
      widthMm: tenth(boreMm * 0.6),
      chimneyMm: tenth(boreMm * 0.24),
      undercut: null,
      lipCover: 0.35,
      lipAngleDeg: 90,
      stopperMm: tenth(boreMm),
      correctionScale: 1,
    }),
    chart: sixHoleChart,
  },
  'end-blown': {
    lengthPerBore: 22,
    footShare: 1,
    wallShare: 0.19,
    holes: SIX_HOLES,
    thumb: false,
    wavelengthShare: 0.5,
    mouthAdds: 1,
    mouthEnd: () => ({ kind: 'rim', cover: 0.5, correctionScale: 1 }),
    chart: sixHoleChart,
  },
  recorder: {
    lengthPerBore: 20.5,
    footShare: 0.84,
    wallShare: 0.27,
    holes: [0.4, 0.4, 0.38, 0.38, 0.36, 0.46, 0.32],
    thumb: true,
    wavelengthShare: 0.5,
    mouthAdds: 1.5,
    mouthEnd: windowOf,
    chart: recorderChart,
  },
  'reed-pipe': {
    lengthPerBore: 22,
    footShare: 1,
    wallShare: 0.25,
    holes: [0.3, 0.44, 0.4, 0.4, 0.36, 0.46, 0.4],
    thumb: true,
    wavelengthShare: 0.25,
    mouthAdds: 0.8,
    mouthEnd: (boreMm) => ({
      kind: 'reed',
      equivalentVolumeMm3: Math.round(0.6 * boreMm ** 3),
      correctionScale: 1,
    }),
    chart: reedPipeChart,
  },
};

/** Speed of sound good enough to lay out a first length, m/s. Dry air, linear in °C (common practice); the engine takes over from there. */
const roughSpeed = (temperatureC: number) => 331.3 + 0.606 * temperatureC;

const acousticLengthMm = (order: StarterOrder, note: string, share: number) =>
  (1000 * share * roughSpeed(order.air.temperatureC)) / noteFrequencyHz(note, order.pitch);

/** The bore that instruments of this kind and lowest note usually have, mm. A larger instrument is slimmer for its length. Common practice. */
export function usualBoreMm(order: Pick<StarterOrder, 'kind' | 'lowestNote' | 'pitch' | 'air'>): number {
  const { lengthPerBore, wavelengthShare } = PROPORTIONS[order.kind];
  const length = acousticLengthMm({ ...order, name: '' }, order.lowestNote, wavelengthShare);
  const reference = 290;
  return tenth((reference / lengthPerBore) * (length / reference) ** 0.6);
}

/**
 * A first instrument of a kind: sensible proportions, holes about where they belong, and its usual chart.
 *
 * Notes lie within about two semitones; `placeHoles` brings them to the scale.
 */
export function starterDocument(order: StarterOrder): DesignDocument {
  const proportions = PROPORTIONS[order.kind];
  const boreMm = order.boreMm ?? usualBoreMm(order);
  const wallMm = tenth(boreMm * proportions.wallShare);
  const mouthEnd = proportions.mouthEnd(boreMm, wallMm);
  const footMm = tenth(
    acousticLengthMm(order, order.lowestNote, proportions.wavelengthShare) -
      boreMm * (proportions.mouthAdds + 0.3),
  );
  const stations = boreStations(mouthEnd, boreMm, {
    footMm,
    footDiameterMm: tenth(boreMm * proportions.footShare),
  });
  const first = stations[0]?.positionMm ?? 0;
  const outsideMm = tenth(boreMm + 2 * wallMm);
  const document: DesignDocument = {
    format: 'borewright-design/1',
    name: order.name,
    pitch: order.pitch,
    air: order.air,
    mouthEnd,
    bore: { stations },
    outside: {
      stations: [
        { positionMm: first, diameterMm: outsideMm },
        { positionMm: footMm, diameterMm: outsideMm },
      ],
    },
    foot: { kind: 'open' },
    holes: [],
    fingerings: [],
  };
  const holes = firstHoles(proportions.holes, {
    footMm,
    boreMm,
    mouthAddsMm: proportions.mouthAdds * boreMm,
  });
  if (proportions.thumb) holes.push(thumbHole(holes));
  return { ...document, holes, fingerings: proportions.chart({ lowestNote: order.lowestNote, holes }) };
}

function boreStations(
  mouthEnd: MouthEnd,
  boreMm: number,
  foot: { footMm: number; footDiameterMm: number },
): Station[] {
  const first =
    mouthEnd.kind === 'window'
      ? -mouthEnd.lengthMm
      : mouthEnd.kind === 'embouchure'
        ? -mouthEnd.stopperMm
        : 0;
  const head = { positionMm: first, diameterMm: boreMm };
  const end = { positionMm: foot.footMm, diameterMm: foot.footDiameterMm };
  if (foot.footDiameterMm === boreMm) return [head, end];
  // The head stays straight for a quarter of the length: that is where tuning slides and sockets sit.
  return [head, { positionMm: tenth(foot.footMm * 0.27), diameterMm: boreMm }, end];
}

/** Semitones that opening one more hole from the foot raises the note by, for seven notes of a major scale. */
const SCALE_FROM_FOOT = [2, 4, 5, 7, 9, 11, 12] as const;

function firstHoles(
  shares: readonly number[],
  { footMm, boreMm, mouthAddsMm }: { footMm: number; boreMm: number; mouthAddsMm: number },
): ToneHole[] {
  const fullLength = footMm + mouthAddsMm;
  return shares.map((share, index) => {
    const semitones = SCALE_FROM_FOOT[shares.length - 1 - index] ?? 0;
    // A smaller hole acts as if the tube went on further below it, so it has to sit nearer the mouth end.
    const overhang = boreMm * (0.9 / share - 0.9) * 0.5;
    const positionMm = tenth(fullLength / 2 ** (semitones / 12) - mouthAddsMm - overhang);
    return {
      id: `h${index + 1}`,
      name: String(index + 1),
      positionMm,
      diameterMm: Math.round(share * boreMm * 2) / 2,
      angleDeg: 0,
      chimneyMm: null,
      undercut: null,
      cover: 'finger',
      hand: index < 3 ? 'left' : 'right',
    };
  });
}

function thumbHole(holes: readonly ToneHole[]): ToneHole {
  const [first, second] = holes;
  if (first === undefined || second === undefined)
    throw new RangeError('A thumb hole lies above the first finger hole.');
  const positionMm = tenth(first.positionMm - (second.positionMm - first.positionMm) * 0.6);
  return { ...first, id: 'thumb', name: 'T', positionMm, angleDeg: 180, cover: 'thumb' };
}
