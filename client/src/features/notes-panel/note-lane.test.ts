import { describe, expect, it } from 'vitest';
import { benchFrame, benchGeometry } from '../../bench/bench-geometry.ts';
import { WHOLE } from '../../bench/bench-view.ts';
import { drawnBody } from '../../bench/drawn-body.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { fingeringRemark } from './fingering-remark.ts';
import { notesLayout } from './note-lane.ts';

const whistle = whistleDocument();
const layoutAt = (widthPx: number, document = whistle) =>
  notesLayout(benchGeometry(document, benchFrame(drawnBody(document), widthPx, WHOLE)));

describe('the chart of notes', () => {
  it.each([1440, 1280, 1024, 800, 390])(
    'at %i px keeps the lane left of the circles, both inside the page',
    (width) => {
      const { lane, columns, centsRight } = layoutAt(width);
      expect(lane.left).toBeGreaterThan(centsRight);
      expect(lane.x(1000)).toBeLessThanOrEqual(lane.right);
      expect(lane.x(-1000)).toBeGreaterThanOrEqual(lane.left);
      expect(columns.length).toBeGreaterThan(0);
      columns.forEach(({ x }) => expect(x).toBeLessThan(width));
    },
  );

  it('stands its circles under their holes where there is room', () => {
    layoutAt(1440).columns.forEach(({ x, holeX }) => expect(x).toBe(holeX));
  });

  it('spreads twenty holes', () => {
    const holes = Array.from({ length: 20 }, (_, index) => ({
      ...whistle.holes[0]!,
      id: `h${index}`,
      positionMm: 60 + index * 9,
    }));
    const { columns } = layoutAt(1440, { ...whistle, holes, fingerings: [] });
    columns.slice(1).forEach(({ x }, index) => expect(x - columns[index]!.x).toBeGreaterThan(20));
  });
});

describe('remarks', () => {
  const holes = labelledHoles(whistle);
  const fingering = (covered: string[], half: string[] = [], register = 1) => ({
    ...whistle.fingerings[0]!,
    covered,
    register,
    half: half.map((hole) => ({ hole, fraction: 0.5, from: 'side' as const })),
  });

  it.each([
    ['', fingering(['h1', 'h2', 'h3'])],
    ['', fingering([])],
    ['half-cover 6', fingering(['h1', 'h2', 'h3', 'h4', 'h5'], ['h6'])],
    ['cross', fingering(['h2', 'h3', 'h4'])],
    ['vented octave', fingering(['h2', 'h3', 'h4', 'h5', 'h6'], [], 2)],
  ])('%s', (remark, of) => {
    expect(fingeringRemark(of, holes, 'window')).toBe(remark);
  });
});
