import { describe, expect, it } from 'vitest';
import { DRILL_SETS, MM_PER_INCH } from '#shared/lengths/drills.ts';
import table from './tables/drills.json' with { type: 'json' };

/** Sizes of drills against a general-purpose unit converter; the file names its source. */
const listed = Object.entries(table.number).map(([number, inches]) => ({ number: Number(number), inches }));

function listedInches(number: number): number {
  const below = listed.filter((entry) => entry.number <= number).at(-1);
  const above = listed.find((entry) => entry.number >= number);
  if (below === undefined || above === undefined) throw new RangeError(`no drill ${number} in the table`);
  if (below.number === above.number) return below.inches;
  return (
    below.inches + ((number - below.number) / (above.number - below.number)) * (above.inches - below.inches)
  );
}

describe('drills of the standard', () => {
  it('has all eighty number drills, exactly where the table lists them and within a thousandth between', () => {
    expect(DRILL_SETS.number).toHaveLength(80);
    for (const drill of DRILL_SETS.number) {
      const number = Number(drill.name.slice(1));
      const isListed = listed.some((entry) => entry.number === number);
      const difference = Math.abs(drill.diameterMm / MM_PER_INCH - listedInches(number));
      expect(difference, drill.name).toBeLessThan(isListed ? 1e-6 : 1.05e-3);
    }
  });

  it('has all twenty-six letter drills', () => {
    expect(DRILL_SETS.letter.map((drill) => drill.name)).toEqual(Object.keys(table.letter));
    Object.values(table.letter).forEach((inches, index) => {
      expect(DRILL_SETS.letter[index]?.diameterMm).toBeCloseTo(inches * 25.4, 6);
    });
  });
});
