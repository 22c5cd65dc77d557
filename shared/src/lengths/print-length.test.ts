import { describe, expect, it } from 'vitest';
import { printExactLength, printInchFraction, printLength } from './print-length.ts';

describe('a printed length', () => {
  it.each([
    [78.2, 'mm', '78.2'],
    [0.05, 'mm', '0.05'],
    [-4.2, 'mm', '\u22124.2'],
    [-0.001, 'mm', '0.00'],
    [0, 'mm', '0.0'],
    [6.35, 'inch', '0.250'],
  ] as const)('%f in %s is %s', (mm, unit, text) => {
    expect(printLength(mm, unit)).toBe(text);
  });

  it('shows in a field what is stored, not a rounding of it', () => {
    expect(printExactLength(5.1054, 'mm')).toBe('5.105');
    expect(printExactLength(11.1125, 'inch')).toBe('0.4375');
    expect(printExactLength(6.5, 'mm')).toBe('6.5');
  });

  it.each([
    [6.35, '1/4'],
    [34.925, '1 3/8'],
    [25.4, '1'],
    [0.1, '0'],
  ])('%f mm is nearest %s inch', (mm, text) => {
    expect(printInchFraction(mm)).toBe(text);
  });
});
