import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { benchFrame, benchGeometry } from './bench-geometry.ts';
import { WHOLE } from './bench-view.ts';
import { drawnBody } from './drawn-body.ts';
import { tablePlaces } from './table-places.ts';

const document = whistleDocument();
const [template] = document.holes;

const placesFor = (positionsMm: readonly number[], widthPx: number) => {
  const holes = positionsMm.map((positionMm, index) => ({ ...template!, id: `h${index}`, positionMm }));
  const moved = { ...document, holes };
  const geometry = benchGeometry(moved, benchFrame(drawnBody(moved), widthPx, WHOLE));
  return { geometry, places: tablePlaces(geometry) };
};

describe('tablePlaces', () => {
  it('puts every figure exactly under its column and no two over each other, whatever the holes and the width', () => {
    const positions = fc.array(fc.double({ min: 20, max: 250, noNaN: true }), {
      minLength: 1,
      maxLength: 12,
    });
    fc.assert(
      fc.property(positions, fc.integer({ min: 390, max: 1800 }), (mm, widthPx) => {
        const { geometry, places } = placesFor(mm, widthPx);
        places.cells.forEach((cell, index) => {
          expect(cell.middle).toBe(geometry.columns[index]!.x);
          const next = places.cells[index + 1];
          if (next !== undefined) expect(next.middle - cell.middle).toBeGreaterThanOrEqual(cell.room - 1e-6);
        });
      }),
    );
  });

  it('leaves its labels on the bench', () => {
    fc.assert(
      fc.property(fc.integer({ min: 390, max: 1800 }), (widthPx) => {
        const { places } = placesFor([30, 60, 90], widthPx);
        expect(places.left).toBeGreaterThanOrEqual(0);
        expect(places.right).toBeLessThanOrEqual(widthPx);
      }),
    );
  });
});
