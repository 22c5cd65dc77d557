import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { benchFrame, benchGeometry } from '../../bench/bench-geometry.ts';
import { WHOLE } from '../../bench/bench-view.ts';
import { drawnBody } from '../../bench/drawn-body.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { tablePlaces } from './cell-offsets.ts';

describe('tablePlaces', () => {
  it('puts every figure exactly under its column, whatever the holes and the width', () => {
    const document = whistleDocument();
    const positions = fc.array(fc.double({ min: 20, max: 250, noNaN: true }), {
      minLength: 1,
      maxLength: 12,
    });
    fc.assert(
      fc.property(positions, fc.integer({ min: 390, max: 1800 }), (mm, widthPx) => {
        const [template] = document.holes;
        const moved = {
          ...document,
          holes: mm.map((positionMm, index) => ({ ...template!, id: `h${index}`, positionMm })),
        };
        const geometry = benchGeometry(moved, benchFrame(drawnBody(moved), widthPx, WHOLE));
        const places = tablePlaces(geometry);
        let edge = places.left + places.labelWidth;
        places.cells.forEach((cell, index) => {
          expect(edge + cell.middle).toBeCloseTo(geometry.columns[index]!.x, 6);
          expect(cell.width).toBeGreaterThanOrEqual(0);
          edge += cell.width;
        });
      }),
    );
  });
});
