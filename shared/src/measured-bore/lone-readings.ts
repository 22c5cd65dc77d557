import type { Station } from '../document/design-document.ts';

/** Neighbours on each side by which a reading is judged. */
const SIDE = 3;
/** A normal distribution's standard deviation over its median absolute deviation. Hampel (1974). */
const MAD_TO_SIGMA = 1.4826;
/** The identifier's usual cut, in standard deviations. Davies and Gather (1993). */
const CUT = 3;
/** What a bore gauge in a maker's hand repeats to, mm; common practice. A smaller limit would leave out honest readings. */
const LEAST_LIMIT_MM = 0.05;

/**
 * By how much each reading stands alone, mm: its distance from the line that its neighbours make, signed.
 *
 * The line is the median of slopes (Sen 1968), not a running median: that would bend a taper at its ends. A reading is
 * held against both sides together and against each side of three by itself, and the least of these counts, so that a
 * step or a groove two readings long is no outlier; it is 0 where they disagree about the side.
 *
 * @param series - readings of one gauge direction in order of position
 * @source F. R. Hampel, J. Am. Stat. Assoc. 69 (1974) 383–393; P. K. Sen, J. Am. Stat. Assoc. 63 (1968) 1379–1389
 */
export function aloneByMm(series: readonly Station[]): number[] {
  return series.map((reading, index) => {
    const deviations = neighbourhoods(series, index)
      .map((neighbours) => lineAt(neighbours, reading.positionMm))
      .filter((expected) => expected !== null)
      .map((expected) => reading.diameterMm - expected);
    const isOneSided = deviations.every((by) => by > 0) || deviations.every((by) => by < 0);
    if (!isOneSided) return 0;
    return deviations.reduce(
      (least, by) => (Math.abs(by) < Math.abs(least) ? by : least),
      deviations[0] ?? 0,
    );
  });
}

/**
 * The limit that the Hampel identifier sets: three standard deviations, told from the median distance to the line.
 *
 * @param series - one series of readings for each gauge direction
 * @returns mm, rounded up to a hundredth
 * @source L. Davies and U. Gather, J. Am. Stat. Assoc. 88 (1993) 782–792
 */
export function usualLimitMm(series: readonly (readonly Station[])[]): number {
  const distances = series.flatMap((each) =>
    each.flatMap((reading, index) => {
      const expected = lineAt(neighbourhoods(each, index)[0] ?? [], reading.positionMm);
      return expected === null ? [] : [Math.abs(reading.diameterMm - expected)];
    }),
  );
  const limit = CUT * MAD_TO_SIGMA * (medianOf(distances) ?? 0);
  return Math.max(LEAST_LIMIT_MM, Math.ceil(limit * 100 - 1e-9) / 100);
}

/** The six nearest, then each side's three where it has three. */
function neighbourhoods(series: readonly Station[], index: number): Station[][] {
  const from = Math.max(0, Math.min(index - SIDE, series.length - 1 - 2 * SIDE));
  const around = series.slice(from, from + 2 * SIDE + 1).filter((reading) => reading !== series[index]);
  const sides = [series.slice(Math.max(0, index - SIDE), index), series.slice(index + 1, index + 1 + SIDE)];
  return [around, ...sides.filter((side) => side.length === SIDE)];
}

/** Fewer than this make no line that a reading could be held against. */
const LEAST_NEIGHBOURS = 3;

function lineAt(neighbours: readonly Station[], positionMm: number): number | null {
  if (neighbours.length < LEAST_NEIGHBOURS) return null;
  const slopes: number[] = [];
  neighbours.forEach((a, index) => {
    for (const b of neighbours.slice(index + 1)) {
      if (b.positionMm !== a.positionMm)
        slopes.push((b.diameterMm - a.diameterMm) / (b.positionMm - a.positionMm));
    }
  });
  const slope = medianOf(slopes) ?? 0;
  return medianOf(
    neighbours.map((neighbour) => neighbour.diameterMm + slope * (positionMm - neighbour.positionMm)),
  );
}

/** Of a handful of numbers, thousands of times: a general median spends ten times as long on preparing itself. */
function medianOf(values: readonly number[]): number | null {
  const sorted = values.toSorted((a, b) => a - b);
  const [below, above] = [sorted[Math.ceil(sorted.length / 2) - 1], sorted[Math.floor(sorted.length / 2)]];
  return below === undefined || above === undefined ? null : (below + above) / 2;
}
