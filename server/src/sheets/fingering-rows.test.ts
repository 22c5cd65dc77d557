import { describe, expect, it } from 'vitest';
import { buildPrediction, buildSheetInput, buildWhistle } from '../../../tests/sheets/build-sheet-input.ts';
import { centsPerDegree, fingeringRows, predictionNotices } from './fingering-rows.ts';

describe('the rows of the fingering chart', () => {
  it('put the second register beside the note with the same holes covered', () => {
    const [lowest] = fingeringRows(buildSheetInput());
    expect([lowest?.first.note, lowest?.second?.note, lowest?.third]).toEqual(['D5', 'D6', null]);
    expect(lowest?.first.targetHz).toBeCloseTo(587.33, 2);
  });

  it('say how half-covered and cross fingerings are taken', () => {
    const special = fingeringRows(buildSheetInput()).filter((row) => row.words !== '');
    expect(special.map((row) => [row.first.note, row.words])).toEqual([
      ['D#5', 'half-cover hole 6'],
      ['C6', 'cross fingering'],
    ]);
  });

  it('hold every fingering once', () => {
    const document = buildWhistle();
    const rows = fingeringRows(buildSheetInput({ document }));
    const notes = rows.flatMap((row) => [row.first, row.second, row.third].filter((note) => note !== null));
    expect(notes).toHaveLength(document.fingerings.length);
  });

  it('refuse a prediction that belongs to another design', () => {
    const document = buildWhistle();
    const prediction = { ...buildPrediction(document), fingerings: [] };
    expect(() => fingeringRows(buildSheetInput({ document, prediction }))).toThrow(RangeError);
  });
});

describe('what stands under the chart', () => {
  it('takes the middle of what a degree does to the notes', () => {
    const sensitivities = {
      engine: 'test',
      fingerings: [3.1, 2.9, 1].map((cents, index) => ({
        id: String(index),
        centsPerUnit: { 'air.temperatureC': cents },
      })),
    };
    expect(centsPerDegree(buildSheetInput({ sensitivities }))).toBe(2.9);
  });

  it('says each warning once, with the notes that it holds for', () => {
    const document = buildWhistle();
    const prediction = buildPrediction(document);
    const warned = prediction.fingerings.map((fingering, index) => ({
      ...fingering,
      notices: index < 2 ? [{ code: 'weak', message: 'The resonance is weak.' }] : [],
    }));
    const input = buildSheetInput({ document, prediction: { ...prediction, fingerings: warned } });
    expect(predictionNotices(input)).toEqual(['C#6, B5: The resonance is weak.']);
  });
});
