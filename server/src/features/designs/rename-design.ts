import type { DesignSummary } from '#shared/contract/designs.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import { notFound } from '../../http/http-error.ts';
import { refuseArchived } from '../../predicting/refuse-archived.ts';
import { predictDraft, replaceDraft } from '../../predicting/store-draft.ts';
import { storedDocument } from '../../predicting/stored-document.ts';
import { readDesign } from './read-design.ts';

/** @throws HttpError 409 when the design is archived */
export async function renameDesign(scope: WorkshopScope, id: number, name: string): Promise<DesignSummary> {
  const design = await scope.visibleDesign(id);
  refuseArchived(design);
  // A name says nothing about any other value of the draft, so it goes on top of whatever is newest.
  while (!(await renameNewest(scope, id, name)));
  return readDesign(scope, id);
}

async function renameNewest(scope: WorkshopScope, designId: number, name: string): Promise<boolean> {
  const draft = await scope.drafts.findOne({ where: { designId } });
  if (draft === null) throw notFound();
  const document = { ...storedDocument(draft.document), name };
  return replaceDraft(scope, { designId, seenVersion: draft.version }, predictDraft(document));
}
