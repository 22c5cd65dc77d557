import { describe, expect, it } from 'vitest';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import { readDocument } from '#shared/document/read-document.ts';
import table from './tables/whole_instruments.json' with { type: 'json' };
import { spreadOf } from './spread.ts';

/** Both computations solve the same equations to more digits than this. */
const TOLERANCE_CENTS = 0.01;

describe.each(table.instruments)('$document.name', ({ document, modes }) => {
  it('has the modes that an independent computation gives, coupling of all openings on', () => {
    const reading = readDocument(document);
    if (reading.status !== 'read') throw new Error(reading.faults.map((fault) => fault.message).join(' '));
    const { fingerings } = predictDesign(reading.document);
    const cents = Object.entries(modes).flatMap(([id, frequencies]) => {
      const ladder = fingerings.find((fingering) => fingering.id === id)?.ladder ?? [];
      return frequencies.map((hz, i) => 1200 * Math.log2((ladder[i]?.frequencyHz ?? NaN) / hz));
    });
    expect(spreadOf(cents).max).toBeLessThan(TOLERANCE_CENTS);
  });
});
