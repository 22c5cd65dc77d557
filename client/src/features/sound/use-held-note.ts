import { useEffect } from 'react';
import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import type { Tones } from './use-tones.ts';

type Chosen = Pick<PanelProps, 'prediction' | 'selection'>;

/** The note that the sound buttons speak of: the chosen one, else the first. */
export function soundingNote(
  prediction: Chosen['prediction'],
  selection: Chosen['selection'],
): FingeringPrediction | undefined {
  const predictions = prediction?.fingerings ?? [];
  return predictions.find(({ id }) => id === selection.fingering) ?? predictions[0];
}

/** Keeps what is held at the figures of the moment; and the reference note on and off, as by a key. */
export function useHeldNote(tones: Tones, { prediction, selection }: Chosen): () => void {
  const note = soundingNote(prediction, selection);
  const sounding = note?.frequencyHz ?? null;
  const target = note?.targetHz ?? null;
  const { playing, hold, retune, stop } = tones;
  useEffect(() => {
    // A dragged hole is heard while it moves; a note that falls silent is silent.
    if (playing === null || playing === 'scale' || target === null) return;
    if (playing === 'reference') retune([target]);
    else if (sounding === null) stop();
    else retune(playing === 'both' ? [sounding, target] : [sounding]);
  });
  return () => {
    if (playing !== null) stop();
    else if (target !== null) hold('reference', [target]);
  };
}
