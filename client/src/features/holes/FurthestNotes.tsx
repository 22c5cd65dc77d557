import { formatCents } from '#shared/music/cents.ts';
import { titleInSentence } from '#shared/document/title-in-sentence.ts';
import { bandOf } from '../../bench/band-of.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';
import type { HungNote } from '../../bench/hung-notes.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';

interface FurthestNotesProps extends Pick<PanelProps, 'bandCents' | 'onSelect'> {
  notes: readonly HungNote[];
  holes: readonly LabelledHole[];
}

/** Notes listed; the chart shows the rest. */
const MOST_NOTES = 5;

/** Where work waits: the notes outside the band, worst first, each leading to the hole that it hangs under. */
export function FurthestNotes({ notes, holes, bandCents, onSelect }: FurthestNotesProps) {
  if (notes.every(({ predicted }) => predicted === null)) return null;
  const outside = outsideBand(notes, bandCents);
  if (outside.length === 0)
    return <p className="is-predicted text-data text-ink2 mt-4">Every note hangs within its band.</p>;
  return (
    <section aria-label="Furthest from true" className="is-predicted mt-4 max-w-70">
      <h3 className="text-label text-ink3">Furthest from true</h3>
      <ul className="mt-1">
        {outside.slice(0, MOST_NOTES).map(({ note, cents }) => (
          <li key={note.fingering.id} className="border-hair border-t last:border-b">
            <button
              type="button"
              className="text-data hover:bg-groove flex min-h-9 w-full items-center gap-3 px-1 text-left pointer-coarse:min-h-11"
              onClick={() => onSelect({ hole: note.column, fingering: note.fingering.id })}
            >
              <b className="w-11 font-semibold">
                <NoteName note={note.fingering.note} />
              </b>
              <span className="text-ink2 flex-1">{placeWords(note.column, holes)}</span>
              <b className="font-bold">{formatCents(cents)}</b>
            </button>
          </li>
        ))}
      </ul>
      {outside.length > MOST_NOTES && (
        <p className="text-label text-ink3 mt-1">and {outside.length - MOST_NOTES} more outside the band</p>
      )}
    </section>
  );
}

function outsideBand(notes: readonly HungNote[], bandCents: readonly number[]) {
  return notes
    .flatMap((note) => {
      const cents = note.predicted?.centsFromScale ?? null;
      return cents === null ? [] : [{ note, cents }];
    })
    .filter(({ note, cents }) => Math.abs(cents) > bandOf(bandCents, note.fingering.register))
    .sort((a, b) => Math.abs(b.cents) - Math.abs(a.cents));
}

function placeWords(column: string, holes: readonly LabelledHole[]): string {
  const labelled = holes.find(({ hole }) => hole.id === column);
  return labelled === undefined ? 'at the foot' : `under ${titleInSentence(labelled.title)}`;
}
