import type { SaveState } from './auto-saver.ts';
import { timeWords } from './time-words.ts';

/** Where the draft stands, in a word and a time, for the row of conditions. Spoken when it changes for the worse. */
export function SaveNote({ save }: { save: SaveState }) {
  const { words, figure, look } = noteOf(save);
  return (
    <span role={save.status === 'saved' || save.status === 'saving' ? undefined : 'status'} className={look}>
      {words} {figure !== '' && <b className="text-ink font-semibold">{figure}</b>}
    </span>
  );
}

interface Note {
  words: string;
  figure: string;
  look: string;
}

const QUIET = 'text-ink3';
const LOUD = 'rounded-chip bg-wait text-wait-ink px-2';

function noteOf(save: SaveState): Note {
  switch (save.status) {
    case 'saved':
      return { words: 'Saved', figure: timeWords(save.at), look: QUIET };
    case 'saving':
      return { words: 'Saving…', figure: '', look: QUIET };
    case 'waiting':
      return { words: 'Not saved since', figure: timeWords(save.since), look: LOUD };
    case 'refused':
      return { words: 'Not accepted', figure: '', look: LOUD };
    case 'conflict':
      return { words: 'Two drafts', figure: '', look: LOUD };
  }
}
