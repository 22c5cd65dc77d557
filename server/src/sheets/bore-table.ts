import { printLength } from '#shared/lengths/print-length.ts';
import { boreRows, type BoreRow } from './bore-rows.ts';
import type { FlowSection } from './flow.ts';
import type { SheetContext } from './sheet-context.ts';
import { diameterInWords, lengthInWords, spanInWords } from './sheet-lengths.ts';
import { filledWidths, tableSection, type TableCell } from './table.ts';
import { benchReading } from './template-frame.ts';

const SHARES = [10, 54, 34, 34, 13, 41, 20];
const ROW_MM = 8;

/** A measured bore has hundreds of stations: its rows are set closer, or they would fill a book. */
const CLOSE_ROW_MM = 5.6;
const MANY_ROWS = 12;

const NOTHING = '–';

/** Bore, outside and mouth end in working order, with room for what was measured. */
export function boreTableSection(context: SheetContext): FlowSection {
  const { document, workshop } = context.input;
  const rows = boreRows(document);
  const reference = workshop.referenceEnd === 'foot' ? 'From foot' : 'From mouth end';
  const heads = ['Step', 'What', reference, 'Diameter', '±', 'Check with', 'Measured'];
  return tableSection(context, {
    caption: 'Bore and reamers',
    note: 'spans and depths along the axis; where two diameters stand, in the order of the span',
    widthsMm: filledWidths(context, SHARES),
    head: [heads.map((text, column) => ({ text, column }))],
    headRowMm: 5.2,
    rowMm: rows.length > MANY_ROWS ? CLOSE_ROW_MM : ROW_MM,
    rows: rows.map((row) => boreCells(context, row)),
    gapMm: 6,
  });
}

function boreCells(context: SheetContext, row: BoreRow): TableCell[] {
  const { writing } = context;
  const digits = writing.unit === 'mm' ? 2 : 3;
  return [
    { text: row.step, look: 'head' },
    { text: [row.what, openingWords(context, row)].filter((part) => part !== '').join(' '), align: 'left' },
    { text: spanWords(context, row) },
    { text: diameterWords(context, row), look: 'key' },
    { text: row.toleranceMm === null ? NOTHING : printLength(row.toleranceMm, writing.unit, digits) },
    { text: row.checkWith, align: 'left' },
    { text: '', look: 'write' },
  ];
}

/** From the reference end outward, so that the first figure is the smaller one. */
function spanWords(context: SheetContext, { footwardMm, mouthwardMm }: BoreRow): string {
  const reading = benchReading(context);
  const ends = [reading(footwardMm), reading(mouthwardMm)];
  const [from = 0, to = 0] = context.input.workshop.referenceEnd === 'foot' ? ends : ends.reverse();
  if (Math.abs(from - to) < 1e-9) return `at ${spanInWords(from, context.writing)}`;
  return `${spanInWords(from, context.writing)} to ${spanInWords(to, context.writing)}`;
}

function diameterWords({ writing, input }: SheetContext, { diametersMm }: BoreRow): string {
  if (diametersMm === null) return NOTHING;
  const { footward, mouthward } = diametersMm;
  const ends = input.workshop.referenceEnd === 'foot' ? [footward, mouthward] : [mouthward, footward];
  const [from = 0, to = 0] = ends;
  if (Math.abs(from - to) < 0.005) return diameterInWords(from, writing);
  return `${diameterInWords(from, writing)} to ${diameterInWords(to, writing)}`;
}

/** Sizes of the opening at the mouth end, which has no diameter. */
function openingWords({ input, writing }: SheetContext, { what }: BoreRow): string {
  const { mouthEnd } = input.document;
  const length = (mm: number) => lengthInWords(mm, writing);
  if (mouthEnd.kind === 'window' && what === 'Window') {
    return `${length(mouthEnd.widthMm)} across, ${length(mouthEnd.lengthMm)} along, ramp ${mouthEnd.rampDeg}°`;
  }
  if (mouthEnd.kind === 'embouchure' && what === 'Embouchure hole') {
    return `${length(mouthEnd.widthMm)} across, ${length(mouthEnd.lengthMm)} along, chimney ${length(mouthEnd.chimneyMm)}`;
  }
  return '';
}
