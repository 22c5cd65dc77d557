import { describe, expect, it } from 'vitest';
import { writeDuct, writeMedium } from '#shared/acoustics/bore/wall-losses.ts';
import table from './tables/losses.json' with { type: 'json' };

describe('propagation in a duct with friction and heat at its wall', () => {
  // 1e-9: Bessel functions of 40 digits, printed to 12.
  it.each(Object.entries(table.tables))('gives the exact values in %s air', (_, { medium, rows }) => {
    const air = {
      speedOfSound: medium.c,
      density: medium.rho,
      viscosity: medium.eta,
      heatCapacityRatio: medium.gamma,
      prandtl: medium.Pr,
      lossless: false,
    };
    expect(rows.length).toBeGreaterThan(50);
    for (const row of rows) {
      const [radiusMm, frequency, ...expected] = row as [number, number, number, number, number, number];
      const cells = new Float64Array(9);
      writeMedium(cells, 0, air, frequency);
      writeDuct(cells, 5, 0, radiusMm / 1000);
      const z0 = (medium.rho * medium.c) / (Math.PI * (radiusMm / 1000) ** 2);
      const found = [cells[5]!, cells[6]!, cells[7]! / z0, cells[8]! / z0];
      found.forEach((value, i) => expect(Math.abs(value / expected[i]! - 1)).toBeLessThan(1e-9));
    }
  });
});
