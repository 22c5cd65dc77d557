import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EngineInputError } from '../engine-input-error.ts';
import { selfRadiation } from './cylinder-radiation.ts';
import { footDistance, footMutualRadiation, mutualRadiation, openingPair } from './mutual-radiation.ts';

const out = new Float64Array(4);
const bodyWavenumber = fc.double({ min: 1e-5, max: 6, noNaN: true });
const distance = fc.double({ min: 0.05, max: 40, noNaN: true });
const angle = fc.double({ min: 0, max: Math.PI, noNaN: true });

describe('self-radiation', () => {
  it('takes power at every frequency and holds beyond its table', () => {
    fc.assert(
      fc.property(bodyWavenumber, (kR) => {
        selfRadiation(kR, out, 0);
        expect(out[1]).toBeLessThan(0);
      }),
    );
    selfRadiation(1.5, out, 0);
    selfRadiation(9, out, 2);
    expect([out[2], out[3]]).toEqual([out[0], out[1]]);
  });
});

describe('mutual radiation', () => {
  it('never takes out of one opening more than both put in', () => {
    fc.assert(
      fc.property(bodyWavenumber, distance, angle, (kR, z, theta) => {
        selfRadiation(kR, out, 0);
        mutualRadiation(kR, openingPair(z, theta, 1), out, 2);
        expect(Math.abs(out[3]!)).toBeLessThanOrEqual(Math.abs(out[1]!) * (1 + 1e-9));
      }),
    );
  });

  it('leaves a whole row of holes and a thumb hole passive', () => {
    fc.assert(
      fc.property(
        bodyWavenumber,
        fc.array(
          fc.tuple(
            distance,
            fc.constantFrom(0, 0.4, 2, Math.PI),
            fc.double({ min: -1, max: 1, noNaN: true }),
          ),
          {
            minLength: 2,
            maxLength: 7,
          },
        ),
        (kR, openings) => {
          selfRadiation(kR, out, 0);
          let power = openings.reduce((sum, [, , flow]) => sum - flow * flow * out[1]!, 0);
          openings.forEach(([z, theta, flow], i) => {
            openings.slice(0, i).forEach(([otherZ, otherTheta, otherFlow]) => {
              if (z === otherZ && theta === otherTheta) return;
              mutualRadiation(kR, openingPair(z - otherZ, theta - otherTheta, 1), out, 2);
              power -= 2 * flow * otherFlow * out[3]!;
            });
          });
          // Two holes in one place make the quadratic form singular, never negative.
          expect(power).toBeGreaterThan(-1e-9);
        },
      ),
    );
  });

  it('has no jump in distance, angle or frequency', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 4, noNaN: true }), distance, angle, (k, z, theta) => {
        const step = 1e-7;
        mutualRadiation(k, openingPair(z, theta, 1), out, 0);
        const size = 1 / z + 1;
        for (const [k2, z2, theta2] of [
          [k + step, z, theta],
          [k, z + step, theta],
          [k, z, theta + step],
        ] as const) {
          mutualRadiation(k2, openingPair(z2, theta2, 1), out, 2);
          expect(Math.hypot(out[2]! - out[0]!, out[3]! - out[1]!)).toBeLessThan(1e-3 * size * size);
        }
      }),
    );
  });

  it('tends to the value on one side as the angle vanishes, and to the value side by side as the distance does', () => {
    mutualRadiation(0.3, openingPair(1, 0, 1), out, 0);
    mutualRadiation(0.3, openingPair(1, 1e-6, 1), out, 2);
    expect(out[2]).toBeCloseTo(out[0]!, 9);
    expect(out[3]).toBeCloseTo(out[1]!, 9);
    mutualRadiation(0.3, openingPair(0, 2, 1), out, 0);
    mutualRadiation(0.3, openingPair(1e-6, 2, 1), out, 2);
    expect(out[2]).toBeCloseTo(out[0]!, 5);
    expect(out[3]).toBeCloseTo(out[1]!, 5);
  });

  it('scales: twice the size at half the frequency couples half as much', () => {
    fc.assert(
      fc.property(bodyWavenumber, distance, angle, (kR, z, theta) => {
        mutualRadiation(kR, openingPair(z, theta, 1), out, 0);
        mutualRadiation(kR / 2, openingPair(2 * z, theta, 2), out, 2);
        expect(out[2]).toBeCloseTo(out[0]! / 2, 9);
        expect(out[3]).toBeCloseTo(out[1]! / 2, 9);
      }),
    );
  });

  it('refuses two openings in one place and a body without width', () => {
    expect(() => openingPair(0, 0, 1)).toThrow(EngineInputError);
    expect(() => openingPair(1, 0, 0)).toThrow(EngineInputError);
  });

  it('couples to the foot as a point in free space', () => {
    const s = footDistance(3, 4);
    expect(s).toBe(5);
    footMutualRadiation(0.2, s, out, 0);
    // e^{−j}/5
    expect(out[0]).toBeCloseTo(0.10806, 5);
    expect(out[1]).toBeCloseTo(-0.168294, 5);
  });
});
