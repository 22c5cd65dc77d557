import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Station } from '../document/design-document.ts';
import { diameterAt } from '../document/profile.ts';
import { thinStations } from './thin-stations.ts';

const stationsOf = (diametersMm: readonly number[]): Station[] =>
  diametersMm.map((diameterMm, index) => ({ positionMm: index * 5, diameterMm }));

const hundredths = fc.integer({ min: 1250, max: 1300 }).map((value) => value / 100);
const within = fc.integer({ min: 0, max: 12 }).map((value) => value / 100);

const isNear = (kept: readonly Station[], places: readonly Station[], withinMm: number) =>
  places.every(
    ({ positionMm, diameterMm }) => Math.abs(diameterAt(kept, positionMm) - diameterMm) <= withinMm + 1e-8,
  );

/** Every choice of inner places, fewest first: slow, and surely right. */
function fewestByTrying(places: readonly Station[], withinMm: number): number {
  const inner = places.slice(1, -1);
  let fewest = places.length;
  for (let choice = 0; choice < 2 ** inner.length; choice += 1) {
    const kept = places.filter(
      (_, index) => index === 0 || index === places.length - 1 || (choice >> (index - 1)) % 2 === 1,
    );
    if (kept.length < fewest && isNear(kept, places, withinMm)) fewest = kept.length;
  }
  return fewest;
}

describe('thinStations', () => {
  it('leaves every place within the tolerance of the line, and keeps both ends', () => {
    fc.assert(
      fc.property(fc.array(hundredths, { minLength: 2, maxLength: 80 }), within, (diameters, withinMm) => {
        const places = stationsOf(diameters);
        const kept = thinStations(places, withinMm);
        expect(isNear(kept, places, withinMm)).toBe(true);
        expect(kept[0]).toEqual(places[0]);
        expect(kept.at(-1)).toEqual(places.at(-1));
        expect(kept.every((station) => places.includes(station))).toBe(true);
      }),
    );
  });

  it('keeps no more stations than the best choice does', () => {
    fc.assert(
      fc.property(fc.array(hundredths, { minLength: 2, maxLength: 10 }), within, (diameters, withinMm) => {
        const places = stationsOf(diameters);
        expect(thinStations(places, withinMm)).toHaveLength(fewestByTrying(places, withinMm));
      }),
    );
  });

  it('needs no more stations when more is allowed', () => {
    fc.assert(
      fc.property(
        fc.array(hundredths, { minLength: 2, maxLength: 60 }),
        within,
        within,
        (diameters, one, other) => {
          const places = stationsOf(diameters);
          const [less, more] = [Math.min(one, other), Math.max(one, other)];
          expect(thinStations(places, more).length).toBeLessThanOrEqual(thinStations(places, less).length);
        },
      ),
    );
  });

  it('finds the corners of a bore made of straight lines', () => {
    const corners: Station[] = [
      { positionMm: 0, diameterMm: 12.7 },
      { positionMm: 90, diameterMm: 12.7 },
      { positionMm: 130, diameterMm: 12.5 },
      { positionMm: 265, diameterMm: 12.7 },
    ];
    const places = Array.from({ length: 54 }, (_, index) => ({
      positionMm: index * 5,
      diameterMm: diameterAt(corners, index * 5),
    }));
    expect(thinStations(places, 0.001)).toEqual(corners);
  });

  it('of equally few takes those that lie nearest to the readings', () => {
    // One inner station is needed; at 10 the line passes both others exactly.
    const places = stationsOf([12.5, 12.55, 12.6, 12.55, 12.5]);
    expect(thinStations(places, 0.06)).toEqual([places[0], places[2], places[4]]);
  });

  it.each([
    { name: 'nothing', places: [] },
    { name: 'one place', places: stationsOf([12.7]) },
    { name: 'two places', places: stationsOf([12.7, 12.6]) },
  ])('leaves $name as it is', ({ places }) => {
    expect(thinStations(places, 0.02)).toEqual(places);
  });
});
