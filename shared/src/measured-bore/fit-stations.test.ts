import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { documentFaults } from '../document/document-faults.ts';
import { diameterAt } from '../document/profile.ts';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { fitStations, type FitChoices } from './fit-stations.ts';
import type { BoreReading } from './read-measured-bore.ts';

const drawn = whistleDocument();
const [MOUTH_MM, FOOT_MM] = [-4.4, 265];
const usual: FitChoices = { limitMm: null, withinMm: 0.02, combination: 'mean', beyond: null, restored: [] };

const reading = (positionMm: number, diameterMm: number, column = 1): BoreReading => ({
  row: Math.round(positionMm * 10),
  column,
  key: `${Math.round(positionMm * 10)}:${column}`,
  distanceMm: positionMm,
  positionMm,
  diameterMm,
});

const along = (from: number, to: number, diameterOf: (mm: number) => number, column = 1) =>
  Array.from({ length: Math.floor((to - from) / 5) + 1 }, (_, index) =>
    reading(from + index * 5, diameterOf(from + index * 5), column),
  );

const fit = (readings: readonly BoreReading[], choices: Partial<FitChoices> = {}) =>
  fitStations(
    readings.toSorted((a, b) => a.positionMm - b.positionMm),
    drawn,
    { ...usual, ...choices },
  );

describe('fitStations', () => {
  it('makes a bore from end to end of the drawn one that a design can have, with every place within the tolerance', () => {
    const place = fc.tuple(fc.integer({ min: -20, max: 290 }), fc.integer({ min: 1240, max: 1300 }));
    fc.assert(
      fc.property(
        fc.uniqueArray(place, { minLength: 2, maxLength: 60, selector: ([mm]) => mm }),
        fc.constantFrom('held' as const, 'drawn' as const, null),
        (places, beyond) => {
          const fitted = fit(
            places.map(([mm, width]) => reading(mm, width / 100)),
            { beyond, limitMm: 1, withinMm: 0.05 },
          );
          if (fitted.refusal !== null) return;
          const bore = { stations: fitted.stations };
          expect(bore.stations[0]!.positionMm).toBe(MOUTH_MM);
          expect(bore.stations.at(-1)!.positionMm).toBe(FOOT_MM);
          expect(documentFaults({ ...drawn, bore, holes: [], fingerings: [] })).toEqual([]);
          for (const { positionMm, diameterMm } of fitted.places) {
            // At a step to the drawn bore the place is the end of the measured side.
            const isStep = bore.stations.filter((station) => station.positionMm === positionMm).length > 1;
            if (positionMm < MOUTH_MM || positionMm > FOOT_MM || isStep) continue;
            expect(Math.abs(diameterAt(bore.stations, positionMm) - diameterMm)).toBeLessThan(0.0511);
          }
        },
      ),
    );
  });

  it('leaves out a reading that stands alone, in its own gauge direction, and takes it back when told', () => {
    const readings = [...along(0, 260, () => 12.7), ...along(0, 260, () => 12.72, 2)];
    const slipped = readings.map((each) => (each.key === '1200:2' ? { ...each, diameterMm: 12.9 } : each));
    const fitted = fit(slipped, { limitMm: 0.08 });
    expect(fitted.leftOut.map(({ key, aloneByMm }) => [key, Math.round(aloneByMm * 100) / 100])).toEqual([
      ['1200:2', 0.18],
    ]);
    expect(fitted.places.find(({ positionMm }) => positionMm === 120)?.diameterMm).toBe(12.7);
    const restored = fit(slipped, { limitMm: 0.08, restored: ['1200:2'] });
    expect(restored.leftOut).toEqual([]);
    expect(restored.places.find(({ positionMm }) => positionMm === 120)?.diameterMm).toBe(12.8);
  });

  it.each([
    ['mean', 12.71],
    ['widest', 12.72],
    ['narrowest', 12.7],
  ] as const)('takes the %s of what was measured at one place', (combination, diameterMm) => {
    const fitted = fit([...along(0, 265, () => 12.7), ...along(0, 265, () => 12.72, 2)], { combination });
    expect(fitted.places.every((each) => each.diameterMm === diameterMm)).toBe(true);
    expect(fitted.outOfRound?.mostMm).toBeCloseTo(0.02, 9);
  });

  it('does not judge roundness where each place was measured once', () => {
    expect(fit(along(0, 265, () => 12.7)).outOfRound).toBeNull();
  });

  it('holds the last reading over a short end, and keeps the drawn bore over a long one', () => {
    const short = fit(along(0, 260, () => 12.5));
    expect(short.beyond).toBe('held');
    expect(short.stations).toEqual([
      { positionMm: MOUTH_MM, diameterMm: 12.5 },
      { positionMm: FOOT_MM, diameterMm: 12.5 },
    ]);
    const long = fit(along(100, 200, () => 12.5));
    expect(long.beyond).toBe('drawn');
    expect(long.gaps).toEqual([
      { end: 'mouth', lengthMm: 104.4 },
      { end: 'foot', lengthMm: 65 },
    ]);
    expect(long.stations).toEqual([
      { positionMm: MOUTH_MM, diameterMm: 12.7 },
      { positionMm: 100, diameterMm: 12.7 },
      { positionMm: 100, diameterMm: 12.5 },
      { positionMm: 200, diameterMm: 12.5 },
      { positionMm: 200, diameterMm: 12.7 },
      { positionMm: FOOT_MM, diameterMm: 12.7 },
    ]);
  });

  it('lets readings beyond an end say how wide the end itself is', () => {
    const fitted = fit([reading(-9.4, 12.6), reading(0.6, 12.8), reading(130, 12.8), reading(270, 12.8)]);
    expect(fitted.stations[0]).toEqual({ positionMm: MOUTH_MM, diameterMm: 12.7 });
    expect(fitted.outside.map(({ positionMm }) => positionMm)).toEqual([-9.4, 270]);
    expect(fitted.gaps).toEqual([]);
  });

  it('refuses readings that lie elsewhere, and more stations than a bore has', () => {
    expect(fit(along(300, 400, () => 12.7)).refusal).toMatch(/Fewer than two readings/);
    const rough = Array.from({ length: 500 }, (_, index) =>
      reading(index / 2, index % 2 === 0 ? 12.5 : 12.9),
    );
    expect(fit(rough, { limitMm: 1 }).refusal).toMatch(/stations would be needed; a bore has 400 at most/);
  });
});
