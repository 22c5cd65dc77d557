import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ruleTicks } from './rule-ticks.ts';

describe('ruleTicks', () => {
  it('marks every millimetre and figures every ten where there is room', () => {
    const ticks = ruleTicks(25, 4.5, 'mm');
    expect(ticks.map((tick) => tick.mm)).toEqual(Array.from({ length: 26 }, (_, mm) => mm));
    expect(ticks.filter((tick) => tick.figure !== null).map((tick) => tick.figure)).toEqual([
      '0',
      '10',
      '20',
    ]);
  });

  it('divides an inch in sixteenths and figures every half', () => {
    const ticks = ruleTicks(25.4, 4.5, 'inch');
    expect(ticks).toHaveLength(17);
    expect(ticks.filter((tick) => tick.figure !== null).map((tick) => tick.figure)).toEqual(['0', '½', '1']);
  });

  it.each(['mm', 'inch'] as const)('keeps figures 32 px apart and ticks inside the rule in %s', (unit) => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 3000, noNaN: true }),
        fc.double({ min: 0.15, max: 30, noNaN: true }),
        (lengthMm, pxPerMm) => {
          const ticks = ruleTicks(lengthMm, pxPerMm, unit);
          const figures = ticks.filter((tick) => tick.figure !== null);
          figures.slice(1).forEach((tick, index) => {
            expect((tick.mm - figures[index]!.mm) * pxPerMm).toBeGreaterThanOrEqual(32 - 1e-6);
          });
          expect(ticks[0]?.mm).toBe(0);
          expect(ticks.at(-1)!.mm).toBeLessThanOrEqual(lengthMm + 1e-6);
        },
      ),
    );
  });
});
