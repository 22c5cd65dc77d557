/** Numbers side by side, found by their address: what the engine computes in, so that a frequency allocates nothing. */
export type Cells = Float64Array;

/**
 * The number in a cell.
 *
 * @param cells - where it lies
 * @param at - its address
 * @returns the number; NaN outside, so that a slip of an address cannot pass for a result
 */
export function cell(cells: Cells, at: number): number {
  return cells[at] ?? NaN;
}
