import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { predictDesign } from '../analysis/predict-design.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { documentFaults } from '../document/document-faults.ts';
import { readDocument } from '../document/read-document.ts';
import { starterDocument, STARTER_KINDS, type StarterKind } from '../document/starter-documents.ts';
import { placeHoles } from '../fit/place-holes.ts';
import { midiNumber, readNoteName } from '../music/note-name.ts';
import { transformDesign, type TransformOrder } from './transform-design.ts';

const LOWEST: Record<StarterKind, string> = {
  whistle: 'D5',
  flute: 'D4',
  'end-blown': 'A4',
  recorder: 'F4',
  'reed-pipe': 'C4',
};

const laidOut = (kind: StarterKind): DesignDocument =>
  placeHoles(
    starterDocument({
      kind,
      name: 'Pattern',
      lowestNote: LOWEST[kind],
      pitch: { a4Hz: 440, temperament: 'equal', tonic: LOWEST[kind].slice(0, -1), centsOffsets: null },
      air: whistleDocument().air,
    }),
  ).document;

const patterns = new Map(STARTER_KINDS.map((kind) => [kind, laidOut(kind)]));
const patternOf = (kind: StarterKind) => patterns.get(kind)!;

const order = (change: Partial<TransformOrder>): TransformOrder => ({
  lowestNote: 'D5',
  a4Hz: 440,
  bore: 'scaled',
  holeSizes: 'exact',
  unit: 'mm',
  ...change,
});

function transformed(document: DesignDocument, change: Partial<TransformOrder>) {
  const outcome = transformDesign(document, order(change));
  if (outcome.status === 'refused') throw new Error(JSON.stringify(outcome.faults));
  return outcome;
}

const centsOf = (document: DesignDocument) =>
  predictDesign(document, { modes: 1 }).fingerings.map(({ centsFromScale }) => centsFromScale);

/** What keys of a keyboard the chart asks for: a far-off key may leave F# behind as Gb. */
const keysOf = ({ fingerings }: DesignDocument) =>
  fingerings.map(({ note }) => midiNumber(readNoteName(note) ?? { letter: 'C', accidental: '', octave: 0 }));

const sizesOf = (document: DesignDocument): number[] => [
  ...[...document.bore.stations, ...document.outside.stations].flatMap((station) => [
    station.positionMm,
    station.diameterMm,
  ]),
  ...document.holes.flatMap((hole) => [hole.positionMm, hole.diameterMm, hole.undercut?.depthMm ?? 0]),
];

