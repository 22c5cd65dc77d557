import type { Station } from '../document/design-document.ts';

/**
 * The fewest of the given places whose straight lines pass every place within a tolerance.
 *
 * Both ends stay. Among choices with equally few stations the one with the least sum of squared distances is taken. The
 * distance is that of the diameters at one position, not the shortest one to the line.
 *
 * @param places - in order of position, no two at one position
 * @param withinMm - most that a place may lie from the line, mm, ≥ 0
 * @source H. Imai and M. Iri, Polygonal approximations of a curve, in: Computational Morphology (1988) 71–86: shortest
 *   path through the graph of permitted lines, which are told apart by the cone of slopes that pass all places so far
 */
export function thinStations(places: readonly Station[], withinMm: number): Station[] {
  const lines = asLines(places);
  const best = {
    lines: new Float64Array(places.length).fill(Infinity),
    squares: new Float64Array(places.length).fill(Infinity),
    from: new Int32Array(places.length).fill(-1),
  };
  best.lines[0] = 0;
  best.squares[0] = 0;
  for (let from = 0; from < places.length; from += 1) {
    lines.reach(from, withinMm, (to) => {
      const count = at(best.lines, from) + 1;
      if (count > at(best.lines, to)) return;
      const squares = at(best.squares, from) + lines.squares(from, to);
      if (count === at(best.lines, to) && squares >= at(best.squares, to)) return;
      best.lines[to] = count;
      best.squares[to] = squares;
      best.from[to] = from;
    });
  }
  const kept: Station[] = [];
  for (let index = places.length - 1; index >= 0; index = best.from[index] ?? -1) {
    const place = places[index];
    if (place !== undefined) kept.unshift(place);
  }
  return kept;
}

/** A rounding error must not cost a station, mm of diameter. */
const SLACK_MM = 1e-9;

/** Inside its bounds a typed array has a number everywhere. */
const at = (values: Float64Array, index: number) => values[index] ?? 0;

/** Straight lines between two of the places. Millions are looked at, hence bare arrays and running sums. */
function asLines(places: readonly Station[]) {
  const [x0, y0] = [places[0]?.positionMm ?? 0, places[0]?.diameterMm ?? 0];
  const x = Float64Array.from(places, ({ positionMm }) => positionMm - x0);
  const y = Float64Array.from(places, ({ diameterMm }) => diameterMm - y0);
  const sums = {
    x: runningSum(x, (index) => at(x, index)),
    y: runningSum(x, (index) => at(y, index)),
    xx: runningSum(x, (index) => at(x, index) ** 2),
    xy: runningSum(x, (index) => at(x, index) * at(y, index)),
    yy: runningSum(x, (index) => at(y, index) ** 2),
  };
  return {
    /** Calls with every place to which one line from here passes all between within the tolerance. */
    reach(from: number, withinMm: number, visit: (to: number) => void): void {
      let [least, most] = [-Infinity, Infinity];
      for (let to = from + 1; to < x.length && least <= most; to += 1) {
        const along = at(x, to) - at(x, from);
        const rise = at(y, to) - at(y, from);
        if (rise / along >= least && rise / along <= most) visit(to);
        least = Math.max(least, (rise - withinMm - SLACK_MM) / along);
        most = Math.min(most, (rise + withinMm + SLACK_MM) / along);
      }
    },
    /** Sum of squared distances of the places between two from the line through them. */
    squares(from: number, to: number): number {
      const slope = (at(y, to) - at(y, from)) / (at(x, to) - at(x, from));
      const start = at(y, from) - slope * at(x, from);
      const between = (sum: Float64Array) => at(sum, to) - at(sum, from + 1);
      const ofSlope = slope * (slope * between(sums.xx) - 2 * between(sums.xy) + 2 * start * between(sums.x));
      const ofStart = start * (start * (to - from - 1) - 2 * between(sums.y));
      return Math.max(0, between(sums.yy) + ofSlope + ofStart);
    },
  };
}

/** Sums of all before each index, and of all together last. */
function runningSum(values: Float64Array, term: (index: number) => number): Float64Array {
  const sums = new Float64Array(values.length + 1);
  values.forEach((_, index) => {
    sums[index + 1] = at(sums, index) + term(index);
  });
  return sums;
}
