import { fitText, writeInBox, writeLines } from './fitted-text.ts';
import { notApprovedWords } from './not-approved.ts';
import { MARGIN_MM } from './paper.ts';
import { contentWidthMm, TITLE_BLOCK_HEIGHT_MM, type SheetContext } from './sheet-context.ts';
import { printDay } from './sheet-dates.ts';
import { tagged } from './tagging.ts';

export interface PageTitle {
  /** What this page is. */
  subtitle: string;
  page: number;
  pages: number;
}

/** A page without this line is plainly torn. */
const FRAME = { widthMm: 0.42 };
const RULE = { widthMm: 0.21 };

const CODE_WIDTH_MM = 65;
const CELLS_HEIGHT_MM = 10.8;
const PADDING_MM = 3;
const QR_MM = 21;

/** The block at the top of every page: what it is, of which revision, and whether it may be drilled from. */
export function drawTitleBlock(context: SheetContext, title: PageTitle): void {
  const { pen, root } = context;
  const widthMm = contentWidthMm(context);
  const leftMm = widthMm - CODE_WIDTH_MM;
  const cellsTop = MARGIN_MM + TITLE_BLOCK_HEIGHT_MM - CELLS_HEIGHT_MM;
  tagged(pen, root, title.page === 1 ? 'H1' : 'P', () => {
    pen.strokeRect([MARGIN_MM, MARGIN_MM], widthMm, TITLE_BLOCK_HEIGHT_MM, FRAME);
    pen.line([MARGIN_MM, cellsTop], [MARGIN_MM + leftMm, cellsTop], RULE);
    pen.line([MARGIN_MM + leftMm, MARGIN_MM], [MARGIN_MM + leftMm, MARGIN_MM + TITLE_BLOCK_HEIGHT_MM], RULE);
    drawName(context, leftMm - 2 * PADDING_MM);
  });
  tagged(pen, root, title.page === 1 ? 'P' : 'H2', () => {
    pen.text(title.subtitle, [MARGIN_MM + PADDING_MM, cellsTop - 1.9], { size: 10.5 });
  });
  tagged(pen, root, 'P', () => drawCells(context, title, { topMm: cellsTop, widthMm: leftMm }));
  tagged(pen, root, 'P', () => drawNoCode(context, MARGIN_MM + leftMm));
}

function drawName({ pen, input }: SheetContext, widthMm: number): void {
  const style = { size: 17, weight: 700 } as const;
  const box = { widthMm, heightMm: 8.2 };
  writeInBox(pen, input.document.name, { ...box, at: [MARGIN_MM + PADDING_MM, MARGIN_MM + 1.2] }, style);
}

interface Cell {
  label: string;
  value: string;
  widthMm: number;
}

function drawCells(
  context: SheetContext,
  { page, pages }: PageTitle,
  { topMm, widthMm }: { topMm: number; widthMm: number },
): void {
  const { pen, input } = context;
  const { revision } = input;
  const cells: Cell[] = [
    {
      label: 'Revision',
      value: revision.state === 'draft' ? `${revision.number}, draft` : String(revision.number),
      widthMm: 18.4,
    },
    { label: 'Sheet', value: 'none', widthMm: 13 },
    { label: 'Page', value: `${page} of ${pages}`, widthMm: 18 },
    { label: 'Printed', value: printDay(input.printedAt), widthMm: 25 },
  ];
  let x = MARGIN_MM;
  for (const cell of cells) {
    pen.text(cell.label, [x + 2, topMm + 4], { size: 8 });
    const style = { size: 11.5, weight: 600 } as const;
    const box = { widthMm: cell.widthMm - 3, heightMm: 4 };
    const fitted = fitText(pen, cell.value, box, style);
    writeLines(pen, fitted, [x + 2, topMm + 9], style);
    x += cell.widthMm;
    pen.line([x, topMm], [x, topMm + CELLS_HEIGHT_MM], RULE);
  }
  pen.text('Not approved', [x + 2, topMm + 4.9], { size: 12, weight: 700 });
  const words = fitText(
    pen,
    notApprovedWords(revision),
    { widthMm: MARGIN_MM + widthMm - x - 3, heightMm: 3 },
    { size: 8.5 },
  );
  writeLines(pen, words, [x + 2, topMm + 9], { size: 8.5 });
}

/** An unapproved print has no code; the place of the picture code stays empty and says so. */
function drawNoCode({ pen }: SheetContext, xMm: number): void {
  const x = xMm + 3.5;
  pen.text('Check code', [x, MARGIN_MM + 8.2], { size: 8 });
  pen.text('none issued', [x, MARGIN_MM + 13.6], { size: 12, weight: 600 });
  pen.text('a code comes with approval', [x, MARGIN_MM + 18.2], { size: 8 });
  const left = xMm + CODE_WIDTH_MM - QR_MM - 2.2;
  const top = MARGIN_MM + (TITLE_BLOCK_HEIGHT_MM - QR_MM) / 2;
  pen.strokeRect([left, top], QR_MM, QR_MM, { widthMm: 0.35, dashMm: [1.4, 1] });
  pen.text('no code', [left + QR_MM / 2, top + QR_MM / 2 + 1], { size: 8, align: 'centre' });
}
