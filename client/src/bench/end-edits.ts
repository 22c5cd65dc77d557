import type { DesignDocument, MouthEnd, Station } from '#shared/document/design-document.ts';
import { boreEnds, diameterAt } from '#shared/document/profile.ts';

export type ProfilePart = 'bore' | 'outside';

/** A micrometre is finer than anything reamed; it keeps 0.30000000000000004 out of the document. */
export const tidy = (mm: number) => Math.round(mm * 1000) / 1000;

/** Bore left between an end and the nearest hole when an end is moved, mm. */
const LEAST_LEFT_MM = 1;

export function withStations(
  document: DesignDocument,
  part: ProfilePart,
  stations: Station[],
): DesignDocument {
  return { ...document, [part]: { stations } };
}

/**
 * Cuts the pipe to another length at the foot, bore and outside together; holes stay where they are.
 *
 * Stations beyond the new foot go; a station in between keeps its place.
 */
export function moveFoot(document: DesignDocument, positionMm: number): DesignDocument {
  return (['bore', 'outside'] as const).reduce((changed, part) => {
    const { stations } = changed[part];
    const kept = stations.slice(0, -1).filter((station) => station.positionMm < positionMm);
    const first = stations[0];
    const last = stations.at(-1);
    if (first === undefined || last === undefined || kept.length === 0) return changed;
    const isLonger = positionMm >= last.positionMm;
    const diameterMm = isLonger ? last.diameterMm : tidy(diameterAt(stations, positionMm));
    return withStations(changed, part, [...kept, { positionMm: tidy(positionMm), diameterMm }]);
  }, document);
}

/** Moves the foot by so much; stops clear of the lowest hole. */
export function trimFoot(document: DesignDocument, byMm: number): DesignDocument {
  return moveFoot(document, Math.max(shortestFootMm(document), boreEnds(document).footMm + byMm));
}

/** Nearest to the mouth end that the foot may come: clear of the lowest hole. */
function shortestFootMm({ holes }: DesignDocument): number {
  return Math.max(10, ...holes.map((hole) => hole.positionMm + hole.diameterMm / 2 + LEAST_LEFT_MM));
}

/**
 * Moves window, embouchure hole, rim or seat along the instrument; foot, holes and bore stay where they are on the tube.
 *
 * Positions count from the mouth end, so it is all the others that change.
 *
 * @param byMm - toward the foot; stops clear of the highest hole
 */
export function moveMouthEnd(document: DesignDocument, byMm: number): DesignDocument {
  const highest = Math.min(
    boreEnds(document).footMm,
    ...document.holes.map((hole) => hole.positionMm - hole.diameterMm / 2),
  );
  const by = tidy(Math.min(byMm, highest - LEAST_LEFT_MM));
  const { mouthEnd, bore, outside } = document;
  return {
    ...document,
    bore: { stations: cutAnew(bore.stations, by) },
    // The beak over the block of a window is shaped about the window and goes with it.
    outside: {
      stations: mouthEnd.kind === 'window' ? withHead(outside.stations, by) : cutAnew(outside.stations, by),
    },
    holes: document.holes.map((hole) => ({ ...hole, positionMm: tidy(hole.positionMm - by) })),
  };
}

/** The profile counted from a mouth end further on by so much; it begins as far behind the mouth end as before. */
function cutAnew(stations: readonly Station[], by: number): Station[] {
  const startMm = stations[0]?.positionMm ?? 0;
  const counted = stations.map((station) => ({ ...station, positionMm: tidy(station.positionMm - by) }));
  const rest = counted.slice(1).filter(({ positionMm }) => positionMm > startMm);
  return [{ positionMm: startMm, diameterMm: tidy(diameterAt(counted, startMm)) }, ...rest];
}

function withHead(stations: readonly Station[], by: number): Station[] {
  const head = stations.filter(({ positionMm }) => positionMm <= 0);
  const rest = stations.filter(({ positionMm }) => positionMm > Math.max(0, by));
  return [...head, ...rest.map((station) => ({ ...station, positionMm: tidy(station.positionMm - by) }))];
}

/** Moves the stopper behind an embouchure hole, and the bore's beginning with it; no nearer than the hole's own edge. */
export function moveStopper(document: DesignDocument, stopperMm: number): DesignDocument {
  const { mouthEnd } = document;
  if (mouthEnd.kind !== 'embouchure') return document;
  const inner = Math.max(mouthEnd.lengthMm, mouthEnd.undercut?.innerDiameterMm ?? 0);
  const least = inner / 2 + LEAST_LEFT_MM;
  return withMouthEnd(document, { ...mouthEnd, stopperMm: tidy(Math.max(least, stopperMm)) });
}

/**
 * Puts another mouth end on, or changes its sizes, and lets the bore begin where that mouth end says: at the block face
 * behind a window, at the stopper behind an embouchure hole, else at 0. Bore and outside move their first station alike.
 */
export function withMouthEnd(document: DesignDocument, mouthEnd: MouthEnd): DesignDocument {
  const startMm = boreStartMm(mouthEnd);
  const changed = { ...document, mouthEnd };
  return boreEnds(document).mouthMm === startMm ? changed : withBoreStart(changed, startMm);
}

function boreStartMm(mouthEnd: MouthEnd): number {
  switch (mouthEnd.kind) {
    case 'window':
      return -tidy(mouthEnd.lengthMm);
    case 'embouchure':
      return -tidy(mouthEnd.stopperMm);
    default:
      return 0;
  }
}

function withBoreStart(document: DesignDocument, startMm: number): DesignDocument {
  const before = boreEnds(document).mouthMm;
  const bore = startedAt(document.bore.stations, startMm);
  const { stations: outside } = document.outside;
  // An outside that reaches beyond the bore, over a block or a cap, is left alone while it still covers the bore.
  const outsideStart = outside[0]?.positionMm ?? startMm;
  const movesOutside = Math.abs(outsideStart - before) < 0.05 || outsideStart > startMm;
  return {
    ...document,
    bore: { stations: bore },
    outside: movesOutside ? { stations: startedAt(outside, startMm) } : document.outside,
  };
}

function startedAt(stations: readonly Station[], startMm: number): Station[] {
  const rest = stations.slice(1).filter(({ positionMm }) => positionMm > startMm);
  const first = stations[0];
  if (first === undefined) return [...stations];
  const diameterMm = startMm < first.positionMm ? first.diameterMm : tidy(diameterAt(stations, startMm));
  return [{ positionMm: startMm, diameterMm }, ...rest];
}
