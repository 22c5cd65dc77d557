import type { DesignPrediction, DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { DesignDocument, Fingering, ToneHole } from '#shared/document/design-document.ts';
import { noteFrequencyHz } from '#shared/music/temperament.ts';
import type { SheetInput } from '../../server/src/sheets/sheet-input.ts';

/** A tone hole; only what a test is about has to be said. */
export function buildHole(hole: Partial<ToneHole> & { id: string; positionMm: number }): ToneHole {
  return {
    name: '',
    diameterMm: 6,
    angleDeg: 0,
    chimneyMm: null,
    undercut: null,
    cover: 'finger',
    hand: 'left',
    ...hole,
  };
}

const WHISTLE_HOLES: readonly [positionMm: number, diameterMm: number][] = [
  [122.6, 7],
  [144.5, 8.5],
  [162.2, 7.5],
  [185.8, 6.5],
  [200.8, 9],
  [218.9, 6],
];

const WHISTLE_NOTES = ['C#6', 'B5', 'A5', 'G5', 'F#5', 'E5', 'D5'];

function plainFingering(note: string, open: number, register: number): Fingering {
  const covered = WHISTLE_HOLES.map((_, index) => `h${index + 1}`).slice(0, open);
  return { id: `f-${register}-${open}`, note, register, covered, half: [], weight: 1, centsOffset: 0 };
}

const octaveUp = (note: string) => note.replace(/\d$/, (octave) => String(Number(octave) + 1));

/** A six-hole whistle in D with first and second register, two half-covered notes and a cross-fingering. */
export function buildWhistle(changes: Partial<DesignDocument> = {}): DesignDocument {
  const plain = [1, 2].flatMap((register) =>
    WHISTLE_NOTES.map((note, open) => plainFingering(register === 1 ? note : octaveUp(note), open, register)),
  );
  const half: Fingering = {
    ...plainFingering('D#5', 5, 1),
    id: 'half-6',
    half: [{ hole: 'h6', fraction: 0.5, from: 'side' }],
  };
  const cross: Fingering = { ...plainFingering('C6', 0, 1), id: 'cross', covered: ['h2', 'h3', 'h5'] };
  return {
    format: 'borewright-design/1',
    name: 'Wharf D whistle',
    pitch: { a4Hz: 440, temperament: 'equal', tonic: 'D', centsOffsets: null },
    air: {
      temperatureC: 24,
      relativeHumidity: 0.5,
      co2Fraction: 0.02,
      pressurePa: 101_325,
      mouthTemperatureC: null,
      warmLengthMm: null,
      losses: true,
      fixed: null,
    },
    mouthEnd: { kind: 'window', widthMm: 9.4, lengthMm: 4.6, wallMm: 2.4, rampDeg: 20, correctionScale: 1 },
    bore: {
      stations: [
        { positionMm: -4.6, diameterMm: 12.7 },
        { positionMm: 265, diameterMm: 12.7 },
      ],
    },
    outside: {
      stations: [
        { positionMm: -31, diameterMm: 17.5 },
        { positionMm: 265, diameterMm: 17.5 },
      ],
    },
    foot: { kind: 'open' },
    holes: WHISTLE_HOLES.map(([positionMm, diameterMm], index) =>
      buildHole({
        id: `h${index + 1}`,
        positionMm,
        diameterMm,
        undercut: index === 4 ? { innerDiameterMm: 9.6, depthMm: 1 } : null,
      }),
    ),
    fingerings: [...plain, half, cross],
    ...changes,
  };
}

/** A prediction with made-up cents, as the drawing only writes down what it is given. */
export function buildPrediction(document: DesignDocument): DesignPrediction {
  return {
    engine: 'borewright test',
    notices: [],
    fingerings: document.fingerings.map((fingering, index) => {
      const targetHz = noteFrequencyHz(fingering.note, document.pitch);
      const touched = new Set([...fingering.covered, ...fingering.half.map((half) => half.hole)]);
      const open = document.holes
        .filter((hole) => !touched.has(hole.id))
        .sort((a, b) => a.positionMm - b.positionMm);
      const centsFromScale = ((index * 7) % 23) - 11.4;
      return {
        id: fingering.id,
        note: fingering.note,
        register: fingering.register,
        targetHz,
        frequencyHz: targetHz * 2 ** (centsFromScale / 1200),
        centsFromScale,
        beatsHz: 1,
        mode: fingering.register,
        ladder: [],
        ventHole: open[0]?.id ?? null,
        cutoffHz: null,
        accuracyCents: 8,
        notices: [],
      };
    }),
  };
}

export function buildSensitivities(document: DesignDocument): DesignSensitivities {
  return {
    engine: 'borewright test',
    fingerings: document.fingerings.map(({ id }) => ({
      id,
      centsPerUnit: Object.fromEntries([
        ['air.temperatureC', 2.9],
        ...document.holes.flatMap((_, index) => [
          [`holes.${index}.diameterMm`, 17 + index],
          [`holes.${index}.positionMm`, -7.5 - index],
        ]),
      ]) as Record<string, number>,
    })),
  };
}

/** Everything a sheet is drawn from; a document brings the prediction that belongs to it. */
export function buildSheetInput(changes: Partial<SheetInput> = {}): SheetInput {
  const document = changes.document ?? buildWhistle();
  return {
    document,
    prediction: buildPrediction(document),
    sensitivities: buildSensitivities(document),
    workshop: { name: 'Saltgate Yard', unit: 'mm', referenceEnd: 'foot', bandCents: [5, 10] },
    revision: { number: 7, state: 'draft', draftSavedAt: new Date(2026, 2, 12, 14, 6) },
    printedAt: new Date(2026, 2, 12, 15, 30),
    paper: 'A4',
    unit: 'mm',
    drawnBy: 'Ines Varrow',
    ...changes,
  };
}
