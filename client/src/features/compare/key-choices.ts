import type { DesignDocument } from '#shared/document/design-document.ts';
import { midiNumber, noteOfMidi, printNoteName, readNoteName } from '#shared/music/note-name.ts';
import { referenceNote } from '#shared/transform/reference-note.ts';

export interface KeyChoice {
  note: string;
  /** `F5, 3 semitones up`. */
  label: string;
}

/** As far up and down as an instrument of one kind is usually made. */
const REACH = 12;

/** Lowest notes an instrument can be taken to, from the highest down; black keys by both their names. */
export function keyChoices(document: DesignDocument): KeyChoice[] {
  const from = readNoteName(referenceNote(document));
  if (from === null) return [];
  const present = printNoteName(from);
  return Array.from({ length: 2 * REACH + 1 }, (_, index) => REACH - index).flatMap((semitones) => {
    if (semitones === 0) return [{ note: present, label: `${present}, as it is` }];
    const midi = midiNumber(from) + semitones;
    const names = new Set([noteOfMidi(midi, true), noteOfMidi(midi, false)].map(printNoteName));
    return [...names].map((note) => ({ note, label: `${note}, ${intervalWords(semitones)}` }));
  });
}

function intervalWords(semitones: number): string {
  const size = Math.abs(semitones);
  const words = size === 12 ? 'an octave' : size === 1 ? '1 semitone' : `${size} semitones`;
  return `${words} ${semitones > 0 ? 'up' : 'down'}`;
}
