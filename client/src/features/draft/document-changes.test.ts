import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { applyChanges, changesBetween, isSameDocument } from './document-changes.ts';

const json = fc.letrec((tie) => ({
  value: fc.oneof(
    { maxDepth: 3 },
    fc.integer({ min: -3, max: 3 }),
    fc.constantFrom('D5', 'E5', null, true),
    fc.array(tie('value'), { maxLength: 4 }),
    fc.dictionary(fc.constantFrom('holes', 'bore', 'air', 'pitch'), tie('value'), { maxKeys: 3 }),
  ),
})).value;

describe('changesBetween', () => {
  it('leads from any value to any other', () => {
    fc.assert(
      fc.property(json, json, (from, to) => {
        expect(applyChanges(from, changesBetween(from, to))).toEqual(to);
      }),
    );
  });

  it('survives being written down and read again', () => {
    fc.assert(
      fc.property(json, json, (from, to) => {
        const written = JSON.stringify(changesBetween({ at: from }, { at: to }));
        expect(applyChanges({ at: from }, JSON.parse(written) as [])).toEqual({ at: to });
      }),
    );
  });

  it('names only what differs in a list of equal length', () => {
    const from = {
      holes: [
        { id: 'h1', diameterMm: 6 },
        { id: 'h2', diameterMm: 7 },
      ],
    };
    const to = {
      holes: [
        { id: 'h1', diameterMm: 6 },
        { id: 'h2', diameterMm: 7.5 },
      ],
    };
    expect(changesBetween(from, to)).toEqual([{ path: ['holes', 1, 'diameterMm'], value: 7.5 }]);
  });

  it('shares what did not change', () => {
    const from = { air: { temperatureC: 20 }, holes: [{ id: 'h1' }] };
    const after = applyChanges(from, [{ path: ['air', 'temperatureC'], value: 24 }]);
    expect(after.holes).toBe(from.holes);
    expect(from.air.temperatureC).toBe(20);
  });

  it('tells apart a key that is missing and one that is null', () => {
    expect(isSameDocument({ padHeightMm: null }, {})).toBe(false);
    expect(applyChanges({ padHeightMm: 2 }, changesBetween({ padHeightMm: 2 }, {}))).toEqual({});
  });
});
