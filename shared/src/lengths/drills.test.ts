import { describe, expect, it } from 'vitest';
import { DRILL_SET_NAMES, DRILL_SETS, drillByName, drillsOf, nearestDrills } from './drills.ts';

describe('drill sets', () => {
  it.each(DRILL_SET_NAMES)('%s runs from narrow to wide without a repeat', (set) => {
    const sizes = DRILL_SETS[set].map((drill) => drill.diameterMm);
    expect(sizes.every((size, index) => index === 0 || size > (sizes[index - 1] ?? 0))).toBe(true);
  });

  it('names fractions in lowest terms', () => {
    const names = DRILL_SETS['inch-fraction'].map((drill) => drill.name);
    expect([names[0], names[15], names[16], names[31], names[63]]).toEqual([
      '1/64"',
      '1/4"',
      '17/64"',
      '1/2"',
      '1"',
    ]);
  });

  it('lists one diameter once when sets are laid together', () => {
    const sizes = drillsOf(['metric-0.5', 'metric-0.1']).map((drill) => drill.diameterMm);
    expect(new Set(sizes).size).toBe(sizes.length);
    expect(sizes.filter((size) => size === 6.5)).toHaveLength(1);
  });

  it('finds the drill itself or its two neighbours', () => {
    const drills = drillsOf(['metric-0.5']);
    expect(nearestDrills(6.5, drills).exact?.name).toBe('6.5');
    const around = nearestDrills(6.2, drills);
    expect([around.exact, around.narrower?.name, around.wider?.name]).toEqual([null, '6.0', '6.5']);
    expect(nearestDrills(0.3, drills).narrower).toBeNull();
  });

  it('knows number and letter drills by name', () => {
    expect(drillByName('F')?.diameterMm).toBeCloseTo(6.5278, 6);
    expect(drillByName('81')).toBeNull();
  });
});
