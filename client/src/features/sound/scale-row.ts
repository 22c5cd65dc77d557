import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import type { ScheduledTone } from './tone-player.ts';

/** Time of one note of the scale, s. */
const NOTE_S = 0.42;

/** Every note as it is predicted, from the lowest up to the highest and down again; the highest once. */
export function scaleUpAndDown(predictions: readonly FingeringPrediction[]): ScheduledTone[] {
  const rising = predictions
    .filter(({ note }, index) => predictions.findIndex((other) => other.note === note) === index)
    .flatMap(({ frequencyHz, targetHz }) => (frequencyHz === null ? [] : [{ frequencyHz, targetHz }]))
    .sort((a, b) => a.targetHz - b.targetHz)
    .map(({ frequencyHz }) => frequencyHz);
  return [...rising, ...rising.toReversed().slice(1)].map((frequencyHz, index) => ({
    frequencyHz,
    atS: index * NOTE_S,
    lengthS: NOTE_S,
  }));
}
