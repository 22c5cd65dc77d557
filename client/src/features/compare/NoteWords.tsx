import { NoteName } from '../../bench/NoteName.tsx';

/** Words that begin with a note: `C#6 +3.9`. The note is printed as notes are. */
export function NoteWords({ text }: { text: string }) {
  const [note = '', ...rest] = text.split(' ');
  return (
    <>
      <NoteName note={note} /> {rest.join(' ')}
    </>
  );
}
