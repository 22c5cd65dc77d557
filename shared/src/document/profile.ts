import type { DesignDocument, Station, ToneHole } from './design-document.ts';

/**
 * Diameter of a profile at a position; straight lines between stations, ends held.
 *
 * At a step (two stations at one position) the diameter on the foot side is meant.
 */
export function diameterAt(stations: readonly Station[], positionMm: number): number {
  const first = stations[0];
  const last = stations.at(-1);
  if (first === undefined || last === undefined) throw new RangeError('A profile has at least one station.');
  if (positionMm < first.positionMm) return first.diameterMm;
  for (let i = 1; i < stations.length; i += 1) {
    const a = stations[i - 1];
    const b = stations[i];
    if (a !== undefined && b !== undefined && positionMm < b.positionMm) {
      const share = (positionMm - a.positionMm) / (b.positionMm - a.positionMm);
      return a.diameterMm + share * (b.diameterMm - a.diameterMm);
    }
  }
  return last.diameterMm;
}

export function boreEnds(document: Pick<DesignDocument, 'bore'>): { mouthMm: number; footMm: number } {
  const { stations } = document.bore;
  return { mouthMm: stations[0]?.positionMm ?? 0, footMm: stations.at(-1)?.positionMm ?? 0 };
}

/** Height of the chimney, mm: as typed, else half of outside less bore at the hole. */
export function chimneyMm(document: Pick<DesignDocument, 'bore' | 'outside'>, hole: ToneHole): number {
  if (hole.chimneyMm !== null) return hole.chimneyMm;
  return (
    (diameterAt(document.outside.stations, hole.positionMm) -
      diameterAt(document.bore.stations, hole.positionMm)) /
    2
  );
}

/** Bench practice measures from the foot; the document stores from the mouth end. */
export function fromFootMm(document: Pick<DesignDocument, 'bore'>, positionMm: number): number {
  return boreEnds(document).footMm - positionMm;
}
