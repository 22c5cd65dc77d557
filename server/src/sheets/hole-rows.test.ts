import { describe, expect, it } from 'vitest';
import { buildHole, buildSheetInput, buildWhistle } from '../../../tests/sheets/build-sheet-input.ts';
import { numberedHoles } from './bench-position.ts';
import { holeRows } from './hole-rows.ts';

describe('the rows of the hole table', () => {
  it('run from the foot upward, each with its distance from the one before', () => {
    const rows = holeRows(buildSheetInput());
    expect(rows.map((row) => row.number)).toEqual([6, 5, 4, 3, 2, 1]);
    const figures = rows.slice(0, 3).map((row) => [row.fromReferenceMm, row.fromLastMm]);
    // 265 − 218.9, 265 − 200.8, 265 − 185.8 and their differences.
    const expected = [46.1, 46.1, 64.2, 18.1, 79.2, 15];
    figures.flat().forEach((mm, index) => expect(mm).toBeCloseTo(expected[index]!, 9));
  });

  it('name the note of the plain fingering that vents there, and its cents for a tenth', () => {
    const [lowest] = holeRows(buildSheetInput());
    expect(lowest?.tunes).toBe('E5');
    expect(lowest?.centsWider).toBeCloseTo(2.2, 9);
    expect(lowest?.centsFootward).toBeCloseTo(-1.25, 9);
  });

  it('say nothing of a note where none vents', () => {
    const document = buildWhistle({ fingerings: [] });
    expect(holeRows(buildSheetInput({ document })).every((row) => row.tunes === null)).toBe(true);
  });

  it.each([
    [7, 4.9, 7],
    [6.25, 4.3, 6.2],
    [6.549, 4.5, 6.5],
  ])('never take a drill wider than a hole of %f', (diameterMm, pilotMm, finalMm) => {
    const document = buildWhistle({ holes: [buildHole({ id: 'a', positionMm: 200, diameterMm })] });
    const [row] = holeRows(buildSheetInput({ document }));
    expect([row?.pilot?.diameterMm, row?.finalDrill?.diameterMm]).toEqual([pilotMm, finalMm]);
  });

  it('take the exact drill of another system where there is one', () => {
    // 9/32 inch is 7.14375 mm: ASME B94.11M, fractional sizes.
    const document = buildWhistle({ holes: [buildHole({ id: 'a', positionMm: 200, diameterMm: 7.14375 })] });
    expect(holeRows(buildSheetInput({ document }))[0]?.finalDrill?.diameterMm).toBeCloseTo(7.14375, 5);
  });

  it('differ by what stands in the column of positions, not by digits that are not printed', () => {
    const holes = [
      buildHole({ id: 'a', positionMm: 265 - 147.06 }),
      buildHole({ id: 'b', positionMm: 265 - 123.14 }),
    ];
    const [, upper] = holeRows(buildSheetInput({ document: buildWhistle({ holes }) }));
    expect(upper?.fromLastMm).toBeCloseTo(147.1 - 123.1, 9);
  });
});

describe('a hole on paper', () => {
  const labels = (names: readonly string[]) => {
    const holes = names.map((name, index) =>
      buildHole({ id: `h${index}`, name, positionMm: 200 - index * 20 }),
    );
    return numberedHoles(buildWhistle({ holes })).map((entry) => entry.label);
  };

  it('is called by its own name where all have short ones', () => {
    expect(labels(['2', '1', 'T'])).toEqual(['T', '1', '2']);
  });

  it.each([[['2', '', 'T']], [['2', '2', 'T']], [['2', 'right thumb', 'T']]])(
    'is numbered from the mouth end when names are %j',
    (names) => expect(labels(names)).toEqual(['1', '2', '3']),
  );
});
