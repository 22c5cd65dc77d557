import { cell, type Cells } from '../complex/cells.ts';
import type { Segment } from './bore-plan.ts';
import { CHAIN_CELLS, passReactance, passShunt, passTwoPort, startAtFoot } from './chain.ts';
import type { HoleBranch } from './hole-branch.ts';
import { roughAngle } from '../numerics/rough-angle.ts';
import { nearestTurn } from './phase-track.ts';
import type { Embouchure } from './mouth-branch.ts';
import type { FingeringBranches, PreparedColumn } from './prepared-column.ts';

/**
 * Phase of the reflection at the input with all its turns, at the frequency the column is set to.
 *
 * Followed from the foot to the mouth instead of from frequency to frequency: along the bore the phase turns by 2βL, at a
 * hole or a step it can only turn within half a circle, and so a single frequency tells how many resonances lie
 * below it. That is how a search finds out that it missed none. Openings are taken as not hearing each other.
 *
 * @param prepared - the column, set to a frequency
 * @param fingering - its branches
 * @returns phase, rad; falls with frequency from π (the bore opens somewhere) or 0 (it is shut all along)
 * @source Prüfer's angle of a vibrating system; W. H. Wittrick and F. W. Williams, Q. J. Mech. Appl. Math. 24 (1971) 263
 */
export function countedPhase(prepared: PreparedColumn, fingering: FingeringBranches): number {
  const { segments, branches, foot, footRadius } = prepared;
  startAtFoot(prepared, state);
  state[RADIUS] = footRadius;
  const unit = unitImpedance(prepared, footRadius);
  state[PHASE] = foot.kind === 'stopped' ? 0 : reflectionPhase(state, unit);
  for (let h = fingering.length; h >= 0; h -= 1) {
    const segment = segments[h];
    if (segment !== undefined) passSegment(prepared, segment);
    const branch = h === 0 ? undefined : branches[fingering[h - 1] ?? 0];
    if (branch !== undefined) passHole(prepared, branch);
  }
  return passMouth(prepared);
}

const PHASE = 4;
const RADIUS = 5;
const state = new Float64Array(CHAIN_CELLS);
const before = new Float64Array(CHAIN_CELLS);

function unitImpedance({ cells, plan }: PreparedColumn, radius: number): number {
  return cell(cells, plan.outside + 1) / (Math.PI * radius * radius);
}

// A loop: for so few cells `set` costs several times as much.
function keepWave(): void {
  for (let i = 0; i < 4; i += 1) before[i] = cell(state, i);
}

// Principal phase of (p − z·U)/(p + z·U).
function reflectionPhase(wave: Float64Array, unit: number): number {
  const pr = cell(wave, 0);
  const pi = cell(wave, 1);
  const ur = cell(wave, 2);
  const ui = cell(wave, 3);
  const nr = pr - unit * ur;
  const ni = pi - unit * ui;
  const dr = pr + unit * ur;
  const di = pi + unit * ui;
  return roughAngle(ni * dr - nr * di, nr * dr + ni * di);
}

function passSegment(prepared: PreparedColumn, segment: Segment): void {
  const { cells } = prepared;
  for (let i = segment.links.length - 1; i >= 0; i -= 1) {
    const link = segment.links[i];
    if (link === undefined) continue;
    scaleTo(prepared, link.footRadius);
    passTwoPort(cells, link.twoPort, state);
    const unit = unitImpedance(prepared, link.mouthRadius);
    state[PHASE] = nearestTurn(reflectionPhase(state, unit), cell(state, PHASE) + cell(cells, link.turn));
    state[RADIUS] = link.mouthRadius;
  }
}

// A step of the bore stretches the impedance: the phase keeps to its half circle.
function scaleTo(prepared: PreparedColumn, radius: number): void {
  if (radius === state[RADIUS]) return;
  state[PHASE] = nearestTurn(reflectionPhase(state, unitImpedance(prepared, radius)), cell(state, PHASE));
  state[RADIUS] = radius;
}

