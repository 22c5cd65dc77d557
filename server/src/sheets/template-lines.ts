import { HAIRLINE_MM } from './pen.ts';

/** Lines of a template, each as thick as what it says is certain. Dashes: stroke and gap, mm. */
export const CUT_LINE = { widthMm: 0.18 };
export const FINAL_LINE = { widthMm: 0.35 };
export const PILOT_LINE = { widthMm: 0.16, dashMm: [0.8, 0.6] } as const;
export const OPENING_LINE = { widthMm: 0.3 };
export const HAIR_LINE = { widthMm: HAIRLINE_MM };
export const FOLD_LINE = { widthMm: 0.13, dashMm: [1.2, 1.2] } as const;
export const REFERENCE_LINE = { widthMm: 0.7 };

export const SMALL_WORDS = { size: 8 } as const;
export const WORDS = { size: 8.8 } as const;
