import type { Draft } from '#shared/contract/designs.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import { HttpError } from '../../http/http-error.ts';
import { refuseArchived } from '../../predicting/refuse-archived.ts';
import { predictDraft, replaceDraft } from '../../predicting/store-draft.ts';
import { readDraft } from './read-draft.ts';

/**
 * @throws HttpError 409 when the design is archived, 412 with the newer draft when someone else saved, 422 when the
 *   document cannot be built; nothing is kept of any of them
 */
export async function saveDraft(
  scope: WorkshopScope,
  seen: { designId: number; seenVersion: number },
  document: DesignDocument,
): Promise<Draft> {
  refuseArchived(await scope.visibleDesign(seen.designId));
  const saved = await replaceDraft(scope, seen, predictDraft(document));
  const newest = await readDraft(scope, seen.designId);
  if (!saved) throw newerVersion(newest);
  return newest;
}

function newerVersion(newer: Draft): HttpError {
  return new HttpError(412, 'newer-version', 'Someone else saved', {
    detail: `${newer.savedBy.name} saved a newer version of this draft. Your change was not saved; it is still on this device. Look at both, then save again.`,
    headers: { ETag: `"${newer.version}"` },
    extra: { newer },
  });
}
