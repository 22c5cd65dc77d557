import { describe, expect, it } from 'vitest';
import { predictDesign } from '../analysis/predict-design.ts';
import type { Air, Pitch } from '../document/design-document.ts';
import { documentFaults } from '../document/document-faults.ts';
import { starterDocument, STARTER_KINDS, type StarterKind } from '../document/starter-documents.ts';
import { placeHoles } from './place-holes.ts';

const air: Air = {
  temperatureC: 22,
  relativeHumidity: 0.5,
  co2Fraction: 0.02,
  pressurePa: 101_325,
  mouthTemperatureC: null,
  warmLengthMm: null,
  losses: true,
  fixed: null,
};
const pitch = (tonic: string): Pitch => ({ a4Hz: 440, temperament: 'equal', tonic, centsOffsets: null });
const starter = (kind: StarterKind, lowestNote: string) =>
  starterDocument({ kind, name: 'First layout', lowestNote, pitch: pitch(lowestNote.slice(0, -1)), air });

const LOWEST_NOTES: Record<StarterKind, string[]> = {
  whistle: ['D5', 'C5', 'D4'],
  flute: ['D4', 'F4', 'Bb4', 'D5'],
  'end-blown': ['A4', 'D4'],
  recorder: ['F4', 'C5'],
  'reed-pipe': ['C4', 'G4'],
};

describe.each(STARTER_KINDS)('a first %s', (kind) => {
  it.each(LOWEST_NOTES[kind])('on %s can be drawn, and its holes placed on the scale', (lowestNote) => {
    const first = starter(kind, lowestNote);
    expect(documentFaults(first)).toEqual([]);
    const { document, furthestCents } = placeHoles(first);
    expect(documentFaults(document)).toEqual([]);
    // 0.1 mm, the step of the layout, is at most 1.5 cents on the shortest of these.
    expect(Math.abs(furthestCents ?? Infinity)).toBeLessThan(1.5);
    const { fingerings } = predictDesign(document, { modes: 1 });
    const first1 = fingerings.filter((fingering) => fingering.register === 1);
    expect(first1.length).toBeGreaterThanOrEqual(7);
    for (const { note, centsFromScale } of first1)
      expect(Math.abs(centsFromScale ?? Infinity), note).toBeLessThan(2);
  });
});

describe('placing holes', () => {
  it('keeps diameters, bore and mouth end', () => {
    const first = starter('whistle', 'D5');
    const { document } = placeHoles(first);
    expect(document.holes.map((hole) => hole.diameterMm)).toEqual(first.holes.map((hole) => hole.diameterMm));
    expect(document.mouthEnd).toEqual(first.mouthEnd);
    expect(document.bore.stations[0]).toEqual(first.bore.stations[0]);
  });

  it('leaves a design without fingerings as it is', () => {
    const bare = { ...starter('whistle', 'D5'), fingerings: [] };
    expect(placeHoles(bare)).toMatchObject({ furthestCents: null, document: { holes: bare.holes } });
  });

  it('finds the length of a pipe that is stopped at the foot', () => {
    const open = starter('end-blown', 'A4');
    const lowest = open.fingerings.slice(0, 1).map((fingering) => ({ ...fingering, note: 'A3' }));
    const stopped = { ...open, foot: { kind: 'stopped' as const }, fingerings: lowest };
    const { furthestCents, rounds } = placeHoles(stopped);
    // 0.1 mm of a column of about 380 mm is half a cent.
    expect(Math.abs(furthestCents ?? Infinity)).toBeLessThan(0.6);
    expect(rounds).toBeLessThan(8);
  });
});
