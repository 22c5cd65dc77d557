import { spokenNote } from '#shared/music/note-name.ts';
import { notesPreference } from '../lib/preferences.ts';
import type { HungNote } from './hung-notes.ts';

/** "6.1 cents flat", "in tune", "not worked out". */
export function spokenCents(cents: number | null): string {
  if (cents === null) return 'no steady note';
  const size = Math.abs(cents).toFixed(1);
  if (Number(size) === 0) return 'in tune';
  return `${size} cents ${cents < 0 ? 'flat' : 'sharp'}`;
}

/** "G 5 6.1 cents flat"; without a prediction the note alone. */
export function spokenHungNote({ fingering, predicted }: HungNote): string {
  const note = spokenNote(fingering.note, notesPreference.read());
  return predicted === null ? note : `${note} ${spokenCents(predicted.centsFromScale)}`;
}
