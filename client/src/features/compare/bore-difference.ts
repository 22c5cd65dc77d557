import type { DesignDocument, Station } from '#shared/document/design-document.ts';
import { diameterAt } from '#shared/document/profile.ts';

/** Both bores at one place, mm; null where one of them has ended. */
export interface BorePlace {
  positionMm: number;
  a: number | null;
  b: number | null;
  /** The second less the first; null where only one is there. */
  widerMm: number | null;
}

type Profile = Pick<DesignDocument, 'bore'>;

/** Both bores at every station of either, from the mouth end to the foot; places count along the second. */
export function borePlaces(a: Profile, b: Profile, offsetMm = 0): BorePlace[] {
  const shifted = a.bore.stations.map((station) => ({
    ...station,
    positionMm: station.positionMm + offsetMm,
  }));
  const positions = [...shifted, ...b.bore.stations].map(({ positionMm }) => positionMm);
  const apart = [...new Set(positions)]
    .sort((one, other) => one - other)
    .filter((positionMm, index, all) => index === 0 || positionMm - (all[index - 1] ?? 0) > 0.005);
  return apart.map((positionMm) => {
    const [ofA, ofB] = [widthAt(shifted, positionMm), widthAt(b.bore.stations, positionMm)];
    return { positionMm, a: ofA, b: ofB, widerMm: ofA === null || ofB === null ? null : ofB - ofA };
  });
}

function widthAt(stations: readonly Station[], positionMm: number): number | null {
  const [first, last] = [stations[0]?.positionMm ?? 0, stations.at(-1)?.positionMm ?? 0];
  return positionMm < first - 0.005 || positionMm > last + 0.005 ? null : diameterAt(stations, positionMm);
}

/** Where the second bore differs most from the first; null where they are one. Straight lines differ most at a station. */
export function furthestPlace(places: readonly BorePlace[]): (BorePlace & { widerMm: number }) | null {
  return places.reduce<(BorePlace & { widerMm: number }) | null>((furthest, place) => {
    const { widerMm } = place;
    if (widerMm === null || Math.abs(widerMm) < 0.005) return furthest;
    return furthest === null || Math.abs(widerMm) > Math.abs(furthest.widerMm)
      ? { ...place, widerMm }
      : furthest;
  }, null);
}
