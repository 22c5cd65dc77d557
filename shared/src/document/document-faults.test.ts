import { describe, expect, it } from 'vitest';
import { designDocumentSchema, type DesignDocument } from './design-document.ts';
import { documentFaults } from './document-faults.ts';
import { readDocument } from './read-document.ts';

const whistle = (): DesignDocument =>
  designDocumentSchema.parse({
    format: 'borewright-design/1',
    name: 'Test whistle',
    pitch: { a4Hz: 440, temperament: 'equal', tonic: 'D' },
    air: { temperatureC: 22, relativeHumidity: 0.5, co2Fraction: 0.02, pressurePa: 101325 },
    mouthEnd: { kind: 'window', widthMm: 8, lengthMm: 4.2, wallMm: 1.2, rampDeg: 20 },
    bore: {
      stations: [
        { positionMm: -4.2, diameterMm: 12.7 },
        { positionMm: 265, diameterMm: 12.7 },
      ],
    },
    outside: {
      stations: [
        { positionMm: -4.2, diameterMm: 17.5 },
        { positionMm: 265, diameterMm: 17.5 },
      ],
    },
    foot: { kind: 'open' },
    holes: [
      { id: 'h1', name: '1', positionMm: 122.6, diameterMm: 7, cover: 'finger' },
      { id: 'h2', name: '2', positionMm: 144.5, diameterMm: 8.5, cover: 'finger' },
    ],
    fingerings: [{ id: 'f-d5', note: 'D5', register: 1, covered: ['h1', 'h2'] }],
  });

const embouchure = (stopperMm = 16): DesignDocument['mouthEnd'] => ({
  kind: 'embouchure',
  lengthMm: 10.5,
  widthMm: 12.5,
  chimneyMm: 4.2,
  undercut: null,
  lipCover: 0.35,
  lipAngleDeg: 90,
  stopperMm,
  correctionScale: 1,
});

type Change = (document: DesignDocument) => void;
const faultsAfter = (change: Change) => {
  const document = whistle();
  change(document);
  return documentFaults(document).map((fault) => `${fault.path.join('.')}: ${fault.message}`);
};

describe('a document that can be predicted', () => {
  it('has no faults', () => {
    expect(documentFaults(whistle())).toEqual([]);
  });

  it('may have a step: two stations at one place', () => {
    expect(
      faultsAfter((document) =>
        document.bore.stations.splice(
          1,
          0,
          { positionMm: 100, diameterMm: 12.7 },
          { positionMm: 100, diameterMm: 12 },
        ),
      ),
    ).toEqual([]);
  });

  it('may have a thumb hole opposite a finger hole', () => {
    expect(
      faultsAfter((document) =>
        document.holes.push({ ...document.holes[0]!, id: 'thumb', name: 'T', angleDeg: 180, cover: 'thumb' }),
      ),
    ).toEqual([]);
  });
});

