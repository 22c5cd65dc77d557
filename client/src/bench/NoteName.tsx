import { letterName, readNoteName, spokenNote, type NoteWriting } from '#shared/music/note-name.ts';
import { notesPreference } from '../lib/preferences.ts';

/** A note as it is printed: accidental smaller and raised, octave at full size; spoken as "F sharp 5". */
export function NoteName({ note }: { note: string }) {
  const writing = notesPreference.use();
  const { name, accidental, octave } = partsOf(note, writing);
  if (accidental === '') return <>{name + octave}</>;
  return (
    <>
      <span aria-hidden="true">
        {name}
        <span className="bench-accidental">{accidental}</span>
        {octave}
      </span>
      <span className="sr-only">{spokenNote(note, writing)}</span>
    </>
  );
}

/** The same inside SVG text. */
export function NoteSpan({ note, className }: { note: string; className?: string }) {
  const { name, accidental, octave } = partsOf(note, notesPreference.use());
  return (
    <tspan className={className}>
      {name}
      {accidental !== '' && (
        <tspan fontSize="80%" dy="-0.16em">
          {accidental}
        </tspan>
      )}
      {accidental !== '' && <tspan dy="0.16em">{octave}</tspan>}
      {accidental === '' && octave}
    </tspan>
  );
}

function partsOf(text: string, writing: NoteWriting) {
  const note = readNoteName(text);
  if (note === null) return { name: text, accidental: '', octave: '' };
  return { name: letterName(note, writing), accidental: note.accidental, octave: String(note.octave) };
}
