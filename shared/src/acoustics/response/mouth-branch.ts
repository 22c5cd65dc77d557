import { cell, type Cells } from '../complex/cells.ts';
import {
  TWO_PORT_CELLS,
  appendReactance,
  appendSeries,
  appendShunt,
  appendTwoPort,
  prependReactance,
  reverseTwoPort,
  writeIdentity,
} from '../complex/two-port.ts';
import { embouchureRadius, lipLength } from '../mouth-end/embouchure.ts';
import { reedSusceptance } from '../mouth-end/reed.ts';
import { rimEnd, rimImpedance, type RimEnd } from '../mouth-end/rim.ts';
import { windowEnd, windowImpedance, type WindowEnd } from '../mouth-end/window.ts';
import { selfRadiation } from '../radiation/cylinder-radiation.ts';
import { NODE_COMPLIANCE_RATIO } from '../tone-hole/node-compliance.ts';
import type { BorePlan, Slice } from './bore-plan.ts';
import { SCRATCH, planChimney, writeSlices } from './hole-branch.ts';
import { boreBetween, type Column, type ColumnMouth } from './column.ts';
import { holeShape, type HoleShape } from './hole-shape.ts';

/** Opening of a mouth end to the outside, by which it hears the other openings. */
export interface MouthOpening {
  position: number;
  boreRadius: number;
  outerRadius: number;
  /** A hole in the body's side, or the bore's open end. */
  kind: 'side' | 'end';
}

/** An embouchure hole; from the bore outwards its parts stand in the cells one by one, for the count of turns. */
export interface Embouchure {
  shape: HoleShape;
  chimney: Slice[];
  cavity: Slice[];
  lip: number;
  /** Address of half the series reactance. */
  series: number;
  /** Address of the admittance of stopper cavity and node together. */
  side: number;
  /** Address of the inner reactance. */
  inner: number;
  /** Address of the chimney, outlet first. */
  chimneyTwoPort: number;
  /** Address of the outlet's impedance. */
  outlet: number;
}

/** The mouth end as a two-port from its outlet to the bore. */
export interface MouthBranch {
  end: ColumnMouth;
  medium: number;
  twoPort: number;
  opening: MouthOpening | null;
  window: WindowEnd | null;
  rim: RimEnd | null;
  embouchure: Embouchure | null;
}

/**
 * Lays out a mouth end.
 *
 * @param plan - the column's cells
 * @param column - the column
 * @returns the branch
 * @throws EngineInputError where no formula holds
 */
export function planMouthBranch(plan: BorePlan, column: Column): MouthBranch {
  const end = column.mouth;
  const medium = plan.mediumAt(column.input);
  return {
    end,
    medium,
    twoPort: plan.take(TWO_PORT_CELLS),
    opening: mouthOpening(column),
    window: end.kind === 'window' ? windowEnd(end, end.scale) : null,
    rim:
      end.kind === 'rim'
        ? rimEnd({ boreRadius: end.boreRadius, outerRadius: end.outerRadius, fraction: end.cover }, end.scale)
        : null,
    embouchure: end.kind === 'embouchure' ? planEmbouchure(plan, column, end, medium) : null,
  };
}

function mouthOpening({ mouth, input }: Column): MouthOpening | null {
  if (mouth.kind === 'window') {
    const { boreRadius, outerRadius, length } = mouth;
    return { position: input + length / 2, boreRadius, outerRadius, kind: 'side' };
  }
  if (mouth.kind === 'embouchure' || mouth.kind === 'rim') {
    const { boreRadius, outerRadius } = mouth;
    return { position: input, boreRadius, outerRadius, kind: mouth.kind === 'rim' ? 'end' : 'side' };
  }
  return null;
}

function planEmbouchure(
  plan: BorePlan,
  column: Column,
  end: Extract<ColumnMouth, { kind: 'embouchure' }>,
  medium: number,
): Embouchure {
  const radius = embouchureRadius(end.along, end.across);
  const shape = holeShape(
    {
      position: column.input,
      radius,
      boreRadius: end.boreRadius,
      outerRadius: end.outerRadius,
      chimney: end.chimney,
      angle: 0,
      flare: end.flare,
      lid: 'curved',
      pad: null,
    },
    { kind: 'open' },
  );
  const lips = {
    fraction: end.lipCover,
    angle: end.lipAngle,
    holeRadius: radius,
    outerRadius: end.outerRadius,
  };
  const cavity = boreBetween(column.bore, column.input - end.stopper, column.input).reverse();
  return {
    shape,
    chimney: planChimney(plan, shape, medium),
    cavity: cavity.flatMap((to, i) => {
      const from = cavity[i - 1];
      return from === undefined ? [] : plan.slices(from, to);
    }),
    series: plan.take(1),
    side: plan.take(2),
    inner: plan.take(1),
    chimneyTwoPort: plan.take(TWO_PORT_CELLS),
    outlet: plan.take(2),
    lip: (lipLength(lips) * end.scale) / (Math.PI * radius * radius),
  };
}

