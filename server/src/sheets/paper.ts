/** PDF points in a millimetre: the sheet is drawn in millimetres. */
export const POINTS_PER_MM = 72 / 25.4;

/** Millimetres in a point of type size. */
export const MM_PER_POINT = 25.4 / 72;

export const MARGIN_MM = 12;

export interface Paper {
  widthMm: number;
  heightMm: number;
}

export type PaperName = 'A4' | 'Letter';

/** ISO 216 and ANSI/ASME Y14.1. */
export const PAPERS: Record<PaperName, Paper> = {
  A4: { widthMm: 210, heightMm: 297 },
  Letter: { widthMm: 215.9, heightMm: 279.4 },
};
