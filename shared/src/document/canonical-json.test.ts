import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson } from './canonical-json.ts';

describe('canonicalJson', () => {
  it('orders keys at every depth and keeps the order of lists', () => {
    expect(canonicalJson({ b: [{ d: 1, c: null }, 2], a: 'é' })).toBe('{"a":"é","b":[{"c":null,"d":1},2]}');
  });

  it('says the same whatever order the keys came in', () => {
    fc.assert(
      fc.property(fc.dictionary(fc.string(), fc.jsonValue()), (record) => {
        const turned = Object.fromEntries(Object.entries(record).reverse());
        expect(canonicalJson(turned)).toBe(canonicalJson(record));
      }),
    );
  });

  it('reads back as the same value', () => {
    fc.assert(
      fc.property(fc.jsonValue(), (value) => {
        expect(JSON.parse(canonicalJson(value))).toEqual(JSON.parse(JSON.stringify(value)));
      }),
    );
  });
});
