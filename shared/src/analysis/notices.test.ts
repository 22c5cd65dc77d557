import { describe, expect, it } from 'vitest';
import type { DesignDocument, MouthEnd, ToneHole } from '../document/design-document.ts';
import { predictDesign } from './predict-design.ts';

const hole: ToneHole = {
  id: 'h1',
  name: '1',
  positionMm: 160,
  diameterMm: 7,
  angleDeg: 0,
  chimneyMm: null,
  undercut: null,
  cover: 'finger',
  hand: 'left',
};

const whistleWindow: MouthEnd = {
  kind: 'window',
  widthMm: 7.2,
  lengthMm: 3.2,
  wallMm: 2.2,
  rampDeg: 20,
  correctionScale: 1,
};

const embouchure: MouthEnd = {
  kind: 'embouchure',
  lengthMm: 7,
  widthMm: 7,
  chimneyMm: 2.5,
  undercut: null,
  lipCover: 0.4,
  lipAngleDeg: 90,
  stopperMm: 3.2,
  correctionScale: 1,
};

const stations = (diameterMm: number): DesignDocument['bore'] => ({
  stations: [
    { positionMm: -3.2, diameterMm },
    { positionMm: 257, diameterMm },
  ],
});

const whistle: DesignDocument = {
  format: 'borewright-design/1',
  name: 'Whistle',
  pitch: { a4Hz: 440, temperament: 'equal', tonic: 'D', centsOffsets: null },
  air: {
    temperatureC: 22,
    relativeHumidity: 0.5,
    co2Fraction: 0.02,
    pressurePa: 101_325,
    mouthTemperatureC: null,
    warmLengthMm: null,
    losses: true,
    fixed: null,
  },
  mouthEnd: whistleWindow,
  bore: stations(12.7),
  outside: stations(17.7),
  foot: { kind: 'open' },
  holes: [hole],
  fingerings: [
    { id: 'closed', note: 'D5', register: 1, covered: ['h1'], half: [], weight: 1, centsOffset: 0 },
    { id: 'open', note: 'A5', register: 1, covered: [], half: [], weight: 1, centsOffset: 0 },
  ],
};

const withHole = (changes: Partial<ToneHole>): Partial<DesignDocument> => ({
  holes: [{ ...hole, ...changes }],
});
const withAir = (changes: Partial<DesignDocument['air']>): Partial<DesignDocument> => ({
  air: { ...whistle.air, ...changes },
});
const withMouth = (mouthEnd: MouthEnd): Partial<DesignDocument> => ({ mouthEnd });
const withBore = (...places: [positionMm: number, diameterMm: number][]): Partial<DesignDocument> => ({
  bore: { stations: places.map(([positionMm, diameterMm]) => ({ positionMm, diameterMm })) },
});
const halfCovered = (fraction: number, from: 'side' | 'end'): Partial<DesignDocument> => ({
  fingerings: whistle.fingerings.map((fingering) => ({
    ...fingering,
    covered: [],
    half: [{ hole: 'h1', fraction, from }],
  })),
});

const codes = (changes: Partial<DesignDocument>): string[] => {
  const { notices, fingerings } = predictDesign({ ...whistle, ...changes });
  return [...notices, ...fingerings.flatMap((fingering) => fingering.notices)].map(({ code }) => code);
};

