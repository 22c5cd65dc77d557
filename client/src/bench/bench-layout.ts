/** The four shapes of the bench: desk, tablet lying, tablet standing, phone. */
export type BenchLayout = 'wide' | 'tablet' | 'standing' | 'phone';

/** Sizes that change with the shape of the bench, px unless the name says otherwise. */
export interface BenchMeasures {
  marginLeft: number;
  marginRight: number;
  /** Room for the tube's widest outside, in the plan and again in the section. */
  tubePx: number;
  mostPxPerMm: number;
  stripHeight: number;
  hasSection: boolean;
  planY: number;
  sectionY: number;
  ruleY: number;
  ruleHeight: number;
  /** Least distance between columns. */
  spacing: number;
  /** Leftmost column, with and without the ladder standing at its left. */
  columnsFrom: number;
  columnsFromWithoutLadder: number;
  /** How far a column's bobs may swing out, and the beam reaches beyond the outer columns. */
  columnReach: number;
  /** From the first column to the right edge of the row labels. */
  labelGap: number;
  hangInset: number;
  ladder: boolean;
  pxPerCent: number;
  heldAtCents: number;
  /** From strip to the fingering circles, to the beam, and the rows below the beam. */
  fingeringY: number;
  beamY: number;
  rowY: readonly number[];
  rowStep: number;
  labelBelow: number;
  leftZone: { x: number; width: number };
  rowHeight: number;
}

const desk: BenchMeasures = {
  marginLeft: 37,
  marginRight: 56,
  tubePx: 85,
  mostPxPerMm: 6,
  stripHeight: 218,
  hasSection: true,
  planY: 65,
  sectionY: 153,
  ruleY: 197,
  ruleHeight: 24,
  spacing: 82,
  columnsFrom: 736,
  columnsFromWithoutLadder: 490,
  columnReach: 42,
  labelGap: 73,
  hangInset: 14,
  ladder: true,
  pxPerCent: 2.2,
  heldAtCents: 16,
  fingeringY: 22,
  beamY: 54,
  rowY: [56, 114, 172],
  rowStep: 58,
  labelBelow: 22,
  leftZone: { x: 40, width: 280 },
  rowHeight: 24,
};

const tablet: BenchMeasures = {
  ...desk,
  marginLeft: 24,
  marginRight: 24,
  tubePx: 58,
  stripHeight: 182,
  planY: 56,
  sectionY: 121,
  ruleY: 156,
  ruleHeight: 26,
  spacing: 69,
  columnsFrom: 510,
  columnsFromWithoutLadder: 510,
  columnReach: 35,
  labelGap: 65,
  hangInset: 10,
  ladder: false,
  pxPerCent: 1.9,
  heldAtCents: 13,
  rowY: [62, 128, 194],
  rowStep: 66,
  labelBelow: 23,
  leftZone: { x: 24, width: 316 },
  rowHeight: 34,
};

const standing: BenchMeasures = {
  ...tablet,
  tubePx: 50,
  stripHeight: 150,
  planY: 46,
  sectionY: 97,
  ruleY: 124,
  spacing: 56,
  columnsFrom: 160,
  columnsFromWithoutLadder: 160,
  columnReach: 28,
  rowY: [62, 142, 222],
  rowStep: 80,
  leftZone: { x: 24, width: 0 },
};

const phone: BenchMeasures = {
  ...tablet,
  marginLeft: 8,
  marginRight: 16,
  tubePx: 40,
  stripHeight: 104,
  hasSection: false,
  planY: 46,
  sectionY: 46,
  ruleY: 79,
  ruleHeight: 24,
  spacing: 52,
  columnsFrom: 32,
  columnsFromWithoutLadder: 32,
  columnReach: 26,
  labelGap: 0,
  hangInset: 0,
  pxPerCent: 1.75,
  heldAtCents: 12,
  beamY: 24,
  rowY: [112, 112, 112],
  rowStep: 0,
  labelBelow: 46,
  leftZone: { x: 16, width: 0 },
};

export const LAYOUTS: Record<BenchLayout, BenchMeasures> = { wide: desk, tablet, standing, phone };

export function layoutOf(widthPx: number): BenchLayout {
  // The window less its scroll bar.
  if (widthPx >= 1260) return 'wide';
  if (widthPx >= 1004) return 'tablet';
  return widthPx >= 684 ? 'standing' : 'phone';
}
