import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { diameterAt } from '#shared/document/profile.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { changeStation, longestSpan, moveStation, removeStation, splitSpan } from './bore-edits.ts';
import { taperRate, taperWords } from './taper.ts';

const whistle = whistleDocument();
const coned = whistleDocument({
  bore: {
    stations: [
      { positionMm: -4.4, diameterMm: 12.7 },
      { positionMm: 90, diameterMm: 12.7 },
      { positionMm: 265, diameterMm: 11 },
    ],
  },
});

describe('stations', () => {
  it('never cross, wherever one is dragged', () => {
    fc.assert(
      fc.property(fc.nat(2), fc.integer({ min: -400, max: 400 }), (index, positionMm) => {
        const { stations } = moveStation(coned, 'bore', index, { positionMm, diameterMm: 12 }).bore;
        const places = stations.map((station) => station.positionMm);
        expect(places).toEqual(places.toSorted((a, b) => a - b));
      }),
    );
  });

  it('split a span without changing its shape', () => {
    const { document, index } = splitSpan(coned, 'bore', 1);
    expect(index).toBe(2);
    expect(document.bore.stations[2]).toEqual({ positionMm: 177.5, diameterMm: 11.85 });
    for (const at of [100, 150, 200, 250]) {
      expect(diameterAt(document.bore.stations, at)).toBeCloseTo(diameterAt(coned.bore.stations, at), 6);
    }
  });

  it('split the last span when the last station is chosen', () => {
    expect(splitSpan(coned, 'bore', 2).index).toBe(2);
    expect(longestSpan(coned.bore.stations)).toBe(1);
  });

  it('keep two ends', () => {
    expect(removeStation(whistle, 'bore', 0)).toBe(whistle);
    expect(removeStation(coned, 'bore', 1).bore.stations).toHaveLength(2);
  });

  it('take a typed diameter as it is', () => {
    expect(changeStation(coned, 'bore', 1, { diameterMm: 12.5 }).bore.stations[1]?.diameterMm).toBe(12.5);
  });
});

describe('tapers', () => {
  it.each([
    [{ positionMm: 0, diameterMm: 12.7 }, { positionMm: 42, diameterMm: 12.5 }, '1 in 210, 42.0'],
    [{ positionMm: 0, diameterMm: 12.7 }, { positionMm: 90, diameterMm: 12.7 }, 'straight, 90.0'],
    [{ positionMm: 0, diameterMm: 12.5 }, { positionMm: 38, diameterMm: 12.7 }, '1 in 190 opening, 38.0'],
    [{ positionMm: 50, diameterMm: 19 }, { positionMm: 50, diameterMm: 12 }, 'step to 12.0'],
  ])('%j to %j is %s', (from, to, words) => {
    expect(taperWords(from, to, 'mm')).toBe(words);
  });

  it('shorter than 1 in 20 keep a decimal', () => {
    expect(taperRate({ positionMm: 0, diameterMm: 10 }, { positionMm: 8, diameterMm: 9 })).toBe('1 in 8.0');
  });
});
