import type { DesignDocument } from '#shared/document/design-document.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import type { Selection } from '../../bench/panel-props.ts';

/** Words for the ends of the instrument; everything else is the label over a hole. */
const ENDS = ['foot', 'mouth'];

/** What the address says is chosen: `?hole=4&note=G5&register=2`. Unknown holes and notes are passed over. */
export function readSelection(search: URLSearchParams, document: DesignDocument): Selection {
  const hole = search.get('hole');
  const note = search.get('note');
  const register = Number(search.get('register'));
  const labelled = labelledHoles(document).find(({ label }) => label === hole);
  return {
    hole: hole !== null && ENDS.includes(hole) ? hole : (labelled?.hole.id ?? null),
    fingering: noteKeys(document).find(({ key }) => key === note)?.id ?? null,
    register: Number.isInteger(register) && register >= 1 && register <= 8 ? register : 'all',
  };
}

/** The same search with the choice in it; whatever else stood there stays. */
export function writeSelection(
  search: URLSearchParams,
  selection: Selection,
  document: DesignDocument,
): URLSearchParams {
  const next = new URLSearchParams(search);
  const hole = labelledHoles(document).find((labelled) => labelled.hole.id === selection.hole)?.label;
  const isEnd = selection.hole !== null && ENDS.includes(selection.hole);
  put(next, 'hole', isEnd ? selection.hole : (hole ?? null));
  put(next, 'note', noteKeys(document).find(({ id }) => id === selection.fingering)?.key ?? null);
  put(next, 'register', selection.register === 'all' ? null : String(selection.register));
  return next;
}

function put(search: URLSearchParams, key: string, value: string | null): void {
  if (value === null) search.delete(key);
  else search.set(key, value);
}

/** Notes by name; where two fingerings have one name the later ones are counted: `D6`, `D6.2`. */
function noteKeys(document: DesignDocument): { id: string; key: string }[] {
  const counts = new Map<string, number>();
  return document.fingerings.map(({ id, note }) => {
    const count = (counts.get(note) ?? 0) + 1;
    counts.set(note, count);
    return { id, key: count === 1 ? note : `${note}.${count}` };
  });
}
