/** One piece of a cubic spline: value c0 + c1·u + c2·u² + c3·u³ at u = x − from, for x up to `to`. */
export interface SplinePiece {
  from: number;
  to: number;
  c0: number;
  c1: number;
  c2: number;
  c3: number;
}

interface Interval {
  from: number;
  to: number;
  width: number;
  value: number;
  slope: number;
}

/**
 * Cubic spline through points, twice smooth everywhere, with no knot at the second and the last but one.
 *
 * @param points - x and y of each, x rising, at least four
 * @returns one piece per interval, in order
 * @throws RangeError if there are fewer than four points or x does not rise
 * @source C. de Boor, A Practical Guide to Splines (1978), the not-a-knot condition
 */
export function cubicSpline(points: readonly (readonly [x: number, y: number])[]): SplinePiece[] {
  const intervals = intervalsOf(points);
  const slopes = nodeSlopes(intervals);
  return intervals.map(({ from, to, width, value, slope }, i) => {
    const left = slopes[i] ?? NaN;
    const right = slopes[i + 1] ?? NaN;
    return {
      from,
      to,
      c0: value,
      c1: left,
      c2: (3 * slope - 2 * left - right) / width,
      c3: (left + right - 2 * slope) / (width * width),
    };
  });
}

function intervalsOf(points: readonly (readonly [number, number])[]): Interval[] {
  if (points.length < 4) throw new RangeError('A spline needs four points.');
  return points.slice(1).map(([x, y], i) => {
    const [x0, y0] = points[i] ?? [NaN, NaN];
    if (!(x > x0)) throw new RangeError('The points of a spline rise in x.');
    return { from: x0, to: x, width: x - x0, value: y0, slope: (y - y0) / (x - x0) };
  });
}

// Slopes at the nodes, from the tridiagonal system of continuous curvature.
function nodeSlopes(intervals: readonly Interval[]): number[] {
  const rows: Row[] = [endRow(intervals[0], intervals[1])];
  intervals.slice(1).forEach((right, i) => {
    const left = intervals[i] ?? right;
    rows.push({
      below: right.width,
      own: 2 * (left.width + right.width),
      above: left.width,
      right: 3 * (right.width * left.slope + left.width * right.slope),
    });
  });
  const last = endRow(intervals.at(-1), intervals.at(-2));
  rows.push({ ...last, below: last.above, above: 0 });
  return solveTridiagonal(rows);
}

interface Row {
  below: number;
  own: number;
  above: number;
  right: number;
}

// The not-a-knot condition at one end, read inwards.
function endRow(outer: Interval | undefined, inner: Interval | undefined): Row {
  if (outer === undefined || inner === undefined) throw new RangeError('A spline needs four points.');
  const both = outer.width + inner.width;
  const right =
    ((outer.width + 2 * both) * inner.width * outer.slope + outer.width * outer.width * inner.slope) / both;
  return { below: 0, own: inner.width, above: both, right };
}

function solveTridiagonal(rows: readonly Row[]): number[] {
  const reduced: { above: number; right: number }[] = [];
  for (const row of rows) {
    const before = reduced.at(-1) ?? { above: 0, right: 0 };
    const pivot = row.own - row.below * before.above;
    reduced.push({ above: row.above / pivot, right: (row.right - row.below * before.right) / pivot });
  }
  const solution: number[] = [];
  for (const { above, right } of reduced.toReversed()) solution.unshift(right - above * (solution[0] ?? 0));
  return solution;
}
