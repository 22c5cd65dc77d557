import type { DesignDocument } from '#shared/document/design-document.ts';
import { leadingNote } from '../../bench/hole-sensitivity.ts';
import { hungNotes } from '../../bench/hung-notes.ts';
import type { Selection } from '../../bench/panel-props.ts';

type Select = (change: Partial<Selection>) => void;

/** Choosing a hole also chooses the note that hangs under it, so that fingering and ladder speak of the same thing. */
export function choosing(document: DesignDocument, selection: Selection, select: Select): Select {
  return (change) => {
    if (change.hole === undefined || change.hole === null || change.fingering !== undefined) {
      select(change);
      return;
    }
    const note = leadingNote(hungNotes(document, null), change.hole, selection);
    select(note === undefined ? change : { ...change, fingering: note.fingering.id });
  };
}
