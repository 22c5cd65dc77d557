import type { DesignDocument, MouthEnd, Station } from '#shared/document/design-document.ts';
import { boreEnds, diameterAt } from '#shared/document/profile.ts';

export type ProfilePart = 'bore' | 'outside';

/** A micrometre is finer than anything reamed; it keeps 0.30000000000000004 out of the document. */
const tidy = (mm: number) => Math.round(mm * 1000) / 1000;

export function changeStation(
  document: DesignDocument,
  part: ProfilePart,
  index: number,
  change: Partial<Station>,
): DesignDocument {
  const { stations } = document[part];
  const station = stations[index];
  if (station === undefined) return document;
  return withStations(document, part, stations.with(index, { ...station, ...change }));
}

/** Moves a station, no further than its neighbours: stations never cross. */
export function moveStation(
  document: DesignDocument,
  part: ProfilePart,
  index: number,
  to: Station,
): DesignDocument {
  const { stations } = document[part];
  const least = stations[index - 1]?.positionMm ?? -Infinity;
  const most = stations[index + 1]?.positionMm ?? Infinity;
  return changeStation(document, part, index, {
    positionMm: tidy(Math.min(most, Math.max(least, to.positionMm))),
    diameterMm: tidy(Math.max(0.1, to.diameterMm)),
  });
}

/** A new station on the line between the chosen one and the next: the shape stays until it is moved. */
export function splitSpan(
  document: DesignDocument,
  part: ProfilePart,
  index: number,
): { document: DesignDocument; index: number } {
  const { stations } = document[part];
  const from = Math.min(index, stations.length - 2);
  const [before, after] = [stations[from], stations[from + 1]];
  if (before === undefined || after === undefined) return { document, index };
  const positionMm = tidy((before.positionMm + after.positionMm) / 2);
  const station = { positionMm, diameterMm: tidy((before.diameterMm + after.diameterMm) / 2) };
  return {
    document: withStations(document, part, stations.toSpliced(from + 1, 0, station)),
    index: from + 1,
  };
}

/** The longest span is where a station is missed most. */
export function longestSpan(stations: readonly Station[]): number {
  const lengths = stations
    .slice(1)
    .map(({ positionMm }, index) => positionMm - (stations[index]?.positionMm ?? 0));
  return lengths.indexOf(Math.max(...lengths));
}

/** A profile keeps its two ends: without them it has no length. */
export function removeStation(document: DesignDocument, part: ProfilePart, index: number): DesignDocument {
  const { stations } = document[part];
  if (stations.length <= 2) return document;
  return withStations(document, part, stations.toSpliced(index, 1));
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

function withStations(document: DesignDocument, part: ProfilePart, stations: Station[]): DesignDocument {
  return { ...document, [part]: { stations } };
}

/** Sizes that a mouth end of each kind starts with on a bore of this width; common practice for a first drawing. */
export function usualMouthEnd(kind: MouthEnd['kind'], boreMm: number): MouthEnd {
  const correctionScale = 1;
  const share = (part: number) => Math.round(boreMm * part * 10) / 10;
  switch (kind) {
    case 'window':
      return { kind, widthMm: share(0.7), lengthMm: share(0.35), wallMm: 1.2, rampDeg: 20, correctionScale };
    case 'embouchure':
      return {
        kind,
        lengthMm: 10,
        widthMm: 11.5,
        chimneyMm: 4.5,
        undercut: null,
        lipCover: 0.35,
        lipAngleDeg: 100,
        stopperMm: boreMm,
        correctionScale,
      };
    case 'rim':
      return { kind, cover: 0.4, correctionScale };
    case 'reed':
      return { kind, equivalentVolumeMm3: Math.round(boreMm ** 3 / 4), correctionScale };
    case 'ideal-open':
    case 'ideal-closed':
      return { kind, correctionScale };
  }
}
