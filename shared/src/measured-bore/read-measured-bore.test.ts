import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { MM_PER_INCH } from '../lengths/drills.ts';
import { MEASUREMENT_LIMITS } from './measurement-table.ts';
import { readMeasuredBore, type MeaningChoices, type MeasuredBore } from './read-measured-bore.ts';

const drawn = {
  bore: {
    stations: [
      { positionMm: -4.4, diameterMm: 12.7 },
      { positionMm: 265, diameterMm: 12.7 },
    ],
  },
};
const asRecognised: MeaningChoices = {
  separator: null,
  decimalMark: null,
  columns: {},
  from: null,
  zeroMm: null,
};

const read = (text: string, choices: Partial<MeaningChoices> = {}) =>
  readMeasuredBore(text, drawn, { ...asRecognised, ...choices });

function readings(bore: MeasuredBore): [number, number][] {
  if (bore.status !== 'read') throw new Error(bore.message);
  return bore.readings.map(({ positionMm, diameterMm }) => [
    Math.round(positionMm * 1000) / 1000,
    Math.round(diameterMm * 1000) / 1000,
  ]);
}

const BARE = [
  [0, 12.7],
  [50.5, 12.65],
  [100, 12.6],
];

describe('a table of two columns', () => {
  it.each([
    { name: 'semicolons and decimal commas', text: '0;12,7\n50,5;12,65\n100;12,6' },
    { name: 'semicolons and decimal points', text: '0;12.7\n50.5;12.65\n100;12.6' },
    { name: 'commas', text: '0,12.7\n50.5,12.65\n100,12.6' },
    { name: 'commas and blanks', text: '0, 12.7\n50.5, 12.65\n100, 12.6' },
    { name: 'tabs and decimal commas', text: '0\t12,7\n50,5\t12,65\n100\t12,6' },
    { name: 'blanks', text: '0    12.7\n50.5 12.65\n100  12.6' },
    { name: 'blanks and decimal commas', text: '0 12,7\n50,5 12,65\n100 12,6' },
    { name: 'quotes round decimal commas', text: '"0","12,7"\n"50,5","12,65"\n"100","12,6"' },
    {
      name: 'line ends of other systems and a byte order mark',
      text: '\uFEFF0;12,7\r\n50,5;12,65\r\n100;12,6\r\n',
    },
    { name: 'a heading', text: 'Position (mm);Diameter (mm)\n0;12,7\n50,5;12,65\n100;12,6' },
    { name: 'words above the heading', text: 'Build 118\n\nPosition;Diameter\n0;12,7\n50,5;12,65\n100;12,6' },
    { name: 'blank rows between', text: '0;12,7\n\n50,5;12,65\n;\n100;12,6' },
    { name: 'units in the cells', text: '0 mm;12.7 mm\n5.05 cm;12.65 mm\n10 cm;12.6 mm' },
    { name: 'the diameter first', text: 'Diameter;Position\n12,7;0\n12,65;50,5\n12,6;100' },
    { name: 'rows counted', text: '1;0;12,7\n2;50,5;12,65\n3;100;12,6' },
    { name: 'rows from the far end', text: '100;12.6\n50.5;12.65\n0;12.7' },
    { name: 'radii', text: 'Position;Radius\n0;6,35\n50,5;6,325\n100;6,3' },
    { name: 'centimetres along', text: 'Position (cm);Diameter (mm)\n0;12,7\n5,05;12,65\n10;12,6' },
  ])('is read with $name', ({ text }) => {
    expect(readings(read(text))).toEqual(BARE);
  });

  it.each([
    { name: 'said by the heading', text: 'Position (in),Diameter (in)\n0,0.5\n4,0.49\n8,0.48' },
    { name: 'told by the figures', text: '0,0.5\n4,0.49\n8,0.48' },
    { name: 'said by the cells', text: '0 in,0.5"\n4 in,0.49"\n8 in,0.48"' },
  ])('in inches is known: $name', ({ text }) => {
    expect(readings(read(text))).toEqual([
      [0, 12.7],
      [101.6, 12.446],
      [203.2, 12.192],
    ]);
  });

  it('of a short stretch in mm is not taken for inches', () => {
    expect(readings(read('0;12,7\n5;12,7\n10;12,7')).at(-1)).toEqual([10, 12.7]);
  });

  it('reads the same figures whatever stands between them', () => {
    const row = fc.tuple(fc.integer({ min: 1, max: 400 }), fc.integer({ min: 1100, max: 1400 }));
    const marks = fc.constantFrom<[string, string]>(
      [';', ','],
      [';', '.'],
      ['\t', ','],
      ['\t', '.'],
      [',', '.'],
    );
    fc.assert(
      fc.property(
        fc.array(row, { minLength: 3, maxLength: 40 }),
        marks,
        fc.boolean(),
        (rows, [between, mark], inch) => {
          let along = 0;
          const expected = rows.map(([step, width]): [number, number] => {
            along += step / 100;
            return [Math.round(along * 100) / 100, width / 100];
          });
          const factor = inch ? MM_PER_INCH : 1;
          const print = (mm: number) => (mm / factor).toFixed(6).replace('.', mark);
          const unit = inch ? 'in' : 'mm';
          const text = [
            `Position ${unit}${between}Diameter ${unit}`,
            ...expected.map(([mm, width]) => `${print(mm)}${between}${print(width)}`),
          ].join('\n');
          const bore = read(text, { zeroMm: 0 });
          readings(bore).forEach(([mm, width], index) => {
            expect(mm).toBeCloseTo(expected[index]![0], 2);
            expect(width).toBeCloseTo(expected[index]![1], 2);
          });
          expect(readings(bore)).toHaveLength(expected.length);
        },
      ),
    );
  });
});

