import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { designDocumentSchema, type DesignDocument } from './design-document.ts';
import { documentDifference, takeDifference } from './document-difference.ts';

const whistle: DesignDocument = designDocumentSchema.parse({
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

const changed = (change: (document: DesignDocument) => void): DesignDocument => {
  const copy = structuredClone(whistle);
  change(copy);
  return copy;
};

describe('the difference of two documents', () => {
  it('is empty for the same document', () => {
    expect(documentDifference(whistle, structuredClone(whistle))).toEqual([]);
  });

  it('names a hole by its own name and the field in words', () => {
    const wider = changed((document) => {
      document.holes[1]!.diameterMm = 9;
    });
    expect(documentDifference(whistle, wider)).toEqual([
      { path: ['holes', 'h2', 'diameterMm'], label: 'Hole 2 diameter', before: 8.5, after: 9 },
    ]);
  });

  it('keeps the other holes in their places when one is added above them', () => {
    const more = changed((document) => {
      document.holes.unshift({ ...document.holes[0]!, id: 'h0', name: '0', positionMm: 100 });
    });
    const [only, ...others] = documentDifference(whistle, more);
    expect(others).toEqual([]);
    expect(only).toMatchObject({ path: ['holes', 'h0'], label: 'Hole 0', before: undefined });
  });

  it('takes a mouth end of another kind as a whole', () => {
    const reed = changed((document) => {
      document.mouthEnd = { kind: 'reed', equivalentVolumeMm3: 500, correctionScale: 1 };
    });
    expect(documentDifference(whistle, reed).map((difference) => difference.path)).toEqual([['mouthEnd']]);
  });

  it('taken over piece by piece, makes the one document of the other', () => {
    const edits: ((document: DesignDocument) => void)[] = [
      (document) => void (document.name = 'Other'),
      (document) => void document.holes.pop(),
      (document) => void (document.holes[0]!.undercut = { innerDiameterMm: 8, depthMm: 1 }),
      (document) => void (document.bore.stations[1]!.diameterMm = 12),
      (document) => void (document.pitch.a4Hz = 415),
      (document) => void (document.fingerings[0]!.covered = []),
      (document) => void (document.mouthEnd = { kind: 'rim', cover: 0.4, correctionScale: 1 }),
    ];
    fc.assert(
      fc.property(fc.subarray(edits), (chosen) => {
        const other = changed((document) => chosen.forEach((edit) => edit(document)));
        const merged = documentDifference(whistle, other).reduce(takeDifference, whistle);
        expect(documentDifference(merged, other)).toEqual([]);
      }),
    );
  });
});
