import { TWO_PORT_CELLS } from '../complex/two-port.ts';
import type { BorePlan } from './bore-plan.ts';

/**
 * Room in which the openings of one fingering are solved for; one per column, used again for every fingering.
 *
 * The squares have a row for each open hole and the open foot (the nodes) and one column more: what the mouth's own flow does.
 */
export interface OpeningSystem {
  /** How many nodes the fingering solved last has. */
  nodes: number;
  /** Place of each node's branch; −1 for the foot. */
  branch: Int32Array;
  /** Place of each node among the openings of the coupling. */
  opening: Int32Array;
  /** Address of the two-ports from the mouth's outlet to the first node, on to the next, … */
  between: number;
  /** Addresses of the bore's tridiagonal admittance between the nodes; `beside` is that to the node before. */
  diagonal: number;
  beside: number;
  /** Address of the pressures at the bore for unit flows out of the openings, and of the flows out of the bore. */
  pressure: number;
  flow: number;
  /** Address of the equations; the last column holds the outflows for unit flow into the mouth end. */
  matrix: number;
  /** Address of the input impedance, Pa·s/m³. */
  impedance: number;
}

/**
 * Takes room for the openings of a column.
 *
 * @param plan - the column's cells
 * @param holes - how many the body has
 * @returns the room
 */
export function planOpenings(plan: BorePlan, holes: number): OpeningSystem {
  const nodes = holes + 1;
  const square = 2 * nodes * (nodes + 1);
  return {
    nodes: 0,
    branch: new Int32Array(nodes),
    opening: new Int32Array(nodes),
    between: plan.take((nodes + 1) * TWO_PORT_CELLS),
    diagonal: plan.take(2 * nodes),
    beside: plan.take(2 * nodes),
    pressure: plan.take(square),
    flow: plan.take(square),
    matrix: plan.take(square),
    impedance: plan.take(2),
  };
}

/**
 * Address of the flow out of a node for unit flow into the mouth end.
 *
 * @param system - solved
 * @param node - counts the open holes from the mouth side, then the foot
 * @returns address of its real part
 */
export function outflowAt(system: OpeningSystem, node: number): number {
  return system.matrix + 2 * (node * (system.nodes + 1) + system.nodes);
}