describe('a table of several diameters', () => {
  it('takes each gauge direction, named by its angle', () => {
    const bore = read('Position (mm);0;90\n0;12,7;12,72\n50;12,65;12,66\n100;12,6;12,6');
    expect(bore.status === 'read' && bore.columns.map(({ kind, title }) => [kind, title])).toEqual([
      ['distance', 'Position (mm)'],
      ['diameter', '0'],
      ['diameter', '90'],
    ]);
    expect(readings(bore)).toHaveLength(6);
  });

  it('leaves columns of words and counts alone', () => {
    const bore = read('No;Position;Diameter;Note\n1;0;12,7;tight\n2;50;12,65;\n3;100;12,6;burr');
    expect(bore.columns.map(({ kind }) => kind)).toEqual(['unused', 'distance', 'diameter', 'unused']);
  });

  it('follows what the person says of a column', () => {
    const text = '0;12,7;12,9\n50;12,65;12,9\n100;12,6;12,9';
    expect(readings(read(text, { columns: { 2: { kind: 'unused' } } }))).toHaveLength(3);
    expect(readings(read(text, { columns: { 1: { unit: 'inch' }, 2: { kind: 'unused' } } }))[0]).toEqual([
      0, 322.58,
    ]);
  });
});

describe('where the distances lie', () => {
  it.each([
    { name: 'the lip', text: '0;12,7\n100;12,6\n200;12,5', first: 0 },
    { name: 'the very end of a longer instrument', text: '31;12,7\n100;12,6\n296;12,5', first: 0 },
    { name: 'the foot', text: 'From foot;Diameter\n0;12,5\n100;12,6\n265;12,7', first: 0 },
    {
      name: 'where the person says',
      text: '10;12,7\n100;12,6\n200;12,5',
      choices: { zeroMm: 12 },
      first: -2,
    },
    {
      name: 'the foot, as the person says',
      text: '5;12,5\n265;12,7',
      choices: { from: 'foot', zeroMm: 5 } as const,
      first: 5,
    },
  ])('runs from $name', ({ text, choices, first }) => {
    expect(readings(read(text, choices ?? {}))[0]![0]).toBeCloseTo(first, 9);
  });

  it('says when that was a guess', () => {
    const bore = read('31;12,7\n100;12,6\n296;12,5');
    expect(bore.status === 'read' && bore.place).toEqual({ from: 'mouth', zeroMm: 31, isGuess: true });
  });
});

