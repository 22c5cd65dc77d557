import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { lowestNote, rackView } from '#shared/rules/design-summary.ts';
import type { WorkshopScope } from '../db/workshop-scope.ts';
import { documentHash } from './document-hash.ts';
import { predictDocument } from './predict-document.ts';

/** A draft about to be stored, with its prediction: one is never kept without the other. */
export interface PredictedDraft {
  document: DesignDocument;
  prediction: DesignPrediction;
  savedAt: Date;
}

/** @throws HttpError 422 when the document cannot be predicted */
export function predictDraft(document: DesignDocument): PredictedDraft {
  return { document, prediction: predictDocument(document), savedAt: new Date() };
}

/** Stores a new design with the first version of its draft; returns its id. */
export async function createDesign(scope: WorkshopScope, draft: PredictedDraft): Promise<number> {
  return scope.inTransaction(async (within) => {
    const { personId } = within.caller;
    const design = await within.designs.create({ ...designColumns(within, draft, 1), createdById: personId });
    await within.drafts.create({
      designId: design.id,
      version: 1,
      document: JSON.stringify(draft.document),
      savedById: personId,
      savedAt: draft.savedAt,
    });
    await putPrediction(within, { designId: design.id, version: 1 }, draft);
    return design.id;
  });
}

/**
 * Stores the next version of a draft, if `seenVersion` is still the newest.
 *
 * @returns false when someone else was faster, and then nothing is kept
 */
export async function replaceDraft(
  scope: WorkshopScope,
  { designId, seenVersion }: { designId: number; seenVersion: number },
  draft: PredictedDraft,
): Promise<boolean> {
  return scope.inTransaction(async (within) => {
    const version = seenVersion + 1;
    const changed = await within.drafts.update(
      {
        version,
        document: JSON.stringify(draft.document),
        savedById: within.caller.personId,
        savedAt: draft.savedAt,
      },
      { where: { designId, version: seenVersion } },
    );
    if (changed === 0) return false;
    await within.designs.update(designColumns(within, draft, version), { where: { id: designId } });
    await putPrediction(within, { designId, version }, draft);
    return true;
  });
}

function designColumns(
  scope: WorkshopScope,
  { document, prediction, savedAt }: PredictedDraft,
  version: number,
) {
  const lowest = lowestNote(document);
  return {
    name: document.name,
    kind: document.mouthEnd.kind,
    lowestNote: lowest?.name ?? null,
    lowestMidi: lowest?.midi ?? null,
    temperament: document.pitch.temperament,
    a4Hz: document.pitch.a4Hz,
    draftVersion: version,
    rackView: JSON.stringify(rackView(document, prediction)),
    changedById: scope.caller.personId,
    changedAt: savedAt,
  };
}

async function putPrediction(
  scope: WorkshopScope,
  { designId, version }: { designId: number; version: number },
  { document, prediction, savedAt }: PredictedDraft,
): Promise<void> {
  await scope.predictions.put({
    designId,
    draftVersion: version,
    engine: prediction.engine,
    documentHash: documentHash(document),
    prediction: JSON.stringify(prediction),
    sensitivities: null,
    computedAt: savedAt,
  });
}
