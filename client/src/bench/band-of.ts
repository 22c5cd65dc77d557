/** Half width of the band in a register; the last figure holds for all above. */
export function bandOf(bandCents: readonly number[], register: number): number {
  return bandCents[register - 1] ?? bandCents.at(-1) ?? 0;
}