describe('what is wrong with a row', () => {
  const good = '0;12,7\n10;12,7\n20;12,7\n30;12,7';
  it.each([
    ['40;12..7', /Column 2: \u201c12\.\.7\u201d cannot be read/],
    ['x;12,7', /distance \u201cx\u201d cannot be read/],
    ['40;x', /\u201cx\u201d cannot be read/],
    ['40;F', /\u201cF\u201d cannot be read/],
    ['40;2026-12-01', /cannot be read/],
    ['40;1.234,5', /cannot be read/],
    ['40;12.7', /has a point, and decimals here have a comma/],
    ['40;', /No diameter/],
    [';12,7', /No distance/],
    ['40;0', /no diameter/],
    ['40;-12,7', /no diameter/],
    ['40;1270', /wider than any bore/],
    ['90000;12,7', /longer than any instrument/],
    ['Total', /cannot be read/],
  ])('%s is told with its number, and the other rows are used', (row, message) => {
    const bore = read(`${good}\n${row}`);
    if (bore.status !== 'read') throw new Error(bore.message);
    expect(bore.faults).toEqual([{ row: 5, message: expect.stringMatching(message) as string }]);
    expect(bore.readings).toHaveLength(4);
  });

  it('counts rows as the table shows them, with heading and blank rows', () => {
    const bore = read('Position;Diameter\n\n0;12,7\n10;what\n20;12,7');
    expect(bore.status === 'read' && bore.faults.map(({ row }) => row)).toEqual([4]);
  });

  it('asks about a distance that steps back', () => {
    const bore = read('0;12,7\n10;12,7\n20;12,7\n3;12,7\n40;12,7\n50;12,7');
    expect(bore.status === 'read' && bore.doubts).toEqual([
      { row: 4, message: expect.stringContaining('3 comes after 20') as string },
    ]);
  });

  it('takes a bore that was measured there and back again', () => {
    const bore = read('0;12,7\n10;12,7\n20;12,7\n20;12,7\n10;12,7\n0;12,7', {
      columns: { 0: { kind: 'distance' }, 1: { kind: 'diameter' } },
    });
    expect(bore.status === 'read' && bore.doubts).toEqual([]);
  });
});

describe('a table that cannot be used', () => {
  it.each([
    ['nothing but words', 'Hello there', /No row has both/],
    ['one column', '12.7\n12.6\n12.5', /No row has both/],
    [
      'no distances',
      'Diameter,Diameter\n12.7,12.7\n12.6,12.8\n12.7,12.6',
      /No column is known to hold distances/,
    ],
    [
      'too many rows',
      Array.from({ length: MEASUREMENT_LIMITS.rows + 1 }, (_, index) => `${index};12,7`).join('\n'),
      /has 2001 rows; 2000 at most/,
    ],
    ['too many columns', `0;${'12,7;'.repeat(30)}`, /Row 1 has 32 columns/],
  ])('says why: %s', (_, text, message) => {
    const bore = read(text);
    expect(bore.status === 'refused' && bore.message).toMatch(message);
  });

  it('asks where commas may stand for two things', () => {
    const bore = read('10,5,12,7\n20,5,12,6\n30,5,12,5');
    expect(bore.status === 'read' && bore.table.doubt).toMatch(/semicolons/);
  });

  it('never throws, whatever is pasted', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 300 }), (text) => {
        expect(['read', 'refused']).toContain(read(text).status);
      }),
    );
    const cell = fc.constantFrom(
      '0',
      '12,7',
      '12.7',
      'mm',
      '',
      '"',
      ';',
      '\t',
      '\n',
      ',',
      ' ',
      '1/2',
      '#7',
      '-',
      'Foot',
    );
    fc.assert(
      fc.property(fc.array(cell, { maxLength: 60 }), (cells) => {
        const bore = read(cells.join(''));
        if (bore.status === 'refused') return;
        for (const { positionMm, diameterMm } of bore.readings) {
          expect(Number.isFinite(positionMm)).toBe(true);
          expect(diameterMm).toBeGreaterThan(0);
        }
      }),
    );
  });
});
