import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { randomDesigns } from '../../../tests/support/random-design.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { designDimensions, type Dimension } from './design-dimensions.ts';
import { designSensitivities } from './design-sensitivities.ts';
import { predictDesign } from './predict-design.ts';
import type { FingeringPrediction } from './prediction.ts';

const hole = (id: string, positionMm: number, diameterMm: number): DesignDocument['holes'][number] => ({
  id,
  name: id,
  positionMm,
  diameterMm,
  angleDeg: 0,
  chimneyMm: null,
  undercut: null,
  cover: 'finger',
  hand: 'left',
});

function conicalFlute(mouthEnd: DesignDocument['mouthEnd']): DesignDocument {
  return {
    format: 'borewright-design/1',
    name: 'Flute',
    pitch: { a4Hz: 440, temperament: 'equal', tonic: 'D', centsOffsets: null },
    air: {
      temperatureC: 22,
      relativeHumidity: 0.5,
      co2Fraction: 0.01,
      pressurePa: 101_325,
      mouthTemperatureC: null,
      warmLengthMm: null,
      losses: true,
      fixed: null,
    },
    mouthEnd,
    bore: {
      stations: [
        { positionMm: 0, diameterMm: 19 },
        { positionMm: 130.3, diameterMm: 18.2 },
        { positionMm: 480, diameterMm: 12 },
      ],
    },
    outside: {
      stations: [
        { positionMm: 0, diameterMm: 27 },
        { positionMm: 480, diameterMm: 25 },
      ],
    },
    foot: { kind: 'open' },
    holes: [
      hole('t', 205.3, 6.1),
      { ...hole('h1', 232, 7.5), undercut: { innerDiameterMm: 9, depthMm: 3 } },
      hole('h2', 293.4, 6.5),
      { ...hole('h3', 352.7, 8), angleDeg: 170 },
    ],
    fingerings: [
      ['a', 1, ['t', 'h1', 'h2', 'h3']],
      ['b', 1, ['t', 'h1']],
      ['c', 2, ['t', 'h1', 'h2']],
    ].map(([id, register, covered]) => ({
      id: id as string,
      note: 'D4',
      register: register as number,
      covered: covered as string[],
      half: id === 'c' ? [{ hole: 'h3', fraction: 0.4, from: 'end' as const }] : [],
      weight: 1,
      centsOffset: 0,
    })),
  };
}

describe('cents per unit of every dimension', () => {
  it.each<DesignDocument['mouthEnd']>([
    { kind: 'rim', cover: 0.5, correctionScale: 1.1 },
    { kind: 'ideal-closed', correctionScale: 1 },
    {
      kind: 'embouchure',
      lengthMm: 9,
      widthMm: 10,
      chimneyMm: 4.5,
      undercut: null,
      lipCover: 0.4,
      lipAngleDeg: 85,
      stopperMm: 19,
      correctionScale: 1,
    },
  ])('agree with differences to 1e-5, mouth end $kind', (mouthEnd) => {
    const document = conicalFlute(mouthEnd);
    const exact = designSensitivities(document);
    for (const { key, value, at } of designDimensions(document)) {
      const step = 1e-4 * Math.max(Math.abs(value), 1);
      const [more, less] = [predictDesign(at(value + step)), predictDesign(at(value - step))];
      const found = more.fingerings.map((fingering, i) => ({
        difference:
          (1200 * Math.log2(fingering.frequencyHz! / less.fingerings[i]!.frequencyHz!)) / (2 * step),
        exact: exact.fingerings[i]!.centsPerUnit[key]!,
      }));
      const scale = Math.max(...found.map(({ difference }) => Math.abs(difference)));
      for (const { difference, exact: derivative } of found) {
        expect(Math.abs(difference - derivative), key).toBeLessThan(1e-5 * scale + 1e-6);
      }
    }
  });
});

/** Central difference in cents per unit, at two steps and extrapolated to none. */
function differences({ value, at }: Dimension): (number | null)[] {
  const step = 5e-5 * Math.max(Math.abs(value), 1);
  const along = (by: number) =>
    predictDesign(at(value + by), { modes: 3 }).fingerings.map((note) => note.frequencyHz);
  const [far, near, nearer, farther] = [-2, -1, 1, 2].map((share) => along(share * step));
  return near!.map((low, i) => {
    const [lowest, high, highest] = [far![i], nearer![i], farther![i]];
    if (!low || !lowest || !high || !highest) return null;
    const small = (1200 * Math.log2(high / low)) / (2 * step);
    const large = (1200 * Math.log2(highest / lowest)) / (4 * step);
    return (4 * small - large) / 3;
  });
}

/** A random design with a second fingering, all covered and overblown. */
const twoNotes = (document: DesignDocument): DesignDocument => {
  const [fingering] = document.fingerings;
  const covered = document.holes.filter(({ cover }) => cover !== 'vent').map(({ id }) => id);
  return {
    ...document,
    fingerings: [fingering!, { ...fingering!, id: 'low', register: 2, covered, half: [] }],
  };
};

/** Whether a note sounds, and not on a weak rung: there the phase has hardly a slope, and the root fewer digits. */
const speaks = ({ ladder, mode }: FingeringPrediction): boolean =>
  ladder.find((rung) => rung.mode === mode)?.weak === false;

describe('cents per unit of every dimension of random designs', () => {
  it.each(['ideal-open', 'ideal-closed', 'window', 'embouchure', 'rim', 'reed'] as const)(
    'agree with differences to 1e-5, mouth end %s',
    (mouth) => {
      const seen = new Set<string>();
      fc.assert(
        fc.property(randomDesigns({ mouth: [mouth], fewestHoles: 1 }).map(twoNotes), (document) => {
          const { fingerings } = designSensitivities(document);
          const speaking = predictDesign(document).fingerings.map(speaks);
          for (const dimension of designDimensions(document)) {
            seen.add(dimension.key.replace(/\d+/, 'N'));
            differences(dimension).forEach((difference, i) => {
              const exact = fingerings[i]!.centsPerUnit[dimension.key];
              if (!speaking[i] || difference === null || exact === undefined) return;
              // The roots of the differences are themselves right to a millionth of a cent per millimetre.
              const slack = 1e-5 * Math.abs(difference) + 2e-6;
              expect(Math.abs(difference - exact), dimension.key).toBeLessThan(slack);
            });
          }
        }),
        { numRuns: 4, seed: 1912, endOnFailure: true },
      );
      expect([...seen]).toEqual(
        expect.arrayContaining([
          'holes.N.positionMm',
          'holes.N.diameterMm',
          'holes.N.chimneyMm',
          'holes.N.undercut.innerDiameterMm',
          'holes.N.undercut.depthMm',
          'bore.stations.N.diameterMm',
          'foot.positionMm',
          'air.temperatureC',
        ]),
      );
    },
  );
});
