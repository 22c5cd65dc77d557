import { cell, type Cells } from '../complex/cells.ts';
import { EngineInputError } from '../engine-input-error.ts';
import { writeDuct, writeMedium } from '../bore/wall-losses.ts';
import { TWO_PORT_CELLS, appendTwoPort, writeIdentity } from '../complex/two-port.ts';
import { finiteWallEndImpedance } from '../radiation/finite-wall-end.ts';
import { flangedEndImpedance } from '../radiation/flanged-end.ts';
import { BorePlan, type Link, type Segment } from './bore-plan.ts';
import { boreBetween, boreRadiusAt, type Column, type HoleState } from './column.ts';
import { planCoupling, tuneCoupling, type Coupling } from './coupling.ts';
import { planHoleBranch, tuneHoleBranch, writeSlice, type HoleBranch } from './hole-branch.ts';
import { planOpenings, type OpeningSystem } from './opening-system.ts';
import { planMouthBranch, tuneMouthBranch, type MouthBranch } from './mouth-branch.ts';

/** A fingering: for every hole, mouth side first, the place of its branch among the column's branches. */
export type FingeringBranches = Int32Array;

/** A column laid out in flat arrays: once per design, so that a frequency costs arithmetic alone. */
export interface PreparedColumn {
  cells: Cells;
  plan: BorePlan;
  /** One more than holes: mouth to first hole, …, last hole to foot. */
  segments: Segment[];
  branches: HoleBranch[];
  mouth: MouthBranch;
  coupling: Coupling;
  /** Room in which fingerings are solved, one after another. */
  system: OpeningSystem;
  /** Which openings take part in the coupling, by their place. */
  coupled: Uint8Array;
  /** The same for one fingering. */
  sounding: Uint8Array;
  foot: Column['foot'];
  footRadius: number;
  /** Address of the foot's radiation impedance. */
  footRadiation: number;
  /** Address of a two-port that changes nothing: the foot opens straight into the air. */
  footTwoPort: number;
  /** ρc/S at the input, outside air: the unit of input impedances, Pa·s/m³. */
  inputImpedance: number;
  inputRadius: number;
  /** Radius of the duct that reflections at the input are reckoned against, m: between the input's and the widest. */
  phaseRadius: number;
  /** Of the bore from the input to the foot, m. */
  length: number;
  /** Of the bore, m. */
  widestRadius: number;
  /** Address of the duct of that radius. */
  widestDuct: number;
  /** Outside, m/s. */
  speedOfSound: number;
  /** Resonances that play are maxima of the impedance (reeds), or minima. */
  playsMaxima: boolean;
  /** Hz, as last set. */
  frequency: number;
}

/**
 * Lays out a column for a set of fingerings.
 *
 * @param column - the column
 * @param fingerings - for each fingering the state of every hole, in the order of the column's holes
 * @returns the column laid out, and for each fingering its branches; equal ones share theirs
 * @throws EngineInputError where a formula refuses
 */