describe('another key with every length scaled', () => {
  it('transposes chart and tonic, and says what was done and what was kept', () => {
    const { document, done } = transformed(whistleDocument(), { lowestNote: 'F5' });
    expect(document.pitch).toEqual({ ...whistleDocument().pitch, tonic: 'F' });
    expect(document.fingerings.map(({ note }) => note)).toEqual([
      'F5', 'G5', 'A5', 'Bb5', 'C6', 'D6', 'E6', 'G6', 'Bb6',
    ]); // prettier-ignore
    expect(document.fingerings.map(({ covered }) => covered)).toEqual(
      whistleDocument().fingerings.map(({ covered }) => covered),
    );
    expect(done.join(' ')).toContain('Every length is 0.8409 of what it was');
    expect(done.join(' ')).toContain('Kept: the angles, the air');
  });

  it('is twice as long an octave down', () => {
    const { document } = transformed(whistleDocument(), { lowestNote: 'D4' });
    expect(document.bore.stations.at(-1)).toEqual({ positionMm: 530, diameterMm: 25.4 });
    expect(document.holes[0]).toMatchObject({ positionMm: 245.2, diameterMm: 14 });
  });

  it.each(STARTER_KINDS)('keeps the notes of a %s within what it promises, an octave up and down', (kind) => {
    const pattern = patternOf(kind);
    const before = centsOf(pattern);
    for (const semitones of [-12, -7, -2, 2, 7, 12]) {
      const note = transposed(LOWEST[kind], semitones);
      const { document, done } = transformed(pattern, { lowestNote: note });
      expect(done.join(' ')).toContain('up to 1.3 cents a semitone');
      // Half a hundredth of a millimetre on the smallest hole and the shortest column is below half a cent.
      const most = 1.3 * Math.abs(semitones) + 0.5;
      centsOf(document).forEach((cents, index) => {
        expect(Math.abs((cents ?? NaN) - (before[index] ?? NaN)), `${kind} ${note}`).toBeLessThan(most);
      });
    }
  });

  it('gives back what it was given when it is scaled there and back, to the rounding', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...STARTER_KINDS),
        fc.integer({ min: -12, max: 12 }),
        fc.integer({ min: 392, max: 466 }),
        (kind, semitones, a4Hz) => {
          const pattern = patternOf(kind);
          const there = transformed(pattern, { lowestNote: transposed(LOWEST[kind], semitones), a4Hz });
          const back = transformed(there.document, { lowestNote: LOWEST[kind], a4Hz: 440 });
          expect(keysOf(back.document)).toEqual(keysOf(pattern));
          expect(back.document.pitch.a4Hz).toBe(440);
          const [was, is] = [sizesOf(pattern), sizesOf(back.document)];
          // Half a hundredth each way, the first half magnified by the way back.
          was.forEach((mm, index) => expect(Math.abs(mm - (is[index] ?? NaN))).toBeLessThan(0.02));
        },
      ),
      { numRuns: 60 },
    );
  });

  it('always gives a document that can be predicted, or says why not', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...STARTER_KINDS),
        fc.integer({ min: -24, max: 24 }),
        fc.constantFrom<TransformOrder['holeSizes']>('exact', 'nearest-drill'),
        fc.constantFrom<TransformOrder['unit']>('mm', 'inch'),
        (kind, semitones, holeSizes, unit) => {
          const outcome = transformDesign(
            patternOf(kind),
            order({ lowestNote: transposed(LOWEST[kind], semitones), holeSizes, unit }),
          );
          if (outcome.status === 'refused') expect(outcome.faults.length).toBeGreaterThan(0);
          else expect(readDocument(outcome.document).status).toBe('read');
        },
      ),
      { numRuns: 60 },
    );
  });

  it('keeps an undercut within a wall that it goes right through', () => {
    const document = whistleDocument();
    document.holes[1]!.undercut = { innerDiameterMm: 9.3, depthMm: 2.4 };
    for (const lowestNote of ['Eb5', 'E5', 'F5', 'F#5', 'C5', 'B4', 'Bb4']) {
      expect(documentFaults(transformed(document, { lowestNote }).document)).toEqual([]);
    }
  });

  it('follows the pitch standard alone', () => {
    const { document, ratio } = transformed(whistleDocument(), { a4Hz: 415 });
    expect(ratio).toBeCloseTo(415 / 440, 9);
    expect(document.fingerings).toEqual(whistleDocument().fingerings);
    expect(document.pitch.a4Hz).toBe(415);
  });

  it('keeps every interval of a temperament that stands on its tonic', () => {
    const just = whistleDocument({
      pitch: { a4Hz: 440, temperament: 'just', tonic: 'D', centsOffsets: null },
      air: { ...whistleDocument().air, losses: false },
    });
    const [before, after] = [centsOf(just), centsOf(transformed(just, { lowestNote: 'E5' }).document)];
    // Fingertips do not shrink with the whistle; a comma would be 21.5 cents, a wrong third 13.7.
    after.forEach((cents, index) =>
      expect(Math.abs((cents ?? NaN) - (before[index] ?? NaN))).toBeLessThan(1.5),
    );
  });

  it('names the holes that have no drill, and takes them to one when asked', () => {
    const exact = transformed(whistleDocument(), { lowestNote: 'F5' });
    expect(exact.cautions).toEqual([
      'No drills are sold in the sizes of holes 1 (5.89), 2 (7.15), 3 (6.31), 4 (5.47), 5 (7.57), 6 (5.05) mm. Take the nearest below and open them by hand.',
    ]);
    const drilled = transformed(whistleDocument(), { lowestNote: 'F5', holeSizes: 'nearest-drill' });
    expect(drilled.document.holes.map(({ diameterMm }) => diameterMm)).toEqual([5.9, 7.1, 6.3, 5.5, 7.6, 5]);
    expect(drilled.cautions).toEqual([]);
  });

  it('warns where a chain of fifths has to write a note by its neighbour', () => {
    const meantone = whistleDocument({
      pitch: { a4Hz: 440, temperament: 'quarter-comma-meantone', tonic: 'D', centsOffsets: null },
    });
    expect(transformed(meantone, { lowestNote: 'D#5' }).cautions[0]).toMatch(/^G5, D6, G6|^G5/);
    expect(transformed(meantone, { lowestNote: 'Eb5' }).cautions.join(' ')).not.toContain('two signs');
  });

  it('refuses what would outgrow the program, and names it', () => {
    const outcome = transformDesign(whistleDocument(), order({ lowestNote: 'D0' }));
    expect(outcome.status).toBe('refused');
  });
});

