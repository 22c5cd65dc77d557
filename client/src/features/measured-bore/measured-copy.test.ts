// @vitest-environment jsdom
import { beforeEach, describe, expect, it } from 'vitest';
import { keepMeasuredCopy, NO_SOURCE, readMeasuredCopy, type MeasuredSource } from './measured-copy.ts';

const place = { personId: 3, designId: 7 };
const source: MeasuredSource = {
  text: '0;12,7\n5;12,8',
  fileName: 'bore.csv',
  isBeside: true,
  meaning: {
    separator: 'semicolon',
    decimalMark: 'comma',
    columns: { 1: { kind: 'radius' }, 2: { unit: 'inch' } },
    from: 'foot',
    zeroMm: 31,
  },
  fit: { limitMm: 0.08, withinMm: 0.02, combination: 'widest', beyond: 'drawn', restored: ['2:1'] },
};

beforeEach(() => sessionStorage.clear());

describe('the copy of a table', () => {
  it('comes back as it was left, for the same person and design only', () => {
    expect(keepMeasuredCopy(place, source)).toBe(true);
    expect(readMeasuredCopy(place)).toEqual(source);
    expect(readMeasuredCopy({ ...place, designId: 8 })).toBe(NO_SOURCE);
    expect(readMeasuredCopy({ ...place, personId: 4 })).toBe(NO_SOURCE);
  });

  it('goes when the table is cleared', () => {
    keepMeasuredCopy(place, source);
    keepMeasuredCopy(place, NO_SOURCE);
    expect(sessionStorage).toHaveLength(0);
  });

  it.each(['{"text": "0', '{"text": 7}', 'null'])('is as good as none when it holds %s', (kept) => {
    keepMeasuredCopy(place, source);
    sessionStorage.setItem(sessionStorage.key(0)!, kept);
    expect(readMeasuredCopy(place)).toBe(NO_SOURCE);
  });
});
