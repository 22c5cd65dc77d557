import { describe, expect, it } from 'vitest';
import { passTwoPort } from '#shared/acoustics/response/chain.ts';
import { BorePlan } from '#shared/acoustics/response/bore-plan.ts';
import { tuneSegment } from '#shared/acoustics/response/prepared-column.ts';
import { writeDuct, writeMedium } from '#shared/acoustics/bore/wall-losses.ts';
import table from './tables/bores.json' with { type: 'json' };

const { rho, c, eta, gamma, Pr } = table.medium;
const medium = {
  speedOfSound: c,
  density: rho,
  viscosity: eta,
  heatCapacityRatio: gamma,
  prandtl: Pr,
  lossless: false,
};

/** Largest relative error of the input impedance over all rows; both are over the input's characteristic impedance. */
function largestError(bore: { x_m: number[]; r_m: number[]; rows: (number | null)[][] }): number {
  const plan = new BorePlan(medium, null);
  const segment = plan.segment(bore.x_m.map((position, i) => ({ position, radius: bore.r_m[i]! })));
  const cells = plan.cells();
  const unit = (rho * c) / (Math.PI * bore.r_m[0]! ** 2);
  const errors = bore.rows.map(([frequency, loadRe, loadIm, re, im]) => {
    for (const air of plan.media) writeMedium(cells, air.at, air.medium, frequency!);
    for (const duct of plan.ducts) writeDuct(cells, duct.at, duct.medium, duct.radius);
    tuneSegment(cells, segment);
    // A stopped end has no load: unit pressure and no flow.
    const stopped = loadRe === null || loadIm === null;
    const state = new Float64Array(stopped ? [1, 0, 0, 0] : [loadRe! * unit, loadIm! * unit, 1, 0]);
    passTwoPort(cells, segment.twoPort, state);
    const [pr, pi, ur, ui] = state as unknown as [number, number, number, number];
    const norm = (ur * ur + ui * ui) * unit;
    return (
      Math.hypot((pr * ur + pi * ui) / norm - re!, (pi * ur - pr * ui) / norm - im!) / Math.hypot(re!, im!)
    );
  });
  return Math.max(...errors);
}

describe('bores with losses against the differential equations', () => {
  // Cylinders: exact but for the table's own 1e-8. Cones: slices of 6 % and 20 mm, with the errors known of them.
  it.each(Object.entries(table.bores))('gives the input impedance of %s', (name, bore) => {
    const tolerance = name.startsWith('cyl') ? 1e-8 : 5e-4;
    expect(largestError(bore as Parameters<typeof largestError>[0])).toBeLessThan(tolerance);
  });
});