export function prepareColumn(
  column: Column,
  fingerings: readonly (readonly HoleState[])[],
): { prepared: PreparedColumn; fingerings: FingeringBranches[] } {
  const plan = new BorePlan(column.outside, column.warmth);
  const mouth = planMouthBranch(plan, column);
  const segments = Array.from({ length: column.holes.length + 1 }, (_, i) => planSegment(plan, column, i));
  const { branches, choices } = planBranches(plan, column, fingerings);
  const coupling = planCoupling(plan, column, mouth.opening);
  const system = planOpenings(plan, column.holes.length);
  const footRadiation = plan.take(2);
  const footTwoPort = plan.take(TWO_PORT_CELLS);
  const inputRadius = boreRadiusAt(column.bore, column.input);
  const widestRadius = Math.max(...column.bore.map((point) => point.radius));
  const widestDuct = plan.duct(widestRadius, plan.outside);
  const footRadius = column.bore.at(-1)?.radius ?? NaN;
  const prepared: PreparedColumn = {
    cells: plan.cells(),
    plan,
    segments,
    branches,
    mouth,
    coupling,
    system,
    coupled: coupledOpenings(branches, coupling),
    sounding: new Uint8Array(coupling.openings).fill(1),
    foot: column.foot,
    footRadius,
    footRadiation,
    footTwoPort,
    inputImpedance: (column.outside.density * column.outside.speedOfSound) / (Math.PI * inputRadius ** 2),
    inputRadius,
    length: (column.bore.at(-1)?.position ?? NaN) - column.input,
    widestRadius,
    widestDuct,
    phaseRadius: Math.sqrt(inputRadius * widestRadius),
    speedOfSound: column.outside.speedOfSound,
    playsMaxima: column.mouth.kind === 'reed' || column.mouth.kind === 'ideal-closed',
    frequency: 0,
  };
  writeIdentity(prepared.cells, footTwoPort);
  return { prepared, fingerings: choices };
}

/**
 * Lays out the bore between two hole axes, or between one and an end.
 *
 * @param plan - the column's cells
 * @param column - the column
 * @param place - of the segment, from the mouth end; 0 … number of holes
 * @returns the segment
 */
export function planSegment(plan: BorePlan, column: Column, place: number): Segment {
  const { bore, holes, input } = column;
  const from = place === 0 ? input : (holes[place - 1]?.position ?? NaN);
  const to = holes[place]?.position ?? bore.at(-1)?.position ?? NaN;
  return plan.segment(boreBetween(bore, from, to));
}

function planBranches(
  plan: BorePlan,
  column: Column,
  fingerings: readonly (readonly HoleState[])[],
): { branches: HoleBranch[]; choices: FingeringBranches[] } {
  const branches: HoleBranch[] = [];
  const choices: FingeringBranches[] = [];
  fingerings.forEach((states, f) => {
    const choice = Int32Array.from(column.holes, (hole, index) => {
      const state = states[index];
      if (state === undefined) throw new EngineInputError('fingerings', f, 'A fingering leaves a hole out.');
      const known = branches.findIndex((branch) => branch.hole === index && isSameState(branch.state, state));
      return known < 0 ? branches.push(planHoleBranch(plan, hole, index, state)) - 1 : known;
    });
    choices.push(choices.find((other) => other.every((place, i) => place === choice[i])) ?? choice);
  });
  return { branches, choices };
}

function isSameState(one: HoleState, other: HoleState): boolean {
  if (one.kind !== 'half' || other.kind !== 'half') return one.kind === other.kind;
  return one.fraction === other.fraction && one.from === other.from;
}

function coupledOpenings(branches: readonly HoleBranch[], coupling: Coupling): Uint8Array {
  const coupled = new Uint8Array(coupling.openings);
  coupled[coupling.openings - 1] = 1;
  coupled[coupling.openings - 2] = 1;
  for (const branch of branches) if (!branch.closed) coupled[branch.hole] = 1;
  return coupled;
}

/**
 * Sets a column to a frequency: everything that its fingerings share.
 *
 * @param prepared - the column
 * @param frequency - Hz, > 0
 * @param coupling - false: openings do not hear each other
 * @returns nothing; the result is in the column's cells
 */
export function tuneColumn(prepared: PreparedColumn, frequency: number, coupling: boolean): void {
  tuneBore(prepared, frequency);
  const { cells, plan } = prepared;
  for (const branch of prepared.branches) tuneHoleBranch(cells, branch, plan.outside);
  if (coupling) tuneCoupling(cells, prepared.coupling, plan.outside, prepared.coupled);
}

/**
 * Sets a column to a frequency for one fingering alone; others may not be solved then.
 *
 * @param prepared - the column
 * @param fingering - its branches
 * @param frequency - Hz, > 0
 * @param coupling - false: openings do not hear each other
 * @returns nothing; the result is in the column's cells
 */
