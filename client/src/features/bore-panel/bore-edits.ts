import type { DesignDocument, Station } from '#shared/document/design-document.ts';
import { tidy, withStations, type ProfilePart } from '../../bench/end-edits.ts';

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
