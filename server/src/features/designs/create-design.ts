import type { DesignSummary } from '#shared/contract/designs.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import { createDesign, predictDraft } from '../../predicting/store-draft.ts';
import { readDesign } from './read-design.ts';

/** @throws HttpError 422 when the document cannot be built, and then nothing is kept */
export async function createDesignFrom(
  scope: WorkshopScope,
  document: DesignDocument,
): Promise<DesignSummary> {
  return readDesign(scope, await createDesign(scope, predictDraft(document)));
}
