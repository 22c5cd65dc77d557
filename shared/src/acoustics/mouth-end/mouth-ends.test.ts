import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EngineInputError } from '../engine-input-error.ts';
import { embouchureRadius, lipLength } from './embouchure.ts';
import { missingConeVolume, reedSusceptance } from './reed.ts';
import { rimEnd, rimImpedance } from './rim.ts';
import { windowEnd, windowImpedance } from './window.ts';

const out = new Float64Array(4);
const whistle = { boreRadius: 6e-3, width: 7.5e-3, length: 3.5e-3, wall: 1e-3, ramp: 0.35 };

describe('window', () => {
  it('takes power, and its length grows without a jump with frequency', () => {
    const end = windowEnd(whistle);
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 600, noNaN: true }), (k) => {
        windowImpedance(end, k, out, 0);
        windowImpedance(end, k * (1 + 1e-7), out, 2);
        expect(out[0]).toBeGreaterThan(0);
        expect(out[3]).toBeGreaterThan(out[1]!);
        expect(out[3]! - out[1]!).toBeLessThan(1e-4);
      }),
    );
  });

  it('has its length scaled by calibration, its resistance not', () => {
    windowImpedance(windowEnd(whistle), 30, out, 0);
    windowImpedance(windowEnd(whistle, 1.1), 30, out, 2);
    expect(out[2]).toBe(out[0]);
    expect(out[3]).toBeCloseTo(1.1 * out[1]!, 12);
  });

  it('is shorter the longer and wider it is', () => {
    const length = (changed: Partial<typeof whistle>) => windowEnd({ ...whistle, ...changed }).staticLength;
    expect(length({ length: 4e-3 })).toBeLessThan(length({}));
    expect(length({ width: 8e-3 })).toBeLessThan(length({}));
    expect(length({ wall: 2e-3 })).toBeGreaterThan(length({}));
  });

  it.each([
    ['width', { width: 12e-3 }],
    ['width', { width: 11.9e-3, length: 40e-3 }],
    ['length', { length: 0 }],
    ['ramp', { ramp: Math.PI / 2 }],
    ['boreRadius', { boreRadius: Number.NaN }],
  ])('refuses a wrong %s', (field, wrong) => {
    expect(() => windowEnd({ ...whistle, ...wrong })).toThrow(expect.objectContaining({ field }));
  });
});

describe('embouchure', () => {
  const lips = { fraction: 0.35, angle: 1.6, holeRadius: 5e-3, outerRadius: 13e-3 };

  it('has the radius of the circle of the same area', () => {
    expect(embouchureRadius(10e-3, 10e-3)).toBeCloseTo(5e-3, 12);
    expect(embouchureRadius(12.1e-3, 10e-3)).toBeCloseTo(5.5e-3, 12);
    expect(() => embouchureRadius(0, 10e-3)).toThrow(EngineInputError);
  });

  it('grows longer and without a jump as the lips cover more', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 0.88, noNaN: true }), (fraction) => {
        const less = lipLength({ ...lips, fraction });
        const more = lipLength({ ...lips, fraction: fraction + 0.01 });
        expect(more).toBeGreaterThan(less);
        expect(more - less).toBeLessThan(lips.holeRadius);
      }),
    );
  });

  it('grows longer as the lips lean over the hole', () => {
    expect(lipLength({ ...lips, angle: 1.2 })).toBeGreaterThan(lipLength(lips));
    expect(() => lipLength({ ...lips, angle: 0 })).toThrow(EngineInputError);
  });
});

describe('rim', () => {
  it('is an open end while nothing covers it', () => {
    const end = rimEnd({ boreRadius: 9e-3, outerRadius: 9e-3, fraction: 0 });
    // Levine and Schwinger (1948).
    expect(end.length / 9e-3).toBeCloseTo(0.6127, 6);
    rimImpedance(end, 5, out, 0);
    expect(out[0]! / (5 * 9e-3) ** 2).toBeCloseTo(0.25, 2);
  });

  it('is longer under chin and lips', () => {
    const length = (fraction: number) => rimEnd({ boreRadius: 9e-3, outerRadius: 11e-3, fraction }).length;
    expect(length(0.6)).toBeGreaterThan(length(0.4));
    expect(() => rimEnd({ boreRadius: 9e-3, outerRadius: 8e-3, fraction: 0.4 })).toThrow(EngineInputError);
  });
});

describe('reed', () => {
  it('is as springy as the piece of bore with its volume', () => {
    // A short closed cylinder of length L: tan(kL), nearly kL.
    const [k, length, radius] = [2, 1e-3, 6e-3];
    const volume = Math.PI * radius * radius * length;
    expect(reedSusceptance(k, volume, radius)).toBeCloseTo(Math.tan(k * length), 8);
  });

  it('knows the volume of the tip that a cone lacks', () => {
    // A third of base times height: 2 mm wide at the seat, 1 in 30.
    expect(missingConeVolume(1e-3, 1 / 30)).toBeCloseTo((Math.PI * 1e-6 * 30e-3) / 3, 15);
    expect(() => missingConeVolume(1e-3, 0)).toThrow(EngineInputError);
    expect(() => missingConeVolume(0, 0.03)).toThrow(EngineInputError);
  });
});
