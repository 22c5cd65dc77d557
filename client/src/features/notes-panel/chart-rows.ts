import type { DesignPrediction, FingeringPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument, Fingering } from '#shared/document/design-document.ts';
import { frequencyAbove } from '#shared/music/cents.ts';
import { noteFrequencyHz } from '#shared/music/temperament.ts';

export interface ChartRow {
  fingering: Fingering;
  /** Place in the document: what document paths count by. */
  index: number;
  /** What the scale asks for, Hz. */
  targetHz: number;
  predicted: FingeringPrediction | null;
}

/** The chart from the lowest note to the highest; fingerings of one note in the document's order. */
export function chartRows(document: DesignDocument, prediction: DesignPrediction | null): ChartRow[] {
  const predicted = new Map(prediction?.fingerings.map((entry) => [entry.id, entry]));
  return document.fingerings
    .map((fingering, index) => ({
      fingering,
      index,
      targetHz: frequencyAbove(noteFrequencyHz(fingering.note, document.pitch), fingering.centsOffset),
      predicted: predicted.get(fingering.id) ?? null,
    }))
    .sort((a, b) => a.targetHz - b.targetHz || a.index - b.index);
}