/** What makes a notice appear, and what lies near it and does not; nothing: the plain whistle. */
const CASES: [code: string, changes: Partial<DesignDocument>, near?: Partial<DesignDocument>][] = [
  ['air-carbon-dioxide', withAir({ co2Fraction: 0.05 }), withAir({ co2Fraction: 0.04 })],
  ['air-fixed', withAir({ fixed: { speedOfSound: 345, density: 1.2 } })],
  [
    'bore-step',
    withBore([-3.2, 12.7], [200, 12.7], [200, 9], [257, 9]),
    withBore([-3.2, 12.7], [200, 12.7], [200, 11.5], [257, 11.5]),
  ],
  [
    'bore-steep-cone',
    withBore([-3.2, 12.7], [200, 12.7], [220, 9], [257, 9]),
    withBore([-3.2, 12.7], [100, 12.7], [220, 9], [257, 9]),
  ],
  ['bore-extended-to-stopper', withMouth({ ...embouchure, stopperMm: 10 }), withMouth(embouchure)],
  [
    'window-width-outside-formula',
    withMouth({ ...whistleWindow, widthMm: 11 }),
    withMouth({ ...whistleWindow, widthMm: 10 }),
  ],
  ['window-length-outside-formula', withMouth({ ...whistleWindow, lengthMm: 6.2 })],
  [
    'window-wall-outside-formula',
    withMouth({ ...whistleWindow, wallMm: 0.5 }),
    withMouth({ ...whistleWindow, wallMm: 0.7 }),
  ],
  [
    'window-ramp-outside-formula',
    withMouth({ ...whistleWindow, rampDeg: 30 }),
    withMouth({ ...whistleWindow, rampDeg: 25 }),
  ],
  [
    'lip-cover-outside-formula',
    withMouth({ ...embouchure, lipCover: 0.1 }),
    withMouth({ ...embouchure, lipCover: 0.2 }),
  ],
  [
    'lip-angle-outside-formula',
    withMouth({ ...embouchure, lipAngleDeg: 150 }),
    withMouth({ ...embouchure, lipAngleDeg: 120 }),
  ],
  [
    'embouchure-body-outside-formula',
    withMouth({ ...embouchure, lengthMm: 5, widthMm: 5 }),
    withMouth(embouchure),
  ],
  [
    'embouchure-shape-outside-formula',
    withMouth({ ...embouchure, lengthMm: 6, widthMm: 8 }),
    withMouth({ ...embouchure, lengthMm: 6.5, widthMm: 7.5 }),
  ],
  [
    'outside-not-covered',
    {
      outside: {
        stations: [
          { positionMm: -4.2, diameterMm: 17.5 },
          { positionMm: 200, diameterMm: 17.5 },
        ],
      },
    },
  ],
  [
    'rim-cover',
    withMouth({ kind: 'rim', cover: 0.1, correctionScale: 1 }),
    withMouth({ kind: 'rim', cover: 0.5, correctionScale: 1 }),
  ],
  ['reed-uncalibrated', withMouth({ kind: 'reed', equivalentVolumeMm3: 900, correctionScale: 1 })],
  ['hole-wider-than-formula', withHole({ diameterMm: 11.7 }), withHole({ diameterMm: 11.4 })],
  ['hole-narrower-than-formula', withHole({ diameterMm: 2 }), withHole({ diameterMm: 2.6 })],
  [
    'hole-chimney-outside-formula',
    withHole({ diameterMm: 3, chimneyMm: 9 }),
    withHole({ diameterMm: 3, chimneyMm: 7 }),
  ],
  [
    'undercut-outside-formula',
    withHole({ undercut: { innerDiameterMm: 7.2, depthMm: 0.5 } }),
    withHole({ undercut: { innerDiameterMm: 8, depthMm: 2 } }),
  ],
  ['pad-width-assumed', withHole({ cover: 'pad', padHeightMm: 3 })],
  [
    'pad-height-outside-formula',
    withHole({ cover: 'pad', padHeightMm: 0.3 }),
    withHole({ cover: 'pad', padHeightMm: 3 }),
  ],
  ['half-cover-from-foot-end', halfCovered(0.5, 'end'), halfCovered(0.5, 'side')],
  ['half-cover-outside-formula', halfCovered(0.95, 'side'), halfCovered(0.5, 'side')],
];

describe('notices', () => {
  it('are none for a whistle inside every formula', () => {
    expect(codes({})).toEqual([]);
  });

  it.each(CASES)('say %s where it is so', (code, changes) => {
    expect(codes(changes)).toContain(code);
  });

  it.each(CASES)('do not say %s near it', (code, _, near = {}) => {
    expect(codes(near)).not.toContain(code);
  });

  it('say when no resonance answers', () => {
    const fingerings = whistle.fingerings.map((fingering) => ({ ...fingering, covered: [], register: 8 }));
    const { fingerings: notes } = predictDesign({ ...whistle, fingerings });
    expect(notes.map(({ frequencyHz }) => frequencyHz)).toEqual([null, null]);
    expect(notes[0]?.notices.map(({ code }) => code)).toEqual(['no-resonance']);
  });

  it('name the hole and the fingering that they are about', () => {
    const { notices } = predictDesign({ ...whistle, ...withHole({ diameterMm: 11.7 }) });
    expect(notices.find(({ code }) => code === 'hole-wider-than-formula')?.hole).toBe('h1');
    const halves = predictDesign({ ...whistle, ...halfCovered(0.5, 'end') }).fingerings;
    expect(halves[0]?.notices.map(({ hole: about }) => about)).toEqual(['h1']);
  });
});

describe('expected accuracy', () => {
  const accuracy = (changes: Partial<DesignDocument>): number =>
    predictDesign({ ...whistle, ...changes }).fingerings[1]?.accuracyCents ?? NaN;

  it.each([
    ['an undercut', withHole({ undercut: { innerDiameterMm: 8, depthMm: 2 } })],
    ['a half-covered hole', halfCovered(0.5, 'side')],
    ['an open pad', withHole({ cover: 'pad', padHeightMm: 3 })],
    ['a mouth end that is blown freely', withMouth(embouchure)],
  ])('is wider with %s', (_, changes) => {
    expect(accuracy(changes)).toBeGreaterThan(accuracy({}));
  });

  it('is wider yet where the undercut was never studied', () => {
    const studied = accuracy(withHole({ undercut: { innerDiameterMm: 8, depthMm: 2 } }));
    expect(accuracy(withHole({ undercut: { innerDiameterMm: 7.2, depthMm: 0.5 } }))).toBeGreaterThan(studied);
  });

  it('is narrower after calibration where there is a mouth end to calibrate, and the same where there is none', () => {
    const [window] = predictDesign(whistle).fingerings;
    expect(window?.calibratedAccuracyCents).toBeLessThan((window?.accuracyCents ?? NaN) / 2);
    const [bare] = predictDesign({
      ...whistle,
      ...withMouth({ kind: 'ideal-open', correctionScale: 1 }),
      ...withBore([0, 12.7], [257, 12.7]),
    }).fingerings;
    expect(bare?.calibratedAccuracyCents).toBe(bare?.accuracyCents);
  });

  it('is no narrower for a correction scale that was only typed, and narrower without a mouth end', () => {
    const typed = accuracy(withMouth({ ...whistleWindow, correctionScale: 1.02 }));
    expect(typed).toBe(accuracy({}));
    expect(accuracy(withMouth({ kind: 'ideal-open', correctionScale: 1 }))).toBeLessThan(typed);
  });
});
