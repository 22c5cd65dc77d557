import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leaderLanes } from './leader-lanes.ts';
import { spreadColumns } from './spread-columns.ts';

const HANG_LEFT = 700;

/** Columns as the bench spreads them, from holes anywhere on it. */
const columns = fc
  .array(fc.integer({ min: 40, max: 1390 }), { minLength: 1, maxLength: 12 })
  .map((xs) => xs.toSorted((a, b) => a - b))
  .map((xs) => {
    const spread = spreadColumns(xs, { spacing: 58, left: HANG_LEFT + 36, right: 1390 });
    return xs.map((holeX, index) => ({ key: `h${index}`, holeX, x: spread[index]! }));
  });

describe('leaderLanes', () => {
  it('leaves leaders alone whose holes stand over the columns', () => {
    expect(leaderLanes([{ key: 'a', holeX: 760, x: 760 }], HANG_LEFT)).toEqual([null]);
  });

  it('never lets a lane cross the drop of another hole or the descent to another column', () => {
    fc.assert(
      fc.property(columns, (cols) => {
        const lanes = leaderLanes(cols, HANG_LEFT);
        cols.forEach(({ holeX, x }, i) => {
          const lane = lanes[i];
          if (lane === null || lane === undefined) return;
          const [from, to] = [Math.min(holeX, x), Math.max(holeX, x)];
          cols.forEach((other, j) => {
            if (i === j) return;
            // The other's drop reaches down to its own lane, or past all lanes.
            const dropsTo = lanes[j] ?? Infinity;
            if (other.holeX > from && other.holeX < to) expect(dropsTo).toBeLessThan(lane);
            // The other's descent begins at its lane.
            const descendsFrom = lanes[j] ?? Infinity;
            if (other.x > from && other.x < to) expect(descendsFrom).toBeGreaterThan(lane);
          });
        });
      }),
    );
  });
});
