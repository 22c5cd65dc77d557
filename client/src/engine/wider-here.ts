import { predictDesign } from '#shared/analysis/predict-design.ts';
import type { DesignDocument, Station } from '#shared/document/design-document.ts';
import { boreEnds, diameterAt } from '#shared/document/profile.ts';
import { centsBetween } from '#shared/music/cents.ts';

/** What widening the bore in one place does to one note. */
export interface WiderHere {
  fingering: string;
  points: { positionMm: number; cents: number }[];
}

/** Length and depth of the place that is widened, mm: what one pass with a scraper takes out. */
export const WIDER_OVER_MM = 10;
export const WIDER_BY_MM = 0.1;

const PLACES = 48;

/** Cents by which notes move when the bore is a little wider over a short stretch, all along the bore. */
export function widerHere(document: DesignDocument, fingerings: readonly string[]): WiderHere[] {
  const asked = { ...document, fingerings: document.fingerings.filter(({ id }) => fingerings.includes(id)) };
  const frequencies = (of: DesignDocument) =>
    new Map(predictDesign(of, { modes: 1 }).fingerings.map(({ id, frequencyHz }) => [id, frequencyHz]));
  const before = frequencies(asked);
  const places = placesAlong(document).map((positionMm) => ({
    positionMm,
    after: frequencies({ ...asked, bore: { stations: widenedAt(document.bore.stations, positionMm) } }),
  }));
  return asked.fingerings.map(({ id }) => ({
    fingering: id,
    points: places.flatMap(({ positionMm, after }) => {
      const [was, is] = [before.get(id), after.get(id)];
      return typeof was === 'number' && typeof is === 'number'
        ? [{ positionMm, cents: centsBetween(is, was) }]
        : [];
    }),
  }));
}

function placesAlong(document: DesignDocument): number[] {
  const { mouthMm, footMm } = boreEnds(document);
  const from = mouthMm + WIDER_OVER_MM / 2 + 0.01;
  const to = footMm - WIDER_OVER_MM / 2 - 0.01;
  if (to <= from) return [];
  return Array.from({ length: PLACES }, (_, index) => from + ((to - from) * index) / (PLACES - 1));
}

/** The bore with a stretch widened throughout: a step up, the old shape above itself, a step down. */
export function widenedAt(stations: readonly Station[], middleMm: number): Station[] {
  const [from, to] = [middleMm - WIDER_OVER_MM / 2, middleMm + WIDER_OVER_MM / 2];
  const inside = stations.filter(({ positionMm }) => positionMm > from && positionMm < to);
  const edge = (positionMm: number): Station => ({
    positionMm,
    diameterMm: diameterAt(stations, positionMm),
  });
  const wider = ({ positionMm, diameterMm }: Station): Station => ({
    positionMm,
    diameterMm: diameterMm + WIDER_BY_MM,
  });
  return [
    ...stations.filter(({ positionMm }) => positionMm < from),
    edge(from),
    ...[edge(from), ...inside, edge(to)].map(wider),
    edge(to),
    ...stations.filter(({ positionMm }) => positionMm > to),
  ];
}
