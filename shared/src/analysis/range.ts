/** A range of a formula; either end may be open. */
export interface Range {
  from?: number;
  to?: number;
}

/** Whether a figure lies outside a range by more than rounding. */
export function isOutside(value: number, { from = -Infinity, to = Infinity }: Range): boolean {
  return value < from - 1e-9 || value > to + 1e-9;
}