export function tuneFingering(
  prepared: PreparedColumn,
  fingering: FingeringBranches,
  frequency: number,
  coupling: boolean,
): void {
  tuneBore(prepared, frequency);
  const { cells, plan, branches, sounding } = prepared;
  for (let h = 0; h < fingering.length; h += 1) {
    const branch = branches[fingering[h] ?? -1];
    if (branch === undefined) continue;
    tuneHoleBranch(cells, branch, plan.outside);
    sounding[h] = branch.closed ? 0 : 1;
  }
  if (coupling) tuneCoupling(cells, prepared.coupling, plan.outside, sounding);
}

/**
 * Sets airs, ducts, bore, mouth end and foot to a frequency, and leaves the holes.
 *
 * @param prepared - the column
 * @param frequency - Hz, > 0
 * @returns nothing; the result is in the column's cells
 */
export function tuneBore(prepared: PreparedColumn, frequency: number): void {
  const { cells, plan } = prepared;
  prepared.frequency = frequency;
  tuneDucts(prepared, frequency);
  for (const segment of prepared.segments) tuneSegment(cells, segment);
  tuneMouthBranch(cells, prepared.mouth, plan.outside);
  tuneFoot(prepared);
}

/**
 * Sets airs and ducts to a frequency.
 *
 * @param prepared - the column
 * @param frequency - Hz, > 0
 * @returns nothing; the result is in the column's cells
 */
export function tuneDucts(prepared: Pick<PreparedColumn, 'cells' | 'plan'>, frequency: number): void {
  const { cells, plan } = prepared;
  for (const { at, medium } of plan.media) writeMedium(cells, at, medium, frequency);
  for (const duct of plan.ducts) writeDuct(cells, duct.at, duct.medium, duct.radius);
}

/**
 * Works a segment of bore out for the frequency that the ducts are set to.
 *
 * @param cells - the column's
 * @param segment - the segment
 * @returns nothing; the result is in the cells
 */
export function tuneSegment(cells: Cells, segment: Segment): void {
  for (const link of segment.links) tuneLink(cells, link);
  if (segment.links.length === 1) return;
  writeIdentity(cells, segment.twoPort);
  for (const link of segment.links) appendTwoPort(cells, segment.twoPort, link.twoPort);
}

function tuneLink(cells: Cells, link: Link): void {
  let turn = 0;
  for (let i = 0; i < link.slices.length; i += 1) {
    const slice = link.slices[i];
    if (slice === undefined) continue;
    turn -= 2 * cell(cells, slice.duct + 1) * cell(cells, slice.at + 2);
    if (i === 0) {
      writeSlice(cells, link.twoPort, slice);
    } else {
      writeSlice(cells, 0, slice);
      appendTwoPort(cells, link.twoPort, 0);
    }
  }
  cells[link.turn] = turn;
}

/**
 * Works the foot's radiation out for the frequency that the airs are set to.
 *
 * @param prepared - the column
 * @returns nothing; the result is in the column's cells
 */
export function tuneFoot(
  prepared: Pick<PreparedColumn, 'cells' | 'plan' | 'foot' | 'footRadius' | 'footRadiation'>,
): void {
  const { cells, plan, foot, footRadius, footRadiation } = prepared;
  if (foot.kind === 'stopped') return;
  const ka = cell(cells, plan.outside) * footRadius;
  if (foot.kind === 'flanged') flangedEndImpedance(ka, cells, footRadiation);
  else finiteWallEndImpedance(ka, footRadius / foot.outerRadius, cells, footRadiation);
  const z0 = cell(cells, plan.outside + 1) / (Math.PI * footRadius * footRadius);
  cells[footRadiation] = cell(cells, footRadiation) * z0;
  cells[footRadiation + 1] = cell(cells, footRadiation + 1) * z0;
}
