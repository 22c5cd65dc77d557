import { describe, expect, it } from 'vitest';
import { borePlaces, furthestPlace } from './bore-difference.ts';

const bore = (...stations: [number, number][]) => ({
  bore: { stations: stations.map(([positionMm, diameterMm]) => ({ positionMm, diameterMm })) },
});

describe('two bores', () => {
  it('are read at every station of either', () => {
    expect(borePlaces(bore([0, 13], [200, 13]), bore([0, 13], [100, 12.8], [200, 13]))).toEqual([
      { positionMm: 0, a: 13, b: 13, widerMm: 0 },
      { positionMm: 100, a: 13, b: 12.8, widerMm: expect.closeTo(-0.2, 9) as number },
      { positionMm: 200, a: 13, b: 13, widerMm: 0 },
    ]);
  });

  it('are compared only where both are', () => {
    const places = borePlaces(bore([0, 13], [200, 13]), bore([0, 13], [260, 13]));
    expect(places.at(-1)).toEqual({ positionMm: 260, a: null, b: 13, widerMm: null });
    expect(furthestPlace(places)).toBeNull();
  });

  it('are laid together where they are asked to be', () => {
    const places = borePlaces(bore([0, 13], [200, 12]), bore([0, 14], [260, 12]), 60);
    expect(places.map(({ positionMm }) => positionMm)).toEqual([0, 60, 260]);
    expect(places[1]?.a).toBe(13);
  });

  it('differ most where they differ most', () => {
    const places = borePlaces(bore([0, 13], [200, 13]), bore([0, 13.1], [100, 12.6], [200, 13.2]));
    expect(furthestPlace(places)).toMatchObject({ positionMm: 100 });
  });
});
