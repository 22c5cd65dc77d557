import { EngineInputError } from '#shared/acoustics/engine-input-error.ts';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import { fieldPath } from '#shared/contract/problem.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { documentFaults } from '#shared/document/document-faults.ts';
import { unprocessable } from '../http/http-error.ts';

/**
 * Predicts a document that came in, or says what of it cannot be built.
 *
 * @throws HttpError 422 with every fault by its path under `document`
 */
export function predictDocument(document: DesignDocument): DesignPrediction {
  const faults = documentFaults(document);
  const [first] = faults;
  if (first !== undefined) {
    const errors = faults.map(({ path, message }) => ({ path: fieldPath(['document', ...path]), message }));
    throw unprocessable(first.message, errors);
  }
  try {
    return predictDesign(document);
  } catch (error) {
    // The engine's own refusals name a field of the document too.
    if (!(error instanceof EngineInputError)) throw error;
    throw unprocessable(error.message, [{ path: `document.${error.field}`, message: error.message }]);
  }
}
