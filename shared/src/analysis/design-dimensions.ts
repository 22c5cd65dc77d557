import type { Touched } from '../acoustics/response/touched-parts.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { boreEnds, chimneyMm } from '../document/profile.ts';

/** A dimension of a design that a note may depend on. */
export interface Dimension {
  /** Document path, for example `holes.2.diameterMm`. */
  key: string;
  value: number;
  /** The document with the dimension changed to a value. */
  at: (value: number) => DesignDocument;
  touched: Touched;
}

const MOUTH_DIMENSIONS = [
  'lengthMm',
  'widthMm',
  'chimneyMm',
  'lipCover',
  'lipAngleDeg',
  'stopperMm',
  'wallMm',
  'rampDeg',
  'cover',
  'equivalentVolumeMm3',
  'correctionScale',
] as const;

/** Every dimension of a design, holes first. */
export function designDimensions(document: DesignDocument): Dimension[] {
  const order = document.holes
    .map((hole, index) => ({ index, positionMm: hole.positionMm }))
    .sort((a, b) => a.positionMm - b.positionMm)
    .map(({ index }) => index);
  return [
    ...document.holes.flatMap((_, index) => holeDimensions(document, index, order.indexOf(index))),
    ...document.bore.stations.map((_, index) => stationDimension(document, index)),
    footDimension(document),
    ...mouthDimensions(document),
    {
      key: 'air.temperatureC',
      value: document.air.temperatureC,
      at: (temperatureC) => ({ ...document, air: { ...document.air, temperatureC } }),
      touched: everything(document),
    },
  ];
}

function everything(document: DesignDocument): Touched {
  return {
    segments: [...document.holes.keys(), document.holes.length],
    holes: [...document.holes.keys()],
    mouth: true,
    foot: true,
  };
}

type Hole = DesignDocument['holes'][number];

function holeDimensions(document: DesignDocument, index: number, place: number): Dimension[] {
  const hole = document.holes[index];
  if (hole === undefined) return [];
  const branch: Touched = { segments: [], holes: [place], mouth: false, foot: false };
  const dimension = (key: string, value: number, change: (value: number) => Partial<Hole>): Dimension => ({
    key: `holes.${index}.${key}`,
    value,
    at: (to) => ({ ...document, holes: document.holes.with(index, { ...hole, ...change(to) }) }),
    touched: key === 'positionMm' ? { ...branch, segments: [place, place + 1] } : branch,
  });
  const { undercut } = hole;
  return [
    dimension('positionMm', hole.positionMm, (positionMm) => ({ positionMm })),
    dimension('diameterMm', hole.diameterMm, (diameterMm) => ({ diameterMm })),
    dimension('chimneyMm', chimneyMm(document, hole), (value) => ({ chimneyMm: value })),
    ...(undercut === null
      ? []
      : [
          dimension('undercut.innerDiameterMm', undercut.innerDiameterMm, (innerDiameterMm) => ({
            undercut: { ...undercut, innerDiameterMm },
          })),
          dimension('undercut.depthMm', undercut.depthMm, (depthMm) => ({
            undercut: { ...undercut, depthMm },
          })),
        ]),
  ];
}

/** What lies between two positions of the bore, holes taken in order. */
function touchedBetween(document: DesignDocument, fromMm: number, toMm: number): Touched {
  const { mouthMm, footMm } = boreEnds(document);
  const positions = document.holes.map((hole) => hole.positionMm).sort((a, b) => a - b);
  const ends = [-Infinity, ...positions, Infinity];
  return {
    segments: ends
      .slice(1)
      .map((to, i) => ({ i, overlaps: to >= fromMm && (ends[i] ?? to) <= toMm }))
      .filter(({ overlaps }) => overlaps)
      .map(({ i }) => i),
    holes: positions
      .map((positionMm, i) => ({ i, inside: positionMm >= fromMm && positionMm <= toMm }))
      .filter(({ inside }) => inside)
      .map(({ i }) => i),
    // The stopper's cavity reaches before the mouth, and the mouth looks in at 0 or before.
    mouth: fromMm <= Math.max(mouthMm, 0),
    foot: toMm >= footMm,
  };
}

function stationDimension(document: DesignDocument, index: number): Dimension {
  const { stations } = document.bore;
  const near = stations.slice(Math.max(index - 1, 0), index + 2).map((station) => station.positionMm);
  return {
    key: `bore.stations.${index}.diameterMm`,
    value: stations[index]?.diameterMm ?? NaN,
    at: (diameterMm) => withStation(document, index, { diameterMm }),
    touched: touchedBetween(document, Math.min(...near), Math.max(...near)),
  };
}

function withStation(
  document: DesignDocument,
  index: number,
  change: Partial<DesignDocument['bore']['stations'][number]>,
): DesignDocument {
  const { stations } = document.bore;
  const station = stations[index];
  if (station === undefined) return document;
  return { ...document, bore: { stations: stations.with(index, { ...station, ...change }) } };
}

function footDimension(document: DesignDocument): Dimension {
  const { stations } = document.bore;
  const last = stations.length - 1;
  const { footMm } = boreEnds(document);
  return {
    key: 'foot.positionMm',
    value: footMm,
    at: (positionMm) => withStation(document, last, { positionMm }),
    touched: touchedBetween(document, stations[last - 1]?.positionMm ?? 0, footMm),
  };
}

function mouthDimensions(document: DesignDocument): Dimension[] {
  const end: Record<string, unknown> = document.mouthEnd;
  const inputOnly: Touched = { segments: [], holes: [], mouth: true, foot: false };
  return MOUTH_DIMENSIONS.flatMap((key): Dimension[] => {
    const value = end[key];
    if (typeof value !== 'number' || document.mouthEnd.kind.startsWith('ideal')) return [];
    const changed = (to: number): DesignDocument => ({
      ...document,
      mouthEnd: { ...document.mouthEnd, [key]: to },
    });
    if (key === 'lengthMm' && document.mouthEnd.kind === 'window') {
      // The bore begins at the block face: a longer window moves it.
      const at = (to: number) => withStation(changed(to), 0, { positionMm: -to });
      const second = document.bore.stations[1]?.positionMm ?? 0;
      const touched = { ...touchedBetween(document, -value, second), mouth: true };
      return [{ key: `mouthEnd.${key}`, value, at, touched }];
    }
    return [{ key: `mouthEnd.${key}`, value, at: changed, touched: inputOnly }];
  });
}
