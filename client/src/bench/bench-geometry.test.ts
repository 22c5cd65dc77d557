import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { benchFrame, benchGeometry } from './bench-geometry.ts';
import { panView, WHOLE, zoomView, type BenchView } from './bench-view.ts';
import { drawnBody } from './drawn-body.ts';

const document = whistleDocument();
const body = drawnBody(document);
const widths = fc.integer({ min: 320, max: 1900 });
const views: fc.Arbitrary<BenchView> = fc.oneof(
  fc.constant(WHOLE),
  fc
    .tuple(fc.double({ min: 1.1, max: 8, noNaN: true }), fc.double({ min: 0, max: 265, noNaN: true }))
    .map(([factor, aboutMm]) => zoomView(WHOLE, body, factor, aboutMm)),
);

describe('the mapping of the bench', () => {
  it('leads back from every pixel to its millimetre', () => {
    fc.assert(
      fc.property(widths, views, fc.double({ min: -40, max: 300, noNaN: true }), (widthPx, view, mm) => {
        const frame = benchFrame(body, widthPx, view);
        expect(frame.mm(frame.x(mm))).toBeCloseTo(mm, 6);
      }),
    );
  });

  it('shows the whole instrument between the margins, true to scale, its foot at the right', () => {
    fc.assert(
      fc.property(widths, (widthPx) => {
        const frame = benchFrame(body, widthPx, WHOLE);
        expect(frame.x(body.headMm)).toBeGreaterThanOrEqual(frame.viewLeft - 1e-6);
        expect(frame.x(body.footMm)).toBeCloseTo(frame.viewRight, 6);
        expect(frame.acrossPxPerMm).toBeCloseTo(frame.pxPerMm, 6);
        expect(frame.headHidden).toBe(false);
      }),
    );
  });

  it('keeps every column over the foot or a hole in view, in the order of the holes', () => {
    fc.assert(
      fc.property(widths, views, (widthPx, view) => {
        const geometry = benchGeometry(document, benchFrame(body, widthPx, view));
        geometry.columns.slice(1).forEach((column, index) => {
          expect(column.holeX).toBeGreaterThanOrEqual(geometry.columns[index]!.holeX);
          expect(column.x).toBeGreaterThan(geometry.columns[index]!.x);
        });
      }),
    );
  });
});

describe('zoom and pan', () => {
  it('leaves the place under the pointer where it is', () => {
    fc.assert(
      fc.property(fc.double({ min: 1.2, max: 4, noNaN: true }), (factor) => {
        const near = benchFrame(body, 1440, zoomView(WHOLE, body, 2, 130));
        const aboutMm = near.mm(700);
        const nearer = benchFrame(body, 1440, zoomView(zoomView(WHOLE, body, 2, 130), body, factor, aboutMm));
        expect(nearer.x(aboutMm)).toBeCloseTo(700, 6);
      }),
    );
  });

  it('never shows what lies beyond the instrument', () => {
    fc.assert(
      fc.property(views, fc.double({ min: -400, max: 400, noNaN: true }), (view, byMm) => {
        const panned = panView(view, body, byMm);
        if (panned.kind === 'whole') return;
        expect(panned.fromMm).toBeGreaterThanOrEqual(body.headMm - 1e-6);
        expect(panned.toMm).toBeLessThanOrEqual(body.footMm + 1e-6);
      }),
    );
  });

  it('ends at the whole when zoomed out', () => {
    expect(zoomView(zoomView(WHOLE, body, 3, 100), body, 0.2, 100)).toEqual(WHOLE);
  });
});
