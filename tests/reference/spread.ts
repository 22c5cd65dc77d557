/** Largest and root-mean-square size of a set of errors. */
export interface Spread {
  count: number;
  max: number;
  rms: number;
}

/** Sums up the errors of a comparison; an empty set or a figure that is none fails, so that no sample goes missing. */
export function spreadOf(errors: readonly number[]): Spread {
  if (errors.length === 0) throw new RangeError('Nothing was compared.');
  if (!errors.every(Number.isFinite)) throw new RangeError('A compared figure is not a number.');
  const squares = errors.reduce((sum, error) => sum + error * error, 0);
  return {
    count: errors.length,
    max: Math.max(...errors.map(Math.abs)),
    rms: Math.sqrt(squares / errors.length),
  };
}

/** Error over the expected value. */
export function relative(value: number, expected: number): number {
  return value / expected - 1;
}
