import type { DesignPrediction, DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import type { PaperName } from './paper.ts';

/** `both` writes the workshop's own unit and the other one after it in brackets. */
export type SheetUnit = LengthUnit | 'both';

/** States in which a print is for looking at only. */
export type UnapprovedState = 'draft' | 'in-review' | 'changes-asked';

/** Everything that a drilling sheet says; the drawing reads nothing else. */
export interface SheetInput {
  document: DesignDocument;
  prediction: DesignPrediction;
  sensitivities: DesignSensitivities;
  workshop: {
    name: string;
    unit: LengthUnit;
    referenceEnd: 'foot' | 'mouth';
    /** Band for sign-off, ± cents, register 1 first. */
    bandCents: readonly number[];
  };
  revision: { number: number; state: UnapprovedState; draftSavedAt: Date };
  printedAt: Date;
  paper: PaperName;
  unit: SheetUnit;
  drawnBy: string;
}
