import { formatCents } from '#shared/music/cents.ts';
import type { Drill } from '#shared/lengths/drills.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import { referenceName } from './bench-position.ts';
import type { FlowSection } from './flow.ts';
import { DIAMETER_TOLERANCE_MM, holeRows, POSITION_TOLERANCE_MM, type HoleRow } from './hole-rows.ts';
import type { SheetContext } from './sheet-context.ts';
import { writeDiameter, writeLength, type WrittenLength } from './sheet-lengths.ts';
import { filledWidths, tableSection, type HeadCell, type TableCell } from './table.ts';

const NOTHING = '–';
/** Room for a carpenter's pencil. */
const ROW_MM = 11;

/** A row whose figures have another unit under them and a drill's name under that. */
const TALL_ROW_MM = 13.6;

/** Columns from left to right; figures in inches are longer, and so are those with a second unit in brackets. */
const SHARES_MM = [10, 15.4, 12.6, 8.4, 9, 9, 20, 8.4, 9.4, 9.4, 12, 8.8, 9.4, 12.4, 8.8, 10, 9.6];
const SHARES_LONG = [9.4, 15.4, 12.6, 9.6, 11, 11, 19.6, 9.6, 9, 11, 12.4, 8.4, 9.4, 12.2, 8.4, 9.6, 9];

/** Every hole in drilling order, from the foot upward, with two boxes to write in. */
export function holeTableSection(context: SheetContext): FlowSection {
  const { input } = context;
  const { referenceEnd } = input.workshop;
  return tableSection(context, {
    caption: 'Holes, in drilling order',
    note: `positions from the ${referenceName(input.document, referenceEnd)} to the centre of the hole; angles clockwise, seen from the foot`,
    widthsMm: filledWidths(context, context.writing.besides === 'nothing' ? SHARES_MM : SHARES_LONG),
    head: holeHead(input.workshop.referenceEnd),
    headRowMm: 6.2,
    rowMm: context.writing.besides === 'other-unit' ? TALL_ROW_MM : ROW_MM,
    rows: holeRows(input).map((row) => holeCells(context, row)),
    gapMm: 2,
  });
}

function holeHead(referenceEnd: 'foot' | 'mouth'): HeadCell[][] {
  return [
    [
      { text: 'Hole', column: 0, rows: 2 },
      { text: 'Position', column: 1, span: 3 },
      { text: 'Drills and limit', column: 4, span: 5 },
      { text: 'Chim- ney', column: 9, rows: 2 },
      { text: 'Under- cut', column: 10, rows: 2 },
      { text: 'Angle', column: 11, rows: 2 },
      { text: 'Cents per 0.1 mm', column: 12, span: 2 },
      { text: 'Tunes', column: 14, rows: 2 },
      { text: 'Write in', column: 15, span: 2 },
    ],
    [
      { text: referenceEnd === 'foot' ? 'from foot' : 'from mouth', column: 1 },
      { text: 'from last', column: 2 },
      { text: '±', column: 3 },
      { text: 'pilot', column: 4 },
      { text: 'then', column: 5 },
      { text: 'final', column: 6 },
      { text: '±', column: 7 },
      { text: 'never over', column: 8 },
      { text: 'wider', column: 12 },
      { text: 'footward', column: 13 },
      { text: 'drilled', column: 15 },
      { text: 'cents', column: 16 },
    ],
  ];
}

function holeCells(context: SheetContext, row: HoleRow): TableCell[] {
  const { writing, input } = context;
  const { hole } = row;
  const length = (mm: number) => cellOf(writeLength(mm, writing));
  const tolerance = (mm: number) => ({ text: printLength(mm, writing.unit, writing.unit === 'mm' ? 2 : 3) });
  const position = length(row.fromReferenceMm);
  return [
    { text: row.label, look: 'head', ...nameBelow(row) },
    {
      ...position,
      look: 'key',
      ...(input.workshop.referenceEnd === 'mouth' && {
        below: [position.below, `foot ${writeLength(row.fromFootMm, writing).main}`]
          .filter((part) => part !== '')
          .join(' '),
      }),
    },
    row.fromLastMm === null ? { text: NOTHING } : length(row.fromLastMm),
    tolerance(POSITION_TOLERANCE_MM),
    drillCell(context, row.pilot),
    drillCell(context, row.then),
    { text: writeDiameter(hole.diameterMm, writing).main, look: 'key', below: finalDrillWords(context, row) },
    tolerance(DIAMETER_TOLERANCE_MM),
    // The limit is the allowance that an approval gives; without one there is none to name.
    { text: NOTHING },
    length(row.chimneyMm),
    undercutCell(context, row),
    { text: `${formatAngle(hole.angleDeg)}°` },
    { text: row.centsWider === null ? NOTHING : formatCents(row.centsWider) },
    { text: row.centsFootward === null ? NOTHING : formatCents(row.centsFootward) },
    { text: row.tunes ?? NOTHING },
    { text: '', look: 'write' },
    { text: '', look: 'write' },
  ];
}

function cellOf({ main, besides }: WrittenLength): { text: string; below: string } {
  return { text: main, below: besides };
}

function nameBelow({ hole, label }: HoleRow): { below?: string } {
  const name = hole.name.trim();
  return name === '' || name === label ? {} : { below: name };
}

/** Shanks of the inch sets carry names; their size follows. */
function drillCell({ writing }: SheetContext, drill: Drill | null): TableCell {
  if (drill === null) return { text: NOTHING };
  if (drill.set === 'metric-0.1' || drill.set === 'metric-0.5') {
    return cellOf(writeLength(drill.diameterMm, writing));
  }
  return { text: drill.name, below: printLength(drill.diameterMm, 'inch') };
}

/** The drill that opens the hole: besides its size only when its name or its size is another than the hole's. */
function finalDrillWords({ writing }: SheetContext, { hole, finalDrill }: HoleRow): string {
  const { besides } = writeDiameter(hole.diameterMm, writing);
  const other = writing.besides === 'other-unit' ? besides : '';
  if (finalDrill === null) return [other, 'no drill'].filter((part) => part !== '').join(' ');
  const differenceMm = finalDrill.diameterMm - hole.diameterMm;
  const isExact = Math.abs(differenceMm) < 1e-3;
  if (isExact) return writing.unit === 'inch' ? finalDrill.name : other;
  const digits = writing.unit === 'mm' ? 2 : 3;
  const words = `nearest ${finalDrill.name}, ${printLength(differenceMm, writing.unit, digits)}`;
  return [other, words].filter((part) => part !== '').join(' ');
}

function undercutCell({ writing }: SheetContext, { hole }: HoleRow): TableCell {
  if (hole.undercut === null) return { text: NOTHING };
  const to = writeDiameter(hole.undercut.innerDiameterMm, writing).main;
  const deep = writeLength(hole.undercut.depthMm, writing).main;
  return { text: `to ${to}`, below: `${deep} deep` };
}

/** Between −180 and 180, where 180 is under the body. */
export function formatAngle(angleDeg: number): string {
  const turned = ((((angleDeg + 180) % 360) + 360) % 360) - 180;
  const degrees = Math.round((turned === -180 ? 180 : turned) * 10) / 10;
  return String(degrees === 0 ? 0 : degrees).replace('-', '\u2212');
}