const end = new Float64Array(2);

/**
 * Works the mouth end out for the frequency that the airs and ducts are set to.
 *
 * @param cells - the column's
 * @param branch - the mouth end
 * @param outside - address of the air outside
 * @returns nothing; the result is in the cells
 */
export function tuneMouthBranch(cells: Cells, branch: MouthBranch, outside: number): void {
  const { twoPort, medium, window, rim, embouchure } = branch;
  writeIdentity(cells, twoPort);
  const k = cell(cells, medium);
  const rhoC = cell(cells, medium + 1);
  if (window !== null) {
    windowImpedance(window, k, end, 0);
    appendScaled(cells, twoPort, rhoC / (Math.PI * window.boreRadius ** 2));
  } else if (rim !== null) {
    rimImpedance(rim, k, end, 0);
    appendScaled(cells, twoPort, rhoC / (Math.PI * rim.boreRadius ** 2));
  } else if (embouchure !== null) {
    tuneEmbouchure(cells, branch, embouchure, outside);
  } else if (branch.end.kind === 'reed') {
    const { volume, scale } = branch.end;
    cells[SCRATCH] = 0;
    cells[SCRATCH + 1] = (reedSusceptance(k, volume * scale, 1) * Math.PI) / rhoC;
    appendShunt(cells, twoPort, SCRATCH);
  }
}

function appendScaled(cells: Cells, at: number, z0: number): void {
  appendSeries(cells, at, cell(end, 0) * z0, cell(end, 1) * z0);
}

// Its parts, then the two-port from the lips inwards: outlet, chimney, inner length, cavity and node, half series length.
function tuneEmbouchure(cells: Cells, branch: MouthBranch, parts: Embouchure, outside: number): void {
  const { twoPort, medium } = branch;
  const { shape, chimneyTwoPort, outlet } = parts;
  const reactance = cell(cells, medium) * cell(cells, medium + 1);
  cells[parts.series] = reactance * shape.halfSeries;
  cells[parts.inner] = reactance * shape.inner;
  tuneSide(cells, branch, parts);
  writeSlices(cells, chimneyTwoPort, parts.chimney);
  reverseTwoPort(cells, chimneyTwoPort);
  const k = cell(cells, outside);
  const outer = k * cell(cells, outside + 1);
  const body = outer / (4 * Math.PI * shape.outerRadius);
  selfRadiation(k * shape.outerRadius, end, 0);
  cells[outlet] = -body * cell(end, 1);
  cells[outlet + 1] = outer * parts.lip + body * cell(end, 0);
  appendSeries(cells, twoPort, cell(cells, outlet), cell(cells, outlet + 1));
  appendTwoPort(cells, twoPort, chimneyTwoPort);
  appendReactance(cells, twoPort, parts.inner);
  appendShunt(cells, twoPort, parts.side);
  appendReactance(cells, twoPort, parts.series);
}

// Admittance beside the bore: the stopper's cavity, shut at its far end, and the node's compliance.
function tuneSide(cells: Cells, { medium }: MouthBranch, parts: Embouchure): void {
  const { chimneyTwoPort: cavity, shape, side } = parts;
  writeSlices(cells, cavity, parts.cavity);
  prependReactance(cells, cavity, cell(cells, parts.series));
  const ar = cell(cells, cavity);
  const ai = cell(cells, cavity + 1);
  const cr = cell(cells, cavity + 4);
  const ci = cell(cells, cavity + 5);
  const scale = 1 / (ar * ar + ai * ai);
  const volume = NODE_COMPLIANCE_RATIO * Math.PI * shape.innerRadius ** 3;
  const node = (cell(cells, medium) * volume) / cell(cells, medium + 1);
  cells[side] = (cr * ar + ci * ai) * scale;
  cells[side + 1] = (ci * ar - cr * ai) * scale + node;
}
