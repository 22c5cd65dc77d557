import { cell, type Cells } from '../complex/cells.ts';
import type { HoleBranch } from './hole-branch.ts';
import type { FingeringBranches, PreparedColumn } from './prepared-column.ts';

/**
 * A wave on its way from the foot to the mouth: pressure and flow, and the phase of its reflection counted on and on.
 *
 * Cells: Re p, Im p, Re U, Im U, phase (rad), radius it is counted in (m).
 */
export type ChainState = Float64Array;

/** Cells of a chain state. */
export const CHAIN_CELLS = 6;

/**
 * Input impedance at the mouth end's outlet as a plain chain: openings do not hear each other.
 *
 * Equal to `coupledImpedance` with all mutual impedances 0; costs less.
 *
 * @param prepared - the column, set to a frequency
 * @param fingering - its branches
 * @returns address of the impedance in the column's cells, Pa·s/m³
 * @source transmission-line chain; D. H. Keefe, J. Acoust. Soc. Am. 88 (1990) 35
 */
export function chainImpedance(prepared: PreparedColumn, fingering: FingeringBranches): number {
  const { cells, segments, branches, mouth, system } = prepared;
  startAtFoot(prepared, state);
  for (let h = fingering.length; h >= 0; h -= 1) {
    passTwoPort(cells, segments[h]?.twoPort ?? 0, state);
    const branch = h === 0 ? undefined : branches[fingering[h - 1] ?? 0];
    if (branch !== undefined) passBranch(cells, branch, state);
  }
  passTwoPort(cells, mouth.twoPort, state);
  const pr = cell(state, 0);
  const pi = cell(state, 1);
  const ur = cell(state, 2);
  const ui = cell(state, 3);
  const norm = ur * ur + ui * ui;
  cells[system.impedance] = (pr * ur + pi * ui) / norm;
  cells[system.impedance + 1] = (pi * ur - pr * ui) / norm;
  return system.impedance;
}

const state = new Float64Array(CHAIN_CELLS);

/**
 * Pressure and flow at the foot, up to a factor.
 *
 * @param prepared - the column, set to a frequency
 * @param prepared.cells
 * @param prepared.foot
 * @param prepared.footRadiation
 * @param out - the state to write
 * @returns nothing; the result is in `out`
 */
export function startAtFoot({ cells, foot, footRadiation }: PreparedColumn, out: ChainState): void {
  const stopped = foot.kind === 'stopped';
  out[0] = stopped ? 1 : cell(cells, footRadiation);
  out[1] = stopped ? 0 : cell(cells, footRadiation + 1);
  out[2] = stopped ? 0 : 1;
  out[3] = 0;
}

/**
 * Takes the wave through a two-port, towards the mouth.
 *
 * @param cells - the column's
 * @param at - address of the two-port
 * @param out - the state, replaced
 * @returns nothing; the result is in `out`
 */
export function passTwoPort(cells: Cells, at: number, out: ChainState): void {
  const pr = cell(out, 0);
  const pi = cell(out, 1);
  const ur = cell(out, 2);
  const ui = cell(out, 3);
  for (let row = 0; row < 2; row += 1) {
    const i = at + 4 * row;
    const ar = cell(cells, i);
    const ai = cell(cells, i + 1);
    const br = cell(cells, i + 2);
    const bi = cell(cells, i + 3);
    out[2 * row] = ar * pr - ai * pi + br * ur - bi * ui;
    out[2 * row + 1] = ar * pi + ai * pr + br * ui + bi * ur;
  }
}

/**
 * Takes the wave past a tone hole, towards the mouth.
 *
 * @param cells - the column's
 * @param branch - the hole in its state
 * @param out - the state, replaced
 * @returns nothing; the result is in `out`
 */
export function passBranch(cells: Cells, branch: HoleBranch, out: ChainState): void {
  if (branch.shift === 0) passReactance(out, cell(cells, branch.series));
  else passTwoPort(cells, branch.after, out);
  passShunt(cells, branch.shunt, out);
  if (branch.shift === 0) passReactance(out, cell(cells, branch.series));
  else passTwoPort(cells, branch.before, out);
}

/**
 * Takes the wave through a series reactance.
 *
 * @param out - the state, replaced
 * @param reactance - imaginary part of the impedance, Pa·s/m³
 * @returns nothing; the result is in `out`
 */
export function passReactance(out: ChainState, reactance: number): void {
  out[0] = cell(out, 0) - reactance * cell(out, 3);
  out[1] = cell(out, 1) + reactance * cell(out, 2);
}

/**
 * Takes the wave past a shunt admittance.
 *
 * @param cells - the column's
 * @param at - address of the admittance, m³/(Pa·s)
 * @param out - the state, replaced
 * @returns nothing; the result is in `out`
 */
export function passShunt(cells: Cells, at: number, out: ChainState): void {
  const yr = cell(cells, at);
  const yi = cell(cells, at + 1);
  const pr = cell(out, 0);
  const pi = cell(out, 1);
  out[2] = cell(out, 2) + yr * pr - yi * pi;
  out[3] = cell(out, 3) + yr * pi + yi * pr;
}
