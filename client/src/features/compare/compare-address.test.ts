import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readSource, readTerms, writeTerms, type CompareTerms } from './compare-address.ts';

const terms: fc.Arbitrary<CompareTerms> = fc.record({
  key: fc.constantFrom(null, 'F5', 'Bb4', 'C#6'),
  a4Hz: fc.option(fc.integer({ min: 300, max: 600 })),
  bore: fc.constantFrom('scaled', 'kept'),
  holeSizes: fc.constantFrom('exact', 'nearest-drill'),
  airA: fc.option(fc.integer({ min: 0, max: 40 })),
  airB: fc.option(fc.integer({ min: 0, max: 40 })),
  laidAt: fc.constantFrom(null, 'mouth', 'foot'),
});

describe('the address of a comparison', () => {
  it('is read back as it was written, and keeps what else stood there', () => {
    fc.assert(
      fc.property(terms, (wanted) => {
        const written = writeTerms(new URLSearchParams('hole=4'), wanted);
        expect(readTerms(new URLSearchParams(written.toString()))).toEqual(wanted);
        expect(written.get('hole')).toBe('4');
      }),
    );
  });

  it('leaves out what is usual', () => {
    const plain = readTerms(new URLSearchParams());
    expect(writeTerms(new URLSearchParams('key=F5&bore=kept'), plain).toString()).toBe('');
  });

  it.each(['key=H5', 'key=F55', 'a4=100', 'a4=abc', 'airB=90', 'airB=', 'bore=half', 'at=middle'])(
    'passes over %s',
    (search) => {
      expect(readTerms(new URLSearchParams(search))).toEqual(readTerms(new URLSearchParams()));
    },
  );

  it.each([
    ['12', { designId: 12 }],
    ['0', null],
    ['-1', null],
    ['12x', null],
    ['', null],
    [undefined, null],
  ])('takes %s for %o', (text, source) => {
    expect(readSource(text)).toEqual(source);
  });
});
