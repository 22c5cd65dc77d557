import { describe, expect, it } from 'vitest';
import type { DesignDocument } from '../document/design-document.ts';
import { designDimensions } from './design-dimensions.ts';
import { designSensitivities } from './design-sensitivities.ts';
import { predictDesign } from './predict-design.ts';

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
