import { memo } from 'react';
import { formatCents } from '#shared/music/cents.ts';
import { spokenNote } from '#shared/music/note-name.ts';
import { notesPreference } from '../../lib/preferences.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';
import type { HungNote } from '../../bench/hung-notes.ts';

interface PlumbTableProps {
  notes: readonly HungNote[];
  holes: readonly LabelledHole[];
}

/** The figures of the plumb lines as a table, for those who hear the page; the box clips what a table would not. */
export const PlumbTable = memo(function PlumbTable({ notes, holes }: PlumbTableProps) {
  const under = (column: string) => holes.find(({ hole }) => hole.id === column)?.title ?? 'foot';
  return (
    <div className="sr-only">
      <table>
        <caption>Predicted pitch of every fingering</caption>
        <thead>
          <tr>
            <th scope="col">Note</th>
            <th scope="col">Register</th>
            <th scope="col">Hangs under</th>
            <th scope="col">Cents from the scale</th>
            <th scope="col">Hz</th>
            <th scope="col">Beats per second</th>
          </tr>
        </thead>
        <tbody>
          {notes.map(({ fingering, predicted, column }) => (
            <tr key={fingering.id}>
              <th scope="row">{spokenNote(fingering.note, notesPreference.read())}</th>
              <td>{fingering.register}</td>
              <td>{under(column)}</td>
              <td>{figure(predicted?.centsFromScale, formatCents)}</td>
              <td>{figure(predicted?.frequencyHz, (hz) => hz.toFixed(1))}</td>
              <td>{figure(predicted?.beatsHz, (hz) => hz.toFixed(1))}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
});

function figure(value: number | null | undefined, print: (value: number) => string): string {
  return value === null || value === undefined ? 'no steady note' : print(value);
}
