import type { DesignPrediction, ImpedanceCurve } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { DocumentFault } from '#shared/document/fault-words.ts';
import type { TransformOrder, TransformOutcome } from '#shared/transform/transform-design.ts';
import type { WiderHere } from './wider-here.ts';

export interface PredictionOptions {
  /** Whether openings feel each other's radiation. */
  coupling: boolean;
}

export type EngineAnswer =
  { status: 'predicted'; prediction: DesignPrediction } | { status: 'failed'; faults: DocumentFault[] };

/** Pressure along the bore at one resonance; 1 is the most in the bore. */
export interface Ribbon {
  mode: number;
  frequencyHz: number;
  points: { positionMm: number; pressure: number }[];
}

/** What a panel wants to know beyond the prediction, and what it gets. */
export interface Studies {
  /** A design that is looked at beside another, apart from the draft on the bench. */
  prediction: {
    ask: { document: DesignDocument; options?: PredictionOptions };
    answer: DesignPrediction;
  };
  'wider-here': {
    ask: { document: DesignDocument; fingerings: readonly string[] };
    answer: WiderHere[];
  };
  impedance: {
    ask: { document: DesignDocument; fingering: string; toHz: number; coupling: boolean };
    answer: ImpedanceCurve;
  };
  transform: {
    ask: { document: DesignDocument; order: TransformOrder };
    answer: TransformOutcome;
  };
  ribbons: {
    ask: {
      document: DesignDocument;
      fingering: string;
      resonances: readonly { mode: number; frequencyHz: number }[];
      coupling: boolean;
    };
    answer: Ribbon[];
  };
}

export type StudyKind = keyof Studies;
