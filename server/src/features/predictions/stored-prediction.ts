import type { DesignPrediction, DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { StoredPrediction } from '#shared/contract/prediction.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import type { Dependencies } from '../../dependencies.ts';
import type { EnginePool } from '../../jobs/engine-pool.ts';
import { notFound } from '../../http/http-error.ts';
import type { PredictionRow } from '../../models/prediction.ts';
import { documentHash } from '../../predicting/document-hash.ts';
import { predictDocument } from '../../predicting/predict-document.ts';
import { storedDocument } from '../../predicting/stored-document.ts';

export async function readPrediction(scope: WorkshopScope, designId: number): Promise<StoredPrediction> {
  const row = await scope.predictions.findOne({
    where: { designId },
    include: [{ association: 'design', attributes: [], required: true, where: scope.visibleDesigns() }],
  });
  if (row === null) throw notFound();
  return presentPrediction(row);
}

/** Predicts what is stored, never what a client sends: the answer belongs to a version of the draft. */
export async function predictStoredDraft(
  { engine }: Dependencies,
  scope: WorkshopScope,
  designId: number,
): Promise<StoredPrediction> {
  await scope.visibleDesign(designId);
  // Someone may save while we compute; then the figures are of an older version, and we begin again.
  while (!(await predictNewest(engine, scope, designId)));
  return readPrediction(scope, designId);
}

/** Returns whether the version that was predicted was still the newest when its figures were stored. */
async function predictNewest(engine: EnginePool, scope: WorkshopScope, designId: number): Promise<boolean> {
  const draft = await scope.drafts.findOne({ where: { designId } });
  if (draft === null) throw notFound();
  const document = storedDocument(draft.document);
  const prediction = predictDocument(document);
  const changed = await scope.predictions.update(
    {
      engine: prediction.engine,
      documentHash: documentHash(document),
      prediction: JSON.stringify(prediction),
      sensitivities: JSON.stringify(await engine.sensitivities(document)),
      computedAt: new Date(),
    },
    { where: { designId, draftVersion: draft.version } },
  );
  return changed > 0;
}

function presentPrediction(row: PredictionRow): StoredPrediction {
  return {
    draftVersion: row.draftVersion,
    documentHash: row.documentHash,
    computedAt: row.computedAt.toISOString(),
    // Both were written by this server from the engine's own results.
    prediction: JSON.parse(row.prediction) as DesignPrediction,
    sensitivities: row.sensitivities === null ? null : (JSON.parse(row.sensitivities) as DesignSensitivities),
  };
}
