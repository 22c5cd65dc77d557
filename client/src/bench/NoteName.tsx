import { spokenNote } from '#shared/music/note-name.ts';

const PARTS = /^([A-G])(#|b)?(-?\d)$/;

/** A note as it is printed: accidental smaller and raised, octave at full size; spoken as "F sharp 5". */
export function NoteName({ note }: { note: string }) {
  const [, letter = note, accidental = '', octave = ''] = PARTS.exec(note) ?? [];
  if (accidental === '') return <>{note}</>;
  return (
    <>
      <span aria-hidden="true">
        {letter}
        <span className="bench-accidental">{accidental}</span>
        {octave}
      </span>
      <span className="sr-only">{spokenNote(note)}</span>
    </>
  );
}

/** The same inside SVG text. */
export function NoteSpan({ note, className }: { note: string; className?: string }) {
  const [, letter = note, accidental = '', octave = ''] = PARTS.exec(note) ?? [];
  return (
    <tspan className={className}>
      {letter}
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
