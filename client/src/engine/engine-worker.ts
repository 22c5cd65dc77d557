import { expose } from 'comlink';
import { EngineInputError } from '#shared/acoustics/engine-input-error.ts';
import { designSensitivities } from '#shared/analysis/design-sensitivities.ts';
import { impedanceCurve } from '#shared/analysis/impedance-curve.ts';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import type { DesignSensitivities } from '#shared/analysis/prediction.ts';
import { standingWave } from '#shared/analysis/standing-wave.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { readDocument } from '#shared/document/read-document.ts';
import { transformDesign } from '#shared/transform/transform-design.ts';
import type { EngineAnswer, PredictionOptions, Studies, StudyKind } from './engine-answers.ts';
import { widerHere } from './wider-here.ts';

const RIBBON_POINTS = 160;
const CURVE_FROM_HZ = 40;
const CURVE_POINTS = 900;

const studies: { [Kind in StudyKind]: (ask: Studies[Kind]['ask']) => Studies[Kind]['answer'] } = {
  prediction: ({ document, options = {} }) => predictDesign(document, options),
  'wider-here': ({ document, fingerings }) => widerHere(document, fingerings),
  impedance: ({ document, fingering, toHz, coupling }) =>
    impedanceCurve(
      document,
      fingering,
      { fromHz: CURVE_FROM_HZ, toHz, stepHz: (toHz - CURVE_FROM_HZ) / CURVE_POINTS },
      coupling,
    ),
  transform: ({ document, order }) => transformDesign(document, order),
  ribbons: ({ document, fingering, resonances, coupling }) =>
    resonances.map(({ mode, frequencyHz }) => ({
      mode,
      frequencyHz,
      points: standingWave(document, fingering, { frequencyHz, points: RIBBON_POINTS, coupling }),
    })),
};

/** The engine beside the page, so that neither drag nor typing waits for the acoustics. */
const worker = {
  predict(document: DesignDocument, options: PredictionOptions): EngineAnswer {
    const reading = readDocument(document);
    if (reading.status === 'refused') return { status: 'failed', faults: reading.faults };
    try {
      return { status: 'predicted', prediction: predictDesign(reading.document, options) };
    } catch (error) {
      if (!(error instanceof EngineInputError)) throw error;
      return { status: 'failed', faults: [{ path: error.field.split('.'), message: error.message }] };
    }
  },

  sensitivities(document: DesignDocument): DesignSensitivities {
    return designSensitivities(document);
  },

  /** null where the document cannot be computed: the prediction says why. */
  study<Kind extends StudyKind>(kind: Kind, ask: Studies[Kind]['ask']): Studies[Kind]['answer'] | null {
    if (readDocument(ask.document).status === 'refused') return null;
    try {
      return studies[kind](ask);
    } catch (error) {
      if (!(error instanceof EngineInputError)) throw error;
      return null;
    }
  },
};

export type EngineWorker = typeof worker;

expose(worker);
