import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { documentFaults } from './document-faults.ts';
import { woodBetweenMm } from './hole-faults.ts';

describe('wood between two holes', () => {
  it('is measured at the bore wall, round the tube too', () => {
    const document = whistleDocument();
    const [a, b] = document.holes;
    expect(woodBetweenMm(document, a!, b!)).toBeCloseTo(21.9 - 7.75, 9);
    expect(woodBetweenMm(document, a!, { ...a!, angleDeg: 180 })).toBeCloseTo(Math.PI * 6.35 - 7, 9);
    expect(woodBetweenMm(document, { ...a!, angleDeg: 350 }, { ...a!, angleDeg: 10 })).toBeCloseTo(
      (6.35 * Math.PI) / 9 - 7,
      9,
    );
  });
});

describe('holes round one place of the bore', () => {
  const ring = (diameterMm: number, count: number) => {
    const document = whistleDocument();
    const [hole] = document.holes;
    const holes = Array.from({ length: count }, (_, index) => ({
      ...hole!,
      id: `r${index}`,
      name: '',
      diameterMm,
      angleDeg: (360 / count) * index,
    }));
    return documentFaults({ ...document, holes, fingerings: [] }).map(({ message }) => message);
  };

  it('are refused where they leave no wood, and only there', () => {
    expect(ring(11, 3).join()).toContain('almost no wood left between hole 1, hole 2, hole 3');
    expect(ring(7, 3)).toEqual([]);
    expect(ring(11, 2)).toEqual([]);
  });
});

describe('a bore too short for a hole', () => {
  it('is refused with what would do, since no place would', () => {
    const document = whistleDocument();
    const [hole] = document.holes;
    const short = (stations: typeof document.bore.stations) => ({
      stations: [stations[0]!, { ...stations.at(-1)!, positionMm: 8 }],
    });
    const [fault] = documentFaults({
      ...document,
      bore: short(document.bore.stations),
      outside: short(document.outside.stations),
      holes: [{ ...hole!, positionMm: 4 }],
      fingerings: [],
    });
    expect(fault?.path).toEqual(['holes', 0, 'positionMm']);
    expect(fault?.message).toContain('The bore is too short for it. Make it smaller, or the bore longer.');
  });
});
