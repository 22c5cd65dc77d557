import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { flowOverPages, type FlowSection } from './flow.ts';

const section = (headMm: number, heights: readonly number[], drawn: string[] = []): FlowSection => ({
  gapMm: 5,
  head: {
    heightMm: headMm,
    draw: (_, isContinued) => {
      drawn.push(isContinued ? 'head again' : 'head');
    },
  },
  blocks: heights.map((heightMm, index) => ({
    heightMm,
    draw: () => {
      drawn.push(`row ${index + 1}`);
    },
  })),
});

describe('the flow over pages', () => {
  it('repeats the head where rows run on', () => {
    const drawn: string[] = [];
    const pages = flowOverPages([section(10, [30, 30, 30], drawn)], { topMm: 40, bottomMm: 115 });
    pages.flat().forEach((block) => block.draw());
    expect(drawn).toEqual(['head', 'row 1', 'row 2', 'head again', 'row 3']);
    expect(pages.map((page) => page.map(({ topMm }) => topMm))).toEqual([
      [40, 50, 80],
      [40, 50],
    ]);
  });

  it('never leaves a head alone at the foot of a page', () => {
    const pages = flowOverPages([section(10, [50]), section(10, [30])], { topMm: 0, bottomMm: 90 });
    expect(pages.map((page) => page.length)).toEqual([2, 2]);
  });

  it('keeps every block on the page and off its neighbours', () => {
    const heights = fc.array(fc.integer({ min: 3, max: 40 }), { maxLength: 30 });
    const sections = fc.array(fc.tuple(fc.integer({ min: 0, max: 30 }), heights), { maxLength: 6 });
    fc.assert(
      fc.property(sections, (parts) => {
        const flowed = parts.map(([headMm, rows]) => section(headMm, rows));
        for (const page of flowOverPages(flowed, { topMm: 42, bottomMm: 270 })) {
          let below = 42;
          for (const { topMm, heightMm } of page) {
            expect(topMm).toBeGreaterThanOrEqual(below);
            below = topMm + heightMm;
          }
          expect(below).toBeLessThanOrEqual(270);
        }
      }),
    );
  });
});
