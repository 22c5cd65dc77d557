import type { DesignDocument } from '../document/design-document.ts';
import { midiNumber, readNoteName } from '../music/note-name.ts';

/** The octave that stands for the tonic where no chart says how low an instrument goes. */
const USUAL_OCTAVE = 4;

/** The note an instrument is known by: the lowest of its chart, else its tonic. */
export function referenceNote({ fingerings, pitch }: Pick<DesignDocument, 'fingerings' | 'pitch'>): string {
  const midi = (text: string) => {
    const note = readNoteName(text);
    return note === null ? Infinity : midiNumber(note);
  };
  return fingerings
    .map(({ note }) => note)
    .reduce(
      (lowest, note) => (midi(note) < midi(lowest) ? note : lowest),
      fingerings[0]?.note ?? `${pitch.tonic}${USUAL_OCTAVE}`,
    );
}
