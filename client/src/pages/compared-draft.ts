import type { DesignSummary } from '#shared/contract/designs.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';

/** One side of a comparison as the workshop has it stored. */
export interface ComparedDraft {
  design: DesignSummary;
  document: DesignDocument;
}
