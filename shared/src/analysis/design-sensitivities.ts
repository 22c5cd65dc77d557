import { impedanceChange, type Perturbation } from '../acoustics/response/adjoint.ts';
import { columnStates, solveStates, type ColumnStates } from '../acoustics/response/column-states.ts';
import {
  tuneFingering,
  type FingeringBranches,
  type PreparedColumn,
} from '../acoustics/response/prepared-column.ts';
import { planTouched } from '../acoustics/response/touched-parts.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { designDimensions, type Dimension } from './design-dimensions.ts';
import { ENGINE } from './engine-version.ts';
import { predictPrepared } from './predict-design.ts';
import { prepareDesign, type PreparedDesign } from './prepare-design.ts';
import type { DesignSensitivities } from './prediction.ts';
import { toColumn } from './to-column.ts';

/** Step of a dimension for the change of its own two-ports, relative; their curvature then costs less than 1e-7. */
const DIMENSION_STEP = 1e-5;
/** Step of the frequency for the slope of the impedance, relative. */
const FREQUENCY_STEP = 1e-5;
const CENTS_PER_NEPER = 1200 / Math.LN2;

/**
 * Cents that every note moves by per unit of every dimension: mm, °C, degrees, or one whole unit of a share.
 *
 * By the adjoint method: each note is solved once, and what a dimension changes follows from the pressures and flows there.
 * Fingerings that do not sound have no figures.
 */
export function designSensitivities(document: DesignDocument): DesignSensitivities {
  const { design, prepared, fingerings } = prepareDesign(document);
  const prediction = predictPrepared(document, { design, prepared, fingerings }, { modes: 1 });
  const dimensions = designDimensions(document).map((dimension) => ({
    key: dimension.key,
    perturbation: perturb(document, { design, prepared }, dimension),
  }));
  const states = columnStates(document.holes.length);
  return {
    engine: ENGINE,
    fingerings: prediction.fingerings.map(({ id, frequencyHz }, i) => {
      const fingering = fingerings[i];
      if (frequencyHz === null || fingering === undefined) return { id, centsPerUnit: {} };
      const note: Note = { prepared, fingering, states, frequency: frequencyHz, slope: NaN };
      note.slope = reactanceSlope(note);
      tuneFingering(prepared, fingering, frequencyHz, true);
      solveStates(prepared, fingering, states);
      const centsPerUnit = Object.fromEntries(
        dimensions.map(({ key, perturbation }) => [key, centsPerUnitOf(note, perturbation)]),
      );
      return { id, centsPerUnit };
    }),
  };
}

interface Note {
  prepared: PreparedColumn;
  fingering: FingeringBranches;
  states: ColumnStates;
  frequency: number;
  /** Of the reactance, or of the susceptance where maxima play, per Hz. */
  slope: number;
}

function perturb(
  document: DesignDocument,
  { design, prepared }: Pick<PreparedDesign, 'design' | 'prepared'>,
  dimension: Dimension,
): Perturbation {
  const step = DIMENSION_STEP * Math.max(Math.abs(dimension.value), 1);
  // A share of 0 cannot be less; then both steps go upwards.
  const low = dimension.value - step < 0 && dimension.value >= 0 ? dimension.value : dimension.value - step;
  const high = dimension.value + step;
  const plan = (value: number) => {
    const changed = dimension.at(value);
    const sameAir = changed.air === document.air;
    const { column } = sameAir ? toColumn(changed, design.column.outside) : toColumn(changed);
    return planTouched(prepared, column, dimension.touched);
  };
  return { plus: plan(high), minus: plan(low), difference: high - low, touched: dimension.touched };
}

/** Imaginary part of the impedance, or of its inverse where maxima play: 0 at a resonance. */
function playing([re, im]: [number, number], maxima: boolean): number {
  return maxima ? -im / (re * re + im * im) : im;
}

function reactanceSlope({ prepared, fingering, states, frequency }: Note): number {
  const step = FREQUENCY_STEP * frequency;
  const at = (f: number) => {
    tuneFingering(prepared, fingering, f, true);
    solveStates(prepared, fingering, states);
    return playing(states.impedance, prepared.playsMaxima);
  };
  return (at(frequency + step) - at(frequency - step)) / (2 * step);
}

function centsPerUnitOf(note: Note, perturbation: Perturbation): number {
  const { states, fingering, frequency, prepared, slope } = note;
  const [dr, di] = impedanceChange(prepared, fingering, states, perturbation);
  let change = di;
  if (prepared.playsMaxima) {
    // δ(1/Z) = −δZ/Z²
    const [zr, zi] = states.impedance;
    const re = zr * zr - zi * zi;
    const im = 2 * zr * zi;
    change = -(di * re - dr * im) / (re * re + im * im);
  }
  return (CENTS_PER_NEPER * (-change / slope)) / frequency;
}
