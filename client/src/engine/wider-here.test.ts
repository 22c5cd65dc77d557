import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { diameterAt } from '#shared/document/profile.ts';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { WIDER_BY_MM, WIDER_OVER_MM, widenedAt, widerHere } from './wider-here.ts';

describe('a bore that is wider in one place', () => {
  const stations = [
    { positionMm: 0, diameterMm: 19 },
    { positionMm: 150, diameterMm: 19 },
    { positionMm: 600, diameterMm: 12 },
  ];

  it('is the old one elsewhere, wider by the same inside, and its stations stay in order', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 6, max: 594, noNaN: true }),
        fc.double({ min: 0, max: 600, noNaN: true }),
        (middle, at) => {
          const widened = widenedAt(stations, middle);
          const edge = Math.abs(Math.abs(at - middle) - WIDER_OVER_MM / 2) < 1e-6;
          const added = edge || Math.abs(at - middle) > WIDER_OVER_MM / 2 ? 0 : WIDER_BY_MM;
          if (!edge) expect(diameterAt(widened, at)).toBeCloseTo(diameterAt(stations, at) + added, 9);
          widened.slice(1).forEach((station, index) => {
            expect(station.positionMm).toBeGreaterThanOrEqual(widened[index]!.positionMm);
          });
        },
      ),
    );
  });

  it('plays sharper where the air moves most and flatter where the pressure is highest', () => {
    // Rayleigh's rule for a pipe open at both ends: the lowest note has its pressure in the middle, its motion at the ends.
    const document = {
      ...whistleDocument(),
      holes: [],
      fingerings: [{ ...whistleDocument().fingerings[0]!, covered: [] }],
    };
    const [curve] = widerHere(document, ['f-d5']);
    const at = (share: number) => curve!.points[Math.round(share * (curve!.points.length - 1))]!.cents;
    expect(at(0.5)).toBeLessThan(-0.3);
    expect(at(0.02)).toBeGreaterThan(0.3);
    expect(at(0.98)).toBeGreaterThan(0.3);
  });
});
