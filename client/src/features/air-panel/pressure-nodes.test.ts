import { describe, expect, it } from 'vitest';
import { pressureAt, pressureNodes } from './pressure-nodes.ts';

/** A pipe open at both ends in its third mode: |sin(3πx/L)|, textbook standing wave. */
const third = Array.from({ length: 301 }, (_, index) => ({
  positionMm: index,
  pressure: Math.abs(Math.sin((3 * Math.PI * index) / 300)),
}));

describe('the pressure along the bore', () => {
  it('has its waists inside the pipe at the thirds', () => {
    expect(pressureNodes(third)).toEqual([100, 200]);
  });

  it('has no waist where an open hole only dents it', () => {
    const dented = third.map((point) => ({
      ...point,
      pressure: Math.abs(point.positionMm - 110) < 2 ? point.pressure - 0.03 : point.pressure,
    }));
    expect(pressureNodes(dented)).toEqual([100, 200]);
  });

  it('is read at a hole', () => {
    expect(pressureAt(third, 50)).toBeCloseTo(1, 6);
    expect(pressureAt(third, 100.5)).toBeLessThan(0.03);
    expect(pressureAt(third, 400)).toBeCloseTo(0, 6);
    expect(pressureAt([], 10)).toBeNull();
  });
});
