import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Station } from '../document/design-document.ts';
import { aloneByMm, usualLimitMm } from './lone-readings.ts';

const every5 = (diameterAt: (positionMm: number) => number, count = 30): Station[] =>
  Array.from({ length: count }, (_, index) => ({ positionMm: index * 5, diameterMm: diameterAt(index * 5) }));

const withChange = (series: readonly Station[], index: number, byMm: number) =>
  series.map((reading, at) =>
    at === index ? { ...reading, diameterMm: reading.diameterMm + byMm } : reading,
  );

describe('aloneByMm', () => {
  const taper = fc.double({ min: -0.05, max: 0.05, noNaN: true });

  it('is nothing along a straight taper, ends included, however steep', () => {
    fc.assert(
      fc.property(taper, (slope) => {
        for (const by of aloneByMm(every5((mm) => 19 + slope * mm))) expect(Math.abs(by)).toBeLessThan(1e-9);
      }),
    );
  });

  it('says how far a single wrong reading lies from its neighbours, wherever it lies, and blames no other', () => {
    fc.assert(
      fc.property(
        taper,
        fc.nat(29),
        fc.double({ min: 0.1, max: 3, noNaN: true }),
        fc.boolean(),
        (slope, index, size, isWider) => {
          const byMm = isWider ? size : -size;
          const alone = aloneByMm(
            withChange(
              every5((mm) => 19 + slope * mm),
              index,
              byMm,
            ),
          );
          alone.forEach((by, at) => {
            if (at === index) expect(by).toBeCloseTo(byMm, 9);
            else expect(Math.abs(by)).toBeLessThan(1e-9);
          });
        },
      ),
    );
  });

  it('finds two wrong readings with one good one between them', () => {
    const series = withChange(
      withChange(
        every5(() => 12.7),
        10,
        0.3,
      ),
      12,
      0.3,
    );
    const found = aloneByMm(series).flatMap((by, index) => (Math.abs(by) > 0.05 ? [index] : []));
    expect(found).toEqual([10, 12]);
  });

  it.each([
    { name: 'a step', diameterAt: (mm: number) => (mm < 72 ? 12.7 : 11.9) },
    { name: 'a groove three readings long', diameterAt: (mm: number) => (mm > 68 && mm < 82 ? 13.1 : 12.7) },
    { name: 'a kink', diameterAt: (mm: number) => (mm < 75 ? 12.7 : 12.7 - (mm - 75) / 100) },
    { name: 'a flare at the foot', diameterAt: (mm: number) => (mm < 130 ? 12.7 : 12.7 + (mm - 130) / 100) },
  ])('takes $name for what it is', ({ diameterAt }) => {
    // The smallest limit there is.
    const limitMm = usualLimitMm([]);
    for (const by of aloneByMm(every5(diameterAt))) expect(Math.abs(by)).toBeLessThan(limitMm);
  });

  it('judges nobody by fewer than three neighbours', () => {
    expect(aloneByMm(every5((mm) => (mm === 5 ? 14 : 12.7), 3))).toEqual([0, 0, 0]);
  });
});

describe('usualLimitMm', () => {
  it('does not go below what a gauge repeats to', () => {
    expect(usualLimitMm([every5(() => 12.7)])).toBe(0.05);
    expect(usualLimitMm([])).toBe(0.05);
  });

  it('is little moved by a wrong reading', () => {
    const rough = every5((mm) => 12.7 + 0.04 * Math.sin(mm));
    const limit = usualLimitMm([rough]);
    expect(limit).toBeGreaterThan(0.05);
    expect(Math.abs(usualLimitMm([withChange(rough, 12, 5)]) - limit)).toBeLessThanOrEqual(0.03);
  });
});