describe('what is wrong is named by field, with what would do', () => {
  it.each<[string, Change, string]>([
    [
      'crossing stations',
      (d) => d.bore.stations.push({ positionMm: 200, diameterMm: 12 }),
      'bore.stations.2.positionMm: Station 3 of the bore lies before station 2. Move it footward of 265.0 from the mouth end.',
    ],
    [
      'crossing stations outside',
      (d) => d.outside.stations.splice(1, 0, { positionMm: 300, diameterMm: 17 }),
      'outside.stations.2.positionMm: Station 3 of the outside lies before station 2. Move it footward of 300.0 from the mouth end.',
    ],
    [
      'three stations at one place',
      (d) => d.bore.stations.push({ positionMm: 265, diameterMm: 12 }, { positionMm: 265, diameterMm: 11 }),
      'bore.stations.3.positionMm: Three stations of the bore lie at 265.0 from the mouth end. A step needs two.',
    ],
    [
      'a bore that does not begin at the block face',
      (d) => void (d.bore.stations[0]!.positionMm = 0),
      'bore.stations.0.positionMm: The bore begins at the block face, 4.2 before the lip. Begin its table there.',
    ],
    [
      'a bore wider than the outside',
      (d) => void (d.bore.stations[1]!.diameterMm = 18),
      'outside.stations: The bore breaks through the outside at 265.0 from the mouth end. Make the outside there wider than 18.0.',
    ],
    [
      'a hole outside the bore',
      (d) => void (d.holes[1]!.positionMm = 270),
      'holes.1.positionMm: Hole 2 lies outside the bore, or cuts into its end. Place it between 7.6 and 260.7 from the mouth end.',
    ],
    [
      'a hole over the edge of the foot',
      (d) => void (d.holes[1]!.positionMm = 263),
      'holes.1.positionMm: Hole 2 lies outside the bore, or cuts into its end. Place it between 7.6 and 260.7 from the mouth end.',
    ],
    [
      'a hole under the window',
      (d) => void (d.holes[0]!.positionMm = -1.5),
      'holes.0.positionMm: Hole 1 lies outside the bore, or cuts into its end. Place it between 6.8 and 261.5 from the mouth end.',
    ],
    ...[-40, -10, 0, 8].map((positionMm): [string, Change, string] => [
      `a hole ${positionMm} from an embouchure hole, before it or in it`,
      (d) => {
        d.mouthEnd = embouchure();
        for (const profile of [d.bore, d.outside]) profile.stations[0]!.positionMm = -60;
        d.holes[0]!.positionMm = positionMm;
      },
      'holes.0.positionMm: Hole 1 lies outside the bore, or cuts into its end. Place it between 8.8 and 261.5 from the mouth end.',
    ]),
    [
      'a hole wider than the bore',
      (d) => void (d.holes[0]!.diameterMm = 13),
      'holes.0.diameterMm: Hole 1 is 13.0 and the bore there is 12.7. Make it 12.0 or less.',
    ],
    [
      'overlapping holes',
      (d) => void (d.holes[1]!.positionMm = 125),
      'holes.1.positionMm: Hole 1 and hole 2 run into each other by 5.3. Move one or choose smaller drills.',
    ],
    [
      'two holes with one id',
      (d) => void (d.holes[1]!.id = 'h1'),
      'holes.1.id: Hole 2 has the same id as another hole. Give it one of its own.',
    ],
    [
      'an undercut narrower than its hole',
      (d) => void (d.holes[0]!.undercut = { innerDiameterMm: 6, depthMm: 1 }),
      'holes.0.undercut.innerDiameterMm: Hole 1 is undercut to 6.0, less than its 7.0. Make it 7.0 or more.',
    ],
    [
      'an undercut as wide as the bore',
      (d) => void (d.holes[0]!.undercut = { innerDiameterMm: 12.5, depthMm: 1 }),
      "holes.0.undercut.innerDiameterMm: Hole 1 is undercut to 12.5, too near the bore's own width. Make it 12.0 or less.",
    ],
    [
      'an undercut deeper than the wall',
      (d) => void (d.holes[0]!.undercut = { innerDiameterMm: 8, depthMm: 3 }),
      'holes.0.undercut.depthMm: Hole 1 is undercut 3.0 deep in a wall of 2.4. Make it 2.4 or less.',
    ],
    [
      'overlapping holes with names of their own',
      (d) => {
        d.holes[0]!.name = 'L1';
        d.holes[1]!.name = 'L2';
        d.holes[1]!.positionMm = 125;
      },
      'holes.1.positionMm: Hole L1 and hole L2 run into each other by 5.3. Move one or choose smaller drills.',
    ],
    [
      'a stopper that stands in the embouchure hole',
      (d) => void (d.mouthEnd = embouchure(5)),
      'mouthEnd.stopperMm: The stopper stands in the embouchure hole. Set it 5.3 or more from the middle of the hole.',
    ],
    [
      'a pad without a height',
      (d) => void (d.holes[0]!.cover = 'pad'),
      'holes.0.padHeightMm: Hole 1 has a pad. Give its height when open.',
    ],
    [
      'a fingering with an unknown hole',
      (d) => void d.fingerings[0]!.covered.push('h9'),
      'fingerings.0.covered.2: D5 names hole h9, which is not in this design.',
    ],
    [
      'a covered vent',
      (d) => void (d.holes[0]!.cover = 'vent'),
      'fingerings.0.covered.0: D5 covers a vent hole, which no finger reaches.',
    ],
    [
      'a hole both covered and half-covered',
      (d) => void d.fingerings[0]!.half.push({ hole: 'h1', fraction: 0.5, from: 'side' }),
      'fingerings.0.half.0.hole: D5 has hole h1 both covered and half-covered. Keep one.',
    ],
    [
      'two fingerings with one id',
      (d) => void d.fingerings.push(d.fingerings[0]!),
      'fingerings.1.id: Two fingerings have the id f-d5.',
    ],
    [
      'own cents that are missing',
      (d) => void (d.pitch.temperament = 'own'),
      'pitch.centsOffsets: Own cents need twelve figures, one for each semitone from the tonic.',
    ],
    [
      'half a warm column',
      (d) => void (d.air.mouthTemperatureC = 30),
      'air.warmLengthMm: A column that is warm at the mouth needs both the temperature there and the warm length.',
    ],
  ])('%s', (_name, change, message) => {
    expect(faultsAfter(change)).toContain(message);
  });

  it('all at once', () => {
    const faults = faultsAfter((document) => {
      document.holes[0]!.diameterMm = 13;
      document.pitch.temperament = 'own';
    });
    expect(faults).toHaveLength(2);
  });
});

