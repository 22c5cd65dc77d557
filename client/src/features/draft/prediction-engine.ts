import type { DesignPrediction, DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { DocumentFault } from '#shared/document/document-faults.ts';

export interface PredictionOptions {
  /** Whether openings feel each other's radiation. */
  coupling: boolean;
}

export type EngineAnswer =
  { status: 'predicted'; prediction: DesignPrediction } | { status: 'failed'; faults: DocumentFault[] };

/** The engine as the bench asks it, wherever it runs. */
export interface PredictionEngine {
  predict: (document: DesignDocument, options: PredictionOptions) => Promise<EngineAnswer>;
  sensitivities: (document: DesignDocument, options: PredictionOptions) => Promise<DesignSensitivities>;
  close: () => void;
}
