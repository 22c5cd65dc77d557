import { describe, expect, it } from 'vitest';
import { cutOrCarryOn } from './keep-bore.ts';

const bore = [
  { positionMm: 0, diameterMm: 19 },
  { positionMm: 100, diameterMm: 19 },
  { positionMm: 300, diameterMm: 15 },
];

describe('ending a bore elsewhere', () => {
  it('cuts it where it gets shorter', () => {
    expect(cutOrCarryOn(bore, -50)).toEqual([...bore.slice(0, 2), { positionMm: 250, diameterMm: 16 }]);
  });

  it('leaves out the stations that are cut off', () => {
    expect(cutOrCarryOn(bore, -250)).toEqual([bore[0], { positionMm: 50, diameterMm: 19 }]);
  });

  it('carries its last taper on where it gets longer', () => {
    expect(cutOrCarryOn(bore, 50)).toEqual([...bore.slice(0, 2), { positionMm: 350, diameterMm: 14 }]);
  });

  it('leaves it alone where it ends where it did', () => {
    expect(cutOrCarryOn(bore, 0)).toEqual(bore);
  });
});
