import { cell } from '../acoustics/complex/cells.ts';
import { EngineInputError } from '../acoustics/engine-input-error.ts';
import { coupledImpedance } from '../acoustics/response/input-impedance.ts';
import { tuneColumn } from '../acoustics/response/prepared-column.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { prepareDesign } from './prepare-design.ts';
import type { ImpedanceCurve } from './prediction.ts';
import { requireFingering } from './require-fingering.ts';

export interface FrequencyRange {
  fromHz: number;
  toHz: number;
  stepHz: number;
}

/** Most points of a curve; more than any screen or paper shows. */
const MOST_POINTS = 100_000;

/** Input impedance of one fingering over frequency, mouth end included. Throws `EngineInputError` on a bad range or id. */
export function impedanceCurve(
  document: DesignDocument,
  fingeringId: string,
  range: FrequencyRange,
  coupling = true,
): ImpedanceCurve {
  requireFingering(document, fingeringId);
  const only = document.fingerings.filter((fingering) => fingering.id === fingeringId);
  const [curve] = impedanceCurves({ ...document, fingerings: only }, range, coupling);
  return curve ?? { fingering: fingeringId, points: [] };
}

/**
 * Input impedance of every fingering; the column is set to each frequency once for all of them.
 *
 * @param coupling - false: openings do not hear each other; for comparison only
 */
export function impedanceCurves(
  document: DesignDocument,
  range: FrequencyRange,
  coupling = true,
): ImpedanceCurve[] {
  const frequencies = frequenciesOf(range);
  const { prepared, fingerings } = prepareDesign(document);
  const curves = document.fingerings.map(({ id }): ImpedanceCurve => ({ fingering: id, points: [] }));
  const unit = prepared.inputImpedance;
  for (const frequencyHz of frequencies) {
    // A fresh column's mutual impedances are 0 until they are worked out.
    tuneColumn(prepared, frequencyHz, coupling);
    fingerings.forEach((fingering, i) => {
      const at = coupledImpedance(prepared, fingering);
      const re = cell(prepared.cells, at) / unit;
      curves[i]?.points.push({ frequencyHz, re, im: cell(prepared.cells, at + 1) / unit });
    });
  }
  return curves;
}

function frequenciesOf({ fromHz, toHz, stepHz }: FrequencyRange): number[] {
  if (!(fromHz > 0 && toHz >= fromHz && stepHz > 0)) {
    throw new EngineInputError(
      'range',
      { fromHz, toHz, stepHz },
      'Frequencies run upwards from above 0 in steps above 0.',
    );
  }
  const count = Math.floor((toHz - fromHz) / stepHz + 1e-9) + 1;
  if (count > MOST_POINTS) {
    throw new EngineInputError('range', count, `Keep to ${MOST_POINTS} frequencies, or take a larger step.`);
  }
  return Array.from({ length: count }, (_, i) => fromHz + i * stepHz);
}
