import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { predictDesign } from '../analysis/predict-design.ts';
import type { DesignDocument, MouthEnd } from '../document/design-document.ts';
import { centsBetween } from '../music/cents.ts';
import { scaleLengths } from './scale-lengths.ts';

const lossless = (mouthEnd: MouthEnd, startMm: number): DesignDocument => {
  const whistle = whistleDocument();
  const starting = ({ stations: [first, ...rest] }: DesignDocument['bore']) => ({
    stations: [{ ...first!, positionMm: startMm }, ...rest],
  });
  return {
    ...whistle,
    mouthEnd,
    bore: starting(whistle.bore),
    outside: starting(whistle.outside),
    air: { ...whistle.air, losses: false, fixed: { speedOfSound: 345, density: 1.18 } },
    // Under lids: a fingertip does not shrink with the instrument.
    holes: whistle.holes.map((hole, index) => ({
      ...hole,
      cover: 'lid',
      undercut: index === 2 ? { innerDiameterMm: 8.4, depthMm: 1.5 } : null,
    })),
  };
};

const MOUTH_ENDS: [MouthEnd, number][] = [
  [{ kind: 'window', widthMm: 9, lengthMm: 4.4, wallMm: 1.2, rampDeg: 20, correctionScale: 1 }, -4.4],
  [
    {
      kind: 'embouchure',
      lengthMm: 9,
      widthMm: 10,
      chimneyMm: 3,
      undercut: null,
      lipCover: 0.35,
      lipAngleDeg: 90,
      stopperMm: 14,
      correctionScale: 1,
    },
    -14,
  ],
  [{ kind: 'rim', cover: 0.5, correctionScale: 1 }, 0],
  [{ kind: 'reed', equivalentVolumeMm3: 900, correctionScale: 1 }, 0],
  [{ kind: 'ideal-open', correctionScale: 1 }, 0],
  [{ kind: 'ideal-closed', correctionScale: 1 }, 0],
];

const frequencies = (document: DesignDocument) =>
  predictDesign(document, { modes: 1 }).fingerings.map(({ frequencyHz }) => frequencyHz);

describe('scaling every length', () => {
  // The wave equation without losses has no length of its own: half the size sounds an octave up, whatever the shape.
  it.each(MOUTH_ENDS)('by a half is an octave up without losses: %o', (mouthEnd, startMm) => {
    const document = lossless(mouthEnd, startMm);
    const before = frequencies({
      ...document,
      pitch: { ...document.pitch, a4Hz: 300 },
    });
    const after = frequencies({
      ...scaleLengths(document, 0.5),
      pitch: { ...document.pitch, a4Hz: 600 },
    });
    before.forEach((hz, index) => {
      expect(centsBetween(after[index] ?? NaN, hz ?? NaN)).toBeCloseTo(1200, 3);
    });
  });

  it('back and forth is what it was', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...MOUTH_ENDS),
        fc.double({ min: 0.25, max: 4, noNaN: true }),
        (mouth, factor) => {
          const document = lossless(...mouth);
          const back = scaleLengths(scaleLengths(document, factor), 1 / factor);
          back.holes.forEach((hole, index) =>
            expect(hole.positionMm).toBeCloseTo(document.holes[index]!.positionMm, 9),
          );
          expect(back.bore.stations.at(-1)!.positionMm).toBeCloseTo(265, 9);
          expect(back.fingerings).toBe(document.fingerings);
        },
      ),
    );
  });

  it('leaves what is no length alone', () => {
    const document = whistleDocument();
    const scaled = scaleLengths(document, 0.7);
    expect(scaled.pitch).toBe(document.pitch);
    expect(scaled.air.temperatureC).toBe(document.air.temperatureC);
    expect(scaled.mouthEnd).toMatchObject({ rampDeg: 20, correctionScale: 1 });
    expect(scaled.holes.map(({ angleDeg }) => angleDeg)).toEqual(
      document.holes.map(({ angleDeg }) => angleDeg),
    );
  });
});
