import { EngineInputError } from '../acoustics/engine-input-error.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { wordsFromFoot, type DocumentFault } from '../document/fault-words.ts';
import { readDocument, type DocumentReading } from '../document/read-document.ts';
import type { LengthUnit } from '../lengths/read-length.ts';
import { noteFrequencyHz } from '../music/temperament.ts';
import { transposeSpelled, transpositionBetween, type Transposition } from '../music/transposition.ts';
import { drillCautions, toNearestDrills } from './drill-sizes.ts';
import { firstLayout, keepBore } from './keep-bore.ts';
import { referenceNote } from './reference-note.ts';
import { roundLengths } from './round-lengths.ts';
import { scaleLengths } from './scale-lengths.ts';
import { keptBoreWords, scaledWords } from './transform-words.ts';

export interface TransformOrder {
  /** What the reference note of the chart becomes: its lowest note, or the tonic of a design without fingerings. */
  lowestNote: string;
  a4Hz: number;
  /** `scaled`: every length by the same factor. `kept`: the bore, the mouth end and the drills stay; holes and foot move. */
  bore: 'scaled' | 'kept';
  /** `nearest-drill` only where holes are scaled. */
  holeSizes: 'exact' | 'nearest-drill';
  /** Which drills are meant, and how lengths are written in what is said. */
  unit: LengthUnit;
}

export type TransformOutcome =
  | {
      status: 'transformed';
      document: DesignDocument;
      /** New frequency over old, the same for every note. */
      ratio: number;
      /** What was done and what was kept, in sentences. */
      done: string[];
      /** What a maker has to look at before cutting. */
      cautions: string[];
    }
  | { status: 'refused'; faults: DocumentFault[] };

/** A hundredth of a millimetre: finer than wood is cut, and below a tenth of a cent. Finer still only where that breaks something. */
const DECIMALS = [2, 4, 6] as const;

/**
 * A valid design in another key or at another pitch standard, or the reason why there is none.
 *
 * @throws RangeError if the order's note is not a note
 */
export function transformDesign(document: DesignDocument, order: TransformOrder): TransformOutcome {
  const transposed = transposeChart(document, order);
  try {
    return order.bore === 'kept'
      ? withBoreKept(document, transposed, order)
      : withAllScaled(document, transposed, order);
  } catch (error) {
    if (!(error instanceof EngineInputError)) throw error;
    return { status: 'refused', faults: [{ path: error.field.split('.'), message: error.message }] };
  }
}

interface TransposedChart {
  document: DesignDocument;
  ratio: number;
  cautions: string[];
}

/** Pitch and notes as wanted, no length touched yet. */
function transposeChart(document: DesignDocument, order: TransformOrder): TransposedChart {
  const from = referenceNote(document);
  const interval = transpositionBetween(from, order.lowestNote);
  const pitch = {
    ...document.pitch,
    a4Hz: order.a4Hz,
    tonic: transposeSpelled(`${document.pitch.tonic}4`, interval).note.replace(/-?\d$/, ''),
  };
  const moved = document.fingerings.map((fingering) => ({
    fingering,
    ...transposeSpelled(fingering.note, interval),
  }));
  const neighbours = moved.filter(({ isSpelled }) => !isSpelled).map(({ note }) => note);
  return {
    document: {
      ...document,
      pitch,
      fingerings: moved.map(({ fingering, note }) => ({ ...fingering, note })),
    },
    ratio: noteFrequencyHz(order.lowestNote, pitch) / noteFrequencyHz(from, document.pitch),
    cautions: spellingCautions(document, interval, neighbours),
  };
}

/** Where fifths are not 700 cents, G## and A are two notes. */
function spellingCautions(
  { pitch }: DesignDocument,
  { semitones }: Transposition,
  neighbours: readonly string[],
): string[] {
  const isChain = pitch.temperament === 'pythagorean' || pitch.temperament === 'quarter-comma-meantone';
  if (!isChain || neighbours.length === 0 || semitones === 0) return [];
  const names = [...new Set(neighbours)].join(', ');
  return [
    `${names} would need two signs in this key and stands for its neighbour in name, which this temperament tunes otherwise. Choose the key by its other name, or set these notes by hand.`,
  ];
}

function withAllScaled(
  original: DesignDocument,
  { document, ratio, cautions }: TransposedChart,
  order: TransformOrder,
): TransformOutcome {
  const scaled = scaleLengths(document, 1 / ratio);
  const drilled = order.holeSizes === 'nearest-drill' ? toNearestDrills(scaled, order.unit) : scaled;
  const reading = firstValid(
    DECIMALS.map(
      (decimals) => () => readDocument(roundLengths(drilled, decimals), wordsFromFoot(order.unit)),
    ),
  );
  if (reading.status === 'refused') return reading;
  return {
    status: 'transformed',
    document: reading.document,
    ratio,
    done: scaledWords(original, reading.document, { ratio, ...order }),
    cautions: [...cautions, ...drillCautions(reading.document, order.unit)],
  };
}

function withBoreKept(
  original: DesignDocument,
  { document, ratio, cautions }: TransposedChart,
  { unit }: TransformOrder,
): TransformOutcome {
  // Nothing that cannot be drawn is given to the engine: holes that run into each other are told as they are.
  const words = wordsFromFoot(unit);
  const first = readDocument(firstLayout(document, original, ratio), words);
  if (first.status === 'refused') return first;
  const { document: placed, furthestCents } = keepBore(document, original, ratio);
  const reading = readDocument(placed, words);
  if (reading.status === 'refused') return reading;
  const said = keptBoreWords(original, reading.document, { furthestCents, unit });
  return {
    status: 'transformed',
    document: reading.document,
    ratio,
    done: said.done,
    cautions: [...cautions, ...said.cautions],
  };
}

function firstValid(readings: readonly (() => DocumentReading)[]): DocumentReading {
  const [read, ...finer] = readings;
  if (read === undefined) throw new RangeError('There is nothing to choose from.');
  const reading = read();
  return reading.status === 'read' || finer.length === 0 ? reading : firstValid(finer);
}
