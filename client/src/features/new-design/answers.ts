import { EngineInputError } from '#shared/acoustics/engine-input-error.ts';
import type { Workshop } from '#shared/contract/session.ts';
import type { DesignDocument, Temperament } from '#shared/document/design-document.ts';
import { readDocument } from '#shared/document/read-document.ts';
import {
  starterDocument,
  usualBoreMm,
  type StarterKind,
  type StarterOrder,
} from '#shared/document/starter-documents.ts';
import { placeHoles } from '#shared/fit/place-holes.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { midiNumber, noteOfMidi, printNoteName, readNoteName } from '#shared/music/note-name.ts';

/** What has been answered so far. null stands for "the usual one", which follows the other answers. */
export interface Answers {
  name: string | null;
  kind: StarterKind;
  lowestNote: string;
  tonic: string | null;
  temperament: Temperament;
  a4Hz: number;
  temperatureC: number;
  boreMm: number | null;
}

export const KIND_NAMES: Record<StarterKind, string> = {
  flute: 'Transverse flute',
  whistle: 'Fipple whistle',
  'end-blown': 'End-blown flute',
  recorder: 'Recorder form',
  'reed-pipe': 'Reed pipe',
};

/** Lowest notes that instruments of a kind are made for, and the one offered first. Common practice. */
const NOTES: Record<StarterKind, { from: string; to: string; first: string }> = {
  flute: { from: 'C3', to: 'G5', first: 'D4' },
  whistle: { from: 'C3', to: 'C6', first: 'D5' },
  'end-blown': { from: 'C3', to: 'C6', first: 'A4' },
  recorder: { from: 'C3', to: 'C6', first: 'F4' },
  'reed-pipe': { from: 'C2', to: 'C5', first: 'G3' },
};

/** Keys that makers write with flats; every other one with sharps. */
const FLAT_KEYS = new Set([3, 8, 10]);

export function firstAnswers(workshop: Pick<Workshop, 'a4Hz' | 'temperatureC'>): Answers {
  return {
    name: null,
    kind: 'whistle',
    lowestNote: NOTES.whistle.first,
    tonic: null,
    temperament: 'equal',
    a4Hz: workshop.a4Hz,
    temperatureC: workshop.temperatureC,
    boreMm: null,
  };
}

/** Lowest first. */
export function lowestNotesOf(kind: StarterKind): string[] {
  const { from, to } = NOTES[kind];
  const [lowest, highest] = [midiOf(from), midiOf(to)];
  return Array.from({ length: highest - lowest + 1 }, (_, index) => {
    const midi = lowest + index;
    return printNoteName(noteOfMidi(midi, FLAT_KEYS.has(midi % 12)));
  });
}

/** Another kind keeps the lowest note where it can be made in that size. */
export function chooseKind(answers: Answers, kind: StarterKind): Answers {
  const fits = lowestNotesOf(kind).includes(answers.lowestNote) && answers.kind !== kind;
  return { ...answers, kind, boreMm: null, lowestNote: fits ? answers.lowestNote : NOTES[kind].first };
}

export function chooseLowestNote(answers: Answers, lowestNote: string): Answers {
  return { ...answers, lowestNote, tonic: null, boreMm: null };
}

export function tonicOf({ tonic, lowestNote }: Answers): string {
  return tonic ?? lowestNote.replace(/\d+$/, '');
}

export function nameOf(answers: Answers): string {
  return answers.name ?? `${KIND_NAMES[answers.kind]} in ${tonicOf(answers)}`;
}

function orderOf(answers: Answers): StarterOrder {
  return {
    kind: answers.kind,
    name: nameOf(answers).trim(),
    lowestNote: answers.lowestNote,
    pitch: {
      a4Hz: answers.a4Hz,
      temperament: answers.temperament,
      tonic: tonicOf(answers),
      centsOffsets: null,
    },
    air: {
      temperatureC: answers.temperatureC,
      relativeHumidity: 0.5,
      co2Fraction: 0.02,
      pressurePa: 101_325,
      mouthTemperatureC: null,
      warmLengthMm: null,
      losses: true,
      fixed: null,
    },
    boreMm: answers.boreMm ?? undefined,
  };
}

export const boreOf = (answers: Answers): number => answers.boreMm ?? usualBoreMm(orderOf(answers));

/** Bores outside these shares of the usual one do not speak well over two registers. Common practice. */
const BORE_SHARES = { least: 0.6, most: 1.7 };

export type BoreAdvice = { status: 'fine' } | { status: 'wrong'; message: string };

export function adviseBore(answers: Answers, unit: LengthUnit): BoreAdvice {
  if (answers.boreMm === null) return { status: 'fine' };
  const usual = usualBoreMm(orderOf({ ...answers, boreMm: null }));
  const [least, most] = [
    Math.ceil(usual * BORE_SHARES.least * 2) / 2,
    Math.floor(usual * BORE_SHARES.most * 2) / 2,
  ];
  const what = `A ${KIND_NAMES[answers.kind].toLowerCase()} down to ${answers.lowestNote}`;
  const size = (mm: number) => `${printLength(mm, unit)} ${unit === 'mm' ? 'mm' : 'in'}`;
  if (answers.boreMm < least)
    return {
      status: 'wrong',
      message: `${what} needs a bore of at least ${size(least)} to speak. Make it ${printLength(least, unit)}, or choose another note.`,
    };
  if (answers.boreMm > most)
    return {
      status: 'wrong',
      message: `${what} overblows badly in a bore wider than ${size(most)}. Make it ${printLength(most, unit)}, or choose another note.`,
    };
  return { status: 'fine' };
}

export type Drawing =
  | { status: 'drawn'; document: DesignDocument; furthestCents: number | null }
  | { status: 'refused'; messages: string[] };

/** The instrument that the answers describe, its holes placed so that the plain notes meet the scale. */
export function drawAnswers(answers: Answers): Drawing {
  try {
    const { document, furthestCents } = placeHoles(starterDocument(orderOf(answers)));
    const reading = readDocument(document);
    if (reading.status === 'refused')
      return { status: 'refused', messages: reading.faults.map((fault) => fault.message) };
    return { status: 'drawn', document: reading.document, furthestCents };
  } catch (error) {
    if (error instanceof EngineInputError) return { status: 'refused', messages: [error.message] };
    throw error;
  }
}

function midiOf(text: string): number {
  const note = readNoteName(text);
  if (note === null) throw new RangeError(`${text} is not a note.`);
  return midiNumber(note);
}