describe('another key with the bore kept', () => {
  it('keeps widths, mouth end and drills, and meets the scale', () => {
    const { document, done } = transformed(whistleDocument(), { lowestNote: 'C5', bore: 'kept' });
    const before = whistleDocument();
    expect(document.mouthEnd).toEqual(before.mouthEnd);
    expect(document.bore.stations.map(({ diameterMm }) => diameterMm)).toEqual([12.7, 12.7]);
    expect(document.bore.stations[0]).toEqual(before.bore.stations[0]);
    expect(document.holes.map(({ diameterMm }) => diameterMm)).toEqual(
      before.holes.map(({ diameterMm }) => diameterMm),
    );
    const firsts = predictDesign(document).fingerings.filter(({ register }) => register === 1);
    // A tenth of a millimetre of foot or hole is at most a cent at this length.
    for (const { note, centsFromScale } of firsts)
      expect(Math.abs(centsFromScale ?? NaN), note).toBeLessThan(2);
    expect(done[0]).toMatch(/^The foot is carried on by \d+\.\d mm/);
    expect(done[1]).toMatch(
      /^Kept: the width of bore and outside, the mouth end, the diameter of every hole/,
    );
  });

  it('cuts a taper where the foot comes to lie, and says how wide it is there', () => {
    const pattern = patternOf('flute');
    const { document, cautions } = transformed(pattern, { lowestNote: 'Eb4', bore: 'kept' });
    const [, middle, foot] = pattern.bore.stations;
    const end = document.bore.stations.at(-1)!;
    const share = (end.positionMm - middle!.positionMm) / (foot!.positionMm - middle!.positionMm);
    expect(share).toBeLessThan(1);
    expect(end.diameterMm).toBeCloseTo(
      middle!.diameterMm + share * (foot!.diameterMm - middle!.diameterMm),
      6,
    );
    expect(cautions.join(' ')).toContain('The taper ends elsewhere');
  });

  it.each(STARTER_KINDS)('finds places for the holes of a %s two semitones up and down', (kind) => {
    for (const semitones of [2, -2]) {
      const { document } = transformed(patternOf(kind), {
        lowestNote: transposed(LOWEST[kind], semitones),
        bore: 'kept',
      });
      expect(documentFaults(document)).toEqual([]);
    }
  });

  it('refuses with the reason where the holes would run into each other', () => {
    const outcome = transformDesign(whistleDocument(), order({ lowestNote: 'D6', bore: 'kept' }));
    expect(outcome.status).toBe('refused');
    if (outcome.status === 'refused')
      expect(outcome.faults.map(({ message }) => message).join(' ')).toContain('run into each other');
  });
});

function transposed(note: string, semitones: number): string {
  const names = ['C', 'C#', 'D', 'Eb', 'E', 'F', 'F#', 'G', 'Ab', 'A', 'Bb', 'B'];
  const key = names.indexOf(note.slice(0, -1)) + semitones + 12 * Number(note.at(-1));
  return `${names[((key % 12) + 12) % 12]!}${Math.floor(key / 12)}`;
}