describe('reading a document', () => {
  const refusedPaths = (change: (document: Record<string, unknown>) => void) => {
    const document = structuredClone(whistle()) as unknown as Record<string, unknown>;
    change(document);
    const reading = readDocument(document);
    return reading.status === 'refused' ? reading.faults.map((fault) => fault.path.join('.')) : [];
  };

  it('gives back the same document, defaults filled in', () => {
    const reading = readDocument(JSON.parse(JSON.stringify(whistle())));
    expect(reading).toEqual({ status: 'read', document: whistle() });
  });

  it.each<[string, (document: DesignDocument) => void, string]>([
    ['no number', (d) => void (d.holes[0]!.diameterMm = NaN), 'holes.0.diameterMm'],
    ['an infinite position', (d) => void (d.holes[0]!.positionMm = Infinity), 'holes.0.positionMm'],
    ['a negative diameter', (d) => void (d.bore.stations[0]!.diameterMm = -1), 'bore.stations.0.diameterMm'],
    ['one station', (d) => void d.outside.stations.pop(), 'outside.stations'],
    [
      '401 stations',
      (d) =>
        void (d.bore.stations = Array.from({ length: 401 }, (_, i) => ({ positionMm: i, diameterMm: 12 }))),
      'bore.stations',
    ],
    [
      '25 holes',
      (d) => void (d.holes = Array.from({ length: 25 }, (_, i) => ({ ...d.holes[0]!, id: `x${i}` }))),
      'holes',
    ],
    [
      '121 fingerings',
      (d) =>
        void (d.fingerings = Array.from({ length: 121 }, (_, i) => ({ ...d.fingerings[0]!, id: `x${i}` }))),
      'fingerings',
    ],
    ['a note that is none', (d) => void (d.fingerings[0]!.note = 'H5'), 'fingerings.0.note'],
    ['air colder than the formulas reach', (d) => void (d.air.temperatureC = -5), 'air.temperatureC'],
    ['another format', (d) => void Object.assign(d, { format: 'borewright-design/2' }), 'format'],
    ['a name of nothing', (d) => void (d.name = '  '), 'name'],
  ])('refuses %s by its field', (_name, change, path) => {
    expect(refusedPaths((document) => change(document as unknown as DesignDocument))).toContain(path);
  });

  it.each<[string, unknown, string]>([
    ['NaN', NaN, 'Give a number that is finite.'],
    ['text', '6.5', 'Give a number here.'],
    ['nothing', undefined, 'This is missing.'],
    ['a minus', -1, 'Give more than 0.'],
    ['a house', 9000, 'Give 500 or less.'],
  ])('says what would do in place of %s', (_name, diameterMm, message) => {
    const document = { ...whistle(), holes: [{ ...whistle().holes[0]!, diameterMm }] };
    const reading = readDocument(document);
    expect(reading).toMatchObject({
      status: 'refused',
      faults: [{ path: ['holes', 0, 'diameterMm'], message }],
    });
  });

  it('refuses fields it does not know', () => {
    expect(refusedPaths((document) => void (document.colour = 'blue'))).toEqual(['']);
  });

  it.each([null, 7, 'text', [], {}])('refuses %j', (input) => {
    expect(readDocument(input).status).toBe('refused');
  });
});
