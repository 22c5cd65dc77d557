import { describe, expect, it } from 'vitest';
import { finiteWallEndImpedance, finiteWallLength } from '#shared/acoustics/radiation/finite-wall-end.ts';
import { FLANGED_LENGTH_RATIO, flangedEndImpedance } from '#shared/acoustics/radiation/flanged-end.ts';
import { UNFLANGED_LENGTH_RATIO, unflangedEndImpedance } from '#shared/acoustics/radiation/unflanged-end.ts';
import { relative, spreadOf } from './spread.ts';
import { tableRows } from './table-rows.ts';
import table from './tables/radiation.json' with { type: 'json' };

const rows = tableRows(table.columns, table.rows);
const z = new Float64Array(2);

/** Magnitude of the reflection and length over radius that an impedance over the characteristic one stands for. */
function reflectionOf(ka: number): { magnitude: number; length: number } {
  const [re, im] = [z[0]!, z[1]!];
  const norm = (re + 1) ** 2 + im ** 2;
  const reflectedRe = (re * re + im * im - 1) / norm;
  const reflectedIm = (2 * im) / norm;
  const turned = Math.atan2(reflectedIm, -reflectedRe);
  return { magnitude: Math.hypot(reflectedRe, reflectedIm), length: turned / (2 * ka) };
}

describe('open ends of a cylinder against the exact solutions', () => {
  it.each([
    // Largest wavenumber·radius, then what the fits are stated to keep.
    ['unfl', unflangedEndImpedance, 1.5, 4e-4, 1.3e-3],
    ['unfl', unflangedEndImpedance, 3.5, 1.6e-3, 4e-3],
    ['flanged', flangedEndImpedance, 1.5, 2e-4, 1.1e-3],
    ['flanged', flangedEndImpedance, 3.5, 6e-4, 4e-3],
  ] as const)('gives the %s end', (...given) => {
    const [end, impedance, upTo, inMagnitude, inLength] = given;
    const inRange = rows.filter((row) => row.number('ka') <= upTo);
    const pairs = inRange.map((row) => {
      impedance(row.number('ka'), z, 0);
      return { row, found: reflectionOf(row.number('ka')) };
    });
    const magnitudes = pairs.map(({ row, found }) => relative(found.magnitude, row.number(`${end}_absR`)));
    const lengths = pairs.map(({ row, found }) => relative(found.length, row.number(`${end}_l`)));
    expect(spreadOf(magnitudes).max).toBeLessThan(inMagnitude);
    expect(spreadOf(lengths).max).toBeLessThan(inLength);
  });

  it('gives resistance and reactance, not only their combination', () => {
    const inRange = rows.filter((row) => row.number('ka') <= 1.5);
    for (const row of inRange) {
      unflangedEndImpedance(row.number('ka'), z, 0);
      expect(Math.abs(relative(z[0]!, row.number('unfl_Rez')))).toBeLessThan(0.01);
      expect(Math.abs(relative(z[1]!, row.number('unfl_Imz')))).toBeLessThan(3e-3);
      flangedEndImpedance(row.number('ka'), z, 0);
      expect(Math.abs(relative(z[0]!, row.number('flanged_Rez')))).toBeLessThan(0.01);
      expect(Math.abs(relative(z[1]!, row.number('flanged_Imz')))).toBeLessThan(3e-3);
    }
  });

  it('tends to the exact lengths at low frequency', () => {
    expect(UNFLANGED_LENGTH_RATIO).toBeCloseTo(table.limits.unflanged_l_over_a, 6);
    expect(FLANGED_LENGTH_RATIO).toBeCloseTo(table.limits.flanged_l_over_a, 5);
    unflangedEndImpedance(1e-5, z, 0);
    expect(z[1]! / 1e-5).toBeCloseTo(table.limits.unflanged_l_over_a, 6);
    expect(z[0]! / 1e-10).toBeCloseTo(0.25, 6);
    flangedEndImpedance(1e-5, z, 0);
    expect(z[0]! / 1e-10).toBeCloseTo(0.5, 6);
  });

  it('lies between the two with a wall of finite thickness', () => {
    // Dalmont, Nederveen and Joly (2001): no wall and an endless one are the ends of their interpolation.
    expect(finiteWallLength(1)).toBeCloseTo(0.6127, 10);
    expect(finiteWallLength(1e-9)).toBeCloseTo(0.8216, 6);
    const thin = new Float64Array(2);
    unflangedEndImpedance(0.3, thin, 0);
    finiteWallEndImpedance(0.3, 1, z, 0);
    expect(z[0]).toBeCloseTo(thin[0]!, 6);
    expect(z[1]).toBeCloseTo(thin[1]!, 6);
    finiteWallEndImpedance(0.3, 0.5, z, 0);
    expect(z[1]!).toBeGreaterThan(thin[1]!);
  });
});
