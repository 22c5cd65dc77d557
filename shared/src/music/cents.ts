const CENTS_PER_OCTAVE = 1200;

/** Interval from a reference up to a frequency, cents; both in Hz, > 0. */
export function centsBetween(frequencyHz: number, referenceHz: number): number {
  return CENTS_PER_OCTAVE * Math.log2(frequencyHz / referenceHz);
}

/** Frequency that lies a number of cents above a reference, Hz. */
export function frequencyAbove(referenceHz: number, cents: number): number {
  return referenceHz * 2 ** (cents / CENTS_PER_OCTAVE);
}

/** Beats per second that two tones make together: the difference of their frequencies. */
export function beatsBetween(aHz: number, bHz: number): number {
  return Math.abs(aHz - bHz);
}

/** Cents as they stand on screen and paper: always a sign save for 0.0, a true minus, one decimal. */
export function formatCents(cents: number, digits = 1): string {
  const size = Math.abs(cents).toFixed(digits);
  if (Number(size) === 0) return size;
  return `${cents < 0 ? '\u2212' : '+'}${size}`;
}
