import { fitText, fittedHeightMm, writeInBox, writeLines, type TextBox } from './fitted-text.ts';
import type { FlowSection } from './flow.ts';
import { CAP_HEIGHT, SMALLEST_TYPE } from './fitted-text.ts';
import { MARGIN_MM, MM_PER_POINT } from './paper.ts';
import type { Point, TextStyle } from './pen.ts';
import { contentWidthMm, type SheetContext } from './sheet-context.ts';
import { decoration, group, tagged, type TaggedElement } from './tagging.ts';

export interface CellBox extends TextBox {
  at: Point;
}

export interface TableCell {
  text: string;
  /** A second figure in the smallest type under the first. */
  below?: string;
  /** `key` is a figure to work by, `head` names the row, `write` is left white for a pencil. */
  look?: 'plain' | 'key' | 'head' | 'write';
  align?: 'left' | 'centre';
  /** Columns that the cell takes. */
  span?: number;
  picture?: { alt: string; draw: (box: CellBox) => void };
}

export interface HeadCell {
  text: string;
  column: number;
  span?: number;
  /** Rows of the head that the cell takes. */
  rows?: number;
}

export interface TableSpec {
  caption: string;
  /** In small type after the caption. */
  note?: string;
  widthsMm: readonly number[];
  head: readonly (readonly HeadCell[])[];
  headRowMm: number;
  rowMm: number;
  rows: readonly (readonly TableCell[])[];
  gapMm: number;
}

const GRID = { widthMm: 0.18, colour: '#555555' };
const WRITE_LINE = { widthMm: 0.35 };
const HEAD_TINT = '#eef0ee';
const CAPTION_MM = 5.6;
const PADDING_MM = 0.8;
const LEFT_PADDING_MM = 1.6;

const LOOKS: Record<NonNullable<TableCell['look']>, TextStyle> = {
  plain: { size: 9 },
  key: { size: 10.6, weight: 700 },
  head: { size: 11, weight: 700 },
  write: { size: 9 },
};

/** Widths in their proportions, stretched or shrunk to fill the page. */
export function filledWidths(context: SheetContext, shares: readonly number[]): number[] {
  const sum = shares.reduce((total, share) => total + share, 0);
  return shares.map((share) => (share / sum) * contentWidthMm(context));
}

/** A ruled table that runs over as many pages as it takes, tagged as a table. */
export function tableSection(context: SheetContext, spec: TableSpec): FlowSection {
  let table: TaggedElement | null = null;
  const element = () => (table ??= group(context.pen, context.root, 'Table', { title: spec.caption }));
  return {
    gapMm: spec.gapMm,
    head: {
      heightMm: CAPTION_MM + spec.head.length * spec.headRowMm,
      draw: (topMm, isContinued) => {
        if (isContinued) decoration(context.pen, () => drawContinuedHead(context, spec, topMm));
        else drawHead(context, spec, { topMm, table: element() });
      },
    },
    blocks: spec.rows.map((cells) => ({
      heightMm: spec.rowMm,
      draw: (topMm) => drawRow(context, spec, { cells, topMm, table: element() }),
    })),
  };
}

export function drawCaption({ pen }: SheetContext, topMm: number, words: { caption: string; note?: string }) {
  const style = { size: 11.5, weight: 700 } as const;
  pen.text(words.caption, [MARGIN_MM, topMm + 3.6], style);
  if (words.note === undefined) return;
  const from = MARGIN_MM + pen.textWidthMm(words.caption, style) + 2.6;
  const box = { widthMm: pen.paper.widthMm - MARGIN_MM - from, heightMm: 2.4 };
  writeLines(pen, fitText(pen, words.note, box, { size: 8.6 }), [from, topMm + 3.6], { size: 8.6 });
}

function headBox(spec: TableSpec, cell: HeadCell, place: { row: number; topMm: number }): CellBox {
  return {
    at: [
      MARGIN_MM + sum(spec.widthsMm.slice(0, cell.column)),
      place.topMm + CAPTION_MM + place.row * spec.headRowMm,
    ],
    widthMm: sum(spec.widthsMm.slice(cell.column, cell.column + (cell.span ?? 1))),
    heightMm: spec.headRowMm * (cell.rows ?? 1),
  };
}

function drawContinuedHead(context: SheetContext, spec: TableSpec, topMm: number): void {
  drawCaption(context, topMm, { caption: `${spec.caption} (continued)` });
  spec.head.forEach((cells, row) =>
    cells.forEach((cell) => {
      const box = headBox(spec, cell, { row, topMm });
      drawHeadGround(context, box);
      drawHeadText(context, cell, box);
    }),
  );
}

