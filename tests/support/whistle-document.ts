import type { DesignDocument } from '#shared/document/design-document.ts';

/** A plain six-hole whistle in D for tests that need some document; its figures are nobody's instrument. */
export function whistleDocument(changes: Partial<DesignDocument> = {}): DesignDocument {
  const hole = (number: number, positionMm: number, diameterMm: number): DesignDocument['holes'][number] => ({
    id: `h${number}`,
    name: String(number),
    positionMm,
    diameterMm,
    angleDeg: 0,
    chimneyMm: null,
    undercut: null,
    cover: 'finger',
    hand: number <= 3 ? 'left' : 'right',
  });
  const fingering = (note: string, covered: number, register = 1): DesignDocument['fingerings'][number] => ({
    id: `f-${note.replace('#', 's').toLowerCase()}`,
    note,
    register,
    covered: Array.from({ length: covered }, (_, index) => `h${index + 1}`),
    half: [],
    weight: 1,
    centsOffset: 0,
  });
  return {
    format: 'borewright-design/1',
    name: 'Test whistle',
    pitch: { a4Hz: 440, temperament: 'equal', tonic: 'D', centsOffsets: null },
    air: {
      temperatureC: 22,
      relativeHumidity: 0.5,
      co2Fraction: 0.02,
      pressurePa: 101325,
      mouthTemperatureC: null,
      warmLengthMm: null,
      losses: true,
      fixed: null,
    },
    mouthEnd: { kind: 'window', widthMm: 9, lengthMm: 4.4, wallMm: 1.2, rampDeg: 20, correctionScale: 1 },
    bore: {
      stations: [
        { positionMm: -4.4, diameterMm: 12.7 },
        { positionMm: 265, diameterMm: 12.7 },
      ],
    },
    outside: {
      stations: [
        { positionMm: -4.4, diameterMm: 17.5 },
        { positionMm: 265, diameterMm: 17.5 },
      ],
    },
    foot: { kind: 'open' },
    holes: [
      hole(1, 122.6, 7),
      hole(2, 144.5, 8.5),
      hole(3, 162.2, 7.5),
      hole(4, 186.8, 6.5),
      hole(5, 200.8, 9),
      hole(6, 219.6, 6),
    ],
    fingerings: [
      fingering('D5', 6),
      fingering('E5', 5),
      fingering('F#5', 4),
      fingering('G5', 3),
      fingering('A5', 2),
      fingering('B5', 1),
      fingering('C#6', 0),
      fingering('E6', 5, 2),
      fingering('G6', 3, 2),
    ],
    ...changes,
  };
}