// The series halves are slight beside the branch: the whole hole turns both waves by less than half a circle each.
function passHole(prepared: PreparedColumn, branch: HoleBranch): void {
  const { cells } = prepared;
  if (branch.shift !== 0) passShift(prepared, -branch.shift, branch.after);
  keepWave();
  if (branch.shift === 0) passReactance(state, cell(cells, branch.series));
  passShunt(cells, branch.shunt, state);
  if (branch.shift === 0) passReactance(state, cell(cells, branch.series));
  turnBy(unitImpedance(prepared, cell(state, RADIUS)));
  if (branch.shift !== 0) passShift(prepared, branch.shift, branch.before);
}

function passShift(prepared: PreparedColumn, length: number, at: number): void {
  const { cells, plan } = prepared;
  passTwoPort(cells, at, state);
  const expected = cell(state, PHASE) - 2 * cell(cells, plan.outside) * length;
  state[PHASE] = nearestTurn(reflectionPhase(state, unitImpedance(prepared, cell(state, RADIUS))), expected);
}

// Along z + t·jx, t from 0 to 1, the phases of z − 1 and of z + 1 turn by less than half a circle each.
function passSeries(prepared: PreparedColumn, reactance: number): void {
  keepWave();
  passReactance(state, reactance);
  turnBy(unitImpedance(prepared, cell(state, RADIUS)));
}

function passSide(prepared: PreparedColumn, cells: Cells, at: number): void {
  keepWave();
  passShunt(cells, at, state);
  turnBy(unitImpedance(prepared, cell(state, RADIUS)));
}

// A series element keeps U and adds to p on a straight line, a shunt the other way round: then the wave towards the mouth
// and the one from it each run along a straight line, and what each turns by is its principal difference.
function turnBy(unit: number): void {
  state[PHASE] = cell(state, PHASE) + lineTurn(-unit) - lineTurn(unit);
}

function lineTurn(unit: number): number {
  const fromRe = cell(before, 0) + unit * cell(before, 2);
  const fromIm = cell(before, 1) + unit * cell(before, 3);
  const toRe = cell(state, 0) + unit * cell(state, 2);
  const toIm = cell(state, 1) + unit * cell(state, 3);
  return roughAngle(toIm * fromRe - toRe * fromIm, toRe * fromRe + toIm * fromIm);
}

function passMouth(prepared: PreparedColumn): number {
  const { cells, mouth, phaseRadius, inputRadius } = prepared;
  if (mouth.embouchure !== null) {
    scaleTo(prepared, inputRadius);
    passEmbouchure(prepared, mouth.embouchure);
    scaleTo(prepared, phaseRadius);
    return cell(state, PHASE);
  }
  scaleTo(prepared, phaseRadius);
  keepWave();
  passTwoPort(cells, mouth.twoPort, state);
  turnBy(unitImpedance(prepared, phaseRadius));
  return cell(state, PHASE);
}

function passEmbouchure(prepared: PreparedColumn, parts: Embouchure): void {
  const { cells, plan } = prepared;
  passSeries(prepared, cell(cells, parts.series));
  passSide(prepared, cells, parts.side);
  passSeries(prepared, cell(cells, parts.inner));
  scaleTo(prepared, parts.shape.innerRadius);
  passTwoPort(cells, parts.chimneyTwoPort, state);
  const length = parts.shape.chimney.reduce((sum, piece) => sum + piece.length, 0);
  const expected = cell(state, PHASE) - 2 * cell(cells, plan.outside) * length;
  const unit = unitImpedance(prepared, parts.shape.innerRadius);
  state[PHASE] = nearestTurn(reflectionPhase(state, unit), expected);
  keepWave();
  const resistance = cell(cells, parts.outlet);
  const reactance = cell(cells, parts.outlet + 1);
  state[0] = cell(state, 0) + resistance * cell(state, 2) - reactance * cell(state, 3);
  state[1] = cell(state, 1) + resistance * cell(state, 3) + reactance * cell(state, 2);
  turnBy(unit);
}
