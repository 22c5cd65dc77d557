import type { FlowSection } from './flow.ts';
import { MARGIN_MM } from './paper.ts';
import { contentWidthMm, type SheetContext } from './sheet-context.ts';
import { drawCaption } from './table.ts';
import { tagged } from './tagging.ts';

/** Lines to fill in by hand: three to a row, or one over the whole width. */
const ROWS: readonly (readonly string[])[] = [
  ['Build number', 'Wood and blank', 'Bore air, °C'],
  ['Humidity, %', 'Length after trimming', 'Started, finished'],
  ['Notes'],
  [''],
  [''],
  ['Made by', 'Signed off by'],
];

const CAPTION_MM = 4;
const ROW_MM = 8;
const COLUMNS = 3;
const GAP_MM = 6;

/** The maker's own record of the build. */
export function recordSection(context: SheetContext): FlowSection {
  const { pen, root } = context;
  const draw = (topMm: number) => {
    tagged(pen, root, 'H3', () => drawCaption(context, topMm, { caption: 'Record' }));
    tagged(pen, root, 'P', () =>
      ROWS.forEach((labels, row) => drawLines(context, labels, topMm + CAPTION_MM + (row + 1) * ROW_MM)),
    );
  };
  return { gapMm: 5, head: { heightMm: CAPTION_MM + ROWS.length * ROW_MM, draw }, blocks: [] };
}

function drawLines(context: SheetContext, labels: readonly string[], lineY: number): void {
  const { pen } = context;
  const fullMm = contentWidthMm(context);
  const columnMm = (fullMm - (COLUMNS - 1) * GAP_MM) / COLUMNS;
  labels.forEach((label, column) => {
    const left = MARGIN_MM + column * (columnMm + GAP_MM);
    const widthMm = labels.length === 1 ? fullMm : columnMm;
    pen.line([left, lineY], [left + widthMm, lineY], { widthMm: 0.21 });
    pen.text(label, [left, lineY - 1], { size: 8.2 });
  });
}
