import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { printExactLength } from './print-length.ts';
import { readLength, type LengthUnit } from './read-length.ts';

const mm = (text: string, unit: LengthUnit = 'mm') => {
  const reading = readLength(text, unit);
  return reading.status === 'read' ? reading.mm : reading.message;
};

describe('a typed length', () => {
  // One inch is 25.4 mm exactly (international yard and pound agreement, 1959). Drills: ASME B94.11M.
  it.each([
    ['7/16 in', 11.1125],
    ['0.4375"', 11.1125],
    ['11.1', 11.1],
    ['11,1', 11.1],
    ['11.1mm', 11.1],
    ['1.11 cm', 11.1],
    ['1 3/8"', 34.925],
    ['1 3/8 inches', 34.925],
    ['#7', 5.1054],
    ['# 7', 5.1054],
    ['no. 7', 5.1054],
    ['letter F', 6.5278],
    ['f', 6.5278],
    ['12.7/2', 6.35],
    ['2*(3+0.5)', 7],
    ['265 - 4.2 mm', 260.8],
    ['\u22124.2', -4.2],
  ])('%s is %f mm', (text, size) => {
    expect(mm(text)).toBeCloseTo(size, 9);
  });

  it('without a unit is in the unit of the person', () => {
    expect(mm('1/4', 'inch')).toBeCloseTo(6.35, 9);
    expect(mm('6.5mm', 'inch')).toBeCloseTo(6.5, 9);
  });

  it.each([
    '',
    '  ',
    'six',
    '6.5 pt',
    '1//2',
    '1/0',
    '6..5',
    'sqrt(4)',
    '2x',
    'pi',
    '[1,2]',
    '6;7',
    'a=3',
    '#81',
    'letter AA',
    '1e999',
    '6 5',
  ])('%s is not read, and the answer says what would do', (text) => {
    expect(mm(text)).toMatch(/Type a size|There is no drill/);
  });

  it('comes back from what the field shows, to a micrometre', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -900_000, max: 900_000 }),
        fc.constantFrom<LengthUnit>('mm', 'inch'),
        (micrometres, unit) => {
          const stored = micrometres / 1000;
          expect(Math.abs(Number(mm(printExactLength(stored, unit), unit)) - stored)).toBeLessThan(
            unit === 'mm' ? 1e-4 : 2e-3,
          );
        },
      ),
    );
  });
});
