import type { BenchMeasures } from '../../bench/bench-layout.ts';

export interface BobPlace {
  /** From the vertical, px; left is flat. */
  dx: number;
  /** Past the end of the scale: the side where the bob is held, else 0. */
  held: -1 | 0 | 1;
}

type PlumbMeasures = Pick<BenchMeasures, 'pxPerCent' | 'heldAtCents'>;

/** Where a bob comes to rest. One scale for every column and register. */
export function bobPlace(cents: number, { pxPerCent, heldAtCents }: PlumbMeasures): BobPlace {
  if (cents > heldAtCents) return { dx: heldAtCents * pxPerCent, held: 1 };
  if (cents < -heldAtCents) return { dx: -heldAtCents * pxPerCent, held: -1 };
  return { dx: cents * pxPerCent, held: 0 };
}