function drawHead(
  context: SheetContext,
  spec: TableSpec,
  { topMm, table }: { topMm: number; table: TaggedElement },
): void {
  const { pen } = context;
  tagged(pen, table, 'Caption', () => drawCaption(context, topMm, spec));
  spec.head.forEach((cells, row) => {
    const boxes = cells.map((cell) => ({ cell, box: headBox(spec, cell, { row, topMm }) }));
    decoration(pen, () => boxes.forEach(({ box }) => drawHeadGround(context, box)));
    const line = group(pen, table, 'TR');
    boxes.forEach(({ cell, box }) => {
      const type = { type: 'TH', tag: { scope: 'Column' as const } };
      tagged(pen, line, type, () => drawHeadText(context, cell, box));
    });
  });
}

function drawHeadGround({ pen }: SheetContext, { at, widthMm, heightMm }: CellBox): void {
  pen.fillRect(at, widthMm, heightMm, HEAD_TINT);
  pen.strokeRect(at, widthMm, heightMm, GRID);
}

function drawHeadText({ pen }: SheetContext, { text }: HeadCell, box: CellBox): void {
  writeInBox(pen, text, inset(box, 0.4), { size: SMALLEST_TYPE, align: 'centre' });
}

function inset({ at: [x, y], widthMm, heightMm }: CellBox, mm: number): CellBox {
  return {
    at: [x + mm, y + mm],
    widthMm: widthMm - 2 * mm,
    heightMm: heightMm - 2 * mm,
  };
}

interface RowPlace {
  cells: readonly TableCell[];
  topMm: number;
  table: TaggedElement;
}

function drawRow(context: SheetContext, spec: TableSpec, { cells, topMm, table }: RowPlace): void {
  const { pen } = context;
  let column = 0;
  const placed = cells.map((cell) => {
    const x = MARGIN_MM + sum(spec.widthsMm.slice(0, column));
    const widthMm = sum(spec.widthsMm.slice(column, column + (cell.span ?? 1)));
    column += cell.span ?? 1;
    return { cell, box: { at: [x, topMm], widthMm, heightMm: spec.rowMm } satisfies CellBox };
  });
  decoration(pen, () => placed.forEach(({ cell, box }) => drawCellGround(context, cell, box)));
  const line = group(pen, table, 'TR');
  placed.forEach(({ cell, box }) => {
    const type =
      cell.look === 'head' ? { type: 'TH', tag: { scope: 'Row' as const } } : { type: 'TD', tag: {} };
    const { picture } = cell;
    if (picture !== undefined) {
      const element = group(pen, line, type.type);
      tagged(pen, element, { type: 'Figure', tag: { alt: picture.alt } }, () => picture.draw(box));
    } else {
      tagged(pen, line, type, () => drawCellText(context, cell, box));
    }
  });
}

function drawCellGround({ pen }: SheetContext, { look }: TableCell, box: CellBox): void {
  const [x, y] = box.at;
  if (look === 'write') pen.fillRect(box.at, box.widthMm, box.heightMm, '#ffffff');
  pen.strokeRect(box.at, box.widthMm, box.heightMm, GRID);
  if (look === 'write') {
    const lineY = y + box.heightMm - WRITE_LINE.widthMm / 2;
    pen.line([x, lineY], [x + box.widthMm, lineY], WRITE_LINE);
  }
}

/** The figure, and under it the second one, together in the middle of the cell. */
function drawCellText({ pen }: SheetContext, cell: TableCell, box: CellBox): void {
  const { text, below = '', look = 'plain', align = 'centre' } = cell;
  const style: TextStyle = { ...LOOKS[look], align };
  const [x, y] = box.at;
  const paddingMm = align === 'left' ? LEFT_PADDING_MM : PADDING_MM;
  const widthMm = box.widthMm - paddingMm - PADDING_MM;
  if (below === '') {
    writeInBox(
      pen,
      text,
      { at: [x + paddingMm, y + 0.6], widthMm, heightMm: box.heightMm - 1.2 },
      { ...style },
    );
    return;
  }
  const small: TextStyle = { size: SMALLEST_TYPE, align };
  const main = fitText(pen, text, { widthMm, heightMm: 3 }, style);
  const gapMm = 0.9;
  const roomMm = box.heightMm - fittedHeightMm(main) - gapMm - 1;
  const second = fitText(pen, below, { widthMm, heightMm: roomMm }, small);
  const top = y + (box.heightMm - fittedHeightMm(main) - gapMm - fittedHeightMm(second)) / 2;
  const at = x + paddingMm + (align === 'left' ? 0 : widthMm / 2);
  writeLines(pen, main, [at, top + main.size * CAP_HEIGHT * MM_PER_POINT], style);
  const secondTop = top + fittedHeightMm(main) + gapMm;
  writeLines(pen, second, [at, secondTop + second.size * CAP_HEIGHT * MM_PER_POINT], small);
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
