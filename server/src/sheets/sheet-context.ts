import { MARGIN_MM } from './paper.ts';
import type { Pen } from './pen.ts';
import type { SheetInput } from './sheet-input.ts';
import type { LengthWriting } from './sheet-lengths.ts';
import type { TaggedElement } from './tagging.ts';

/** What every part of a sheet draws with. */
export interface SheetContext {
  pen: Pen;
  input: SheetInput;
  writing: LengthWriting;
  /** The root of the PDF's structure. */
  root: TaggedElement;
}

export const TITLE_BLOCK_HEIGHT_MM = 26;
const FOOT_HEIGHT_MM = 8.6;

export function contentWidthMm({ pen }: SheetContext): number {
  return pen.paper.widthMm - 2 * MARGIN_MM;
}

export const CONTENT_TOP_MM = MARGIN_MM + TITLE_BLOCK_HEIGHT_MM + 4;

export function contentBottomMm(paper: Pen['paper']): number {
  return paper.heightMm - MARGIN_MM - FOOT_HEIGHT_MM;
}
