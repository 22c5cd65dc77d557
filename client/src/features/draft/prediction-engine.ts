import type { DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { EngineAnswer, PredictionOptions } from '../../engine/engine-answers.ts';
import { startEngine } from '../../engine/start-engine.ts';

/** The engine as a draft asks it, wherever it runs. */
export interface PredictionEngine {
  predict: (document: DesignDocument, options: PredictionOptions) => Promise<EngineAnswer>;
  sensitivities: (document: DesignDocument) => Promise<DesignSensitivities>;
  close: () => void;
}

export function startPredictionEngine(): PredictionEngine {
  const { remote, close } = startEngine('prediction');
  return {
    predict: (document, options) => remote.predict(document, options),
    sensitivities: (document) => remote.sensitivities(document),
    close,
  };
}
