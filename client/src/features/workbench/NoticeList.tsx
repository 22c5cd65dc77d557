import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import { NoteName } from '../../bench/NoteName.tsx';

interface Grouped {
  message: string;
  notes: string[];
}

/** What has to be known about the figures, each sentence once with the notes it is about. */
export function NoticeList({ prediction }: { prediction: DesignPrediction | null }) {
  const groups = prediction === null ? [] : grouped(prediction);
  if (groups.length === 0) return null;
  return (
    <section aria-label="What to know about these figures" className="text-data text-ink2 max-w-170 py-3">
      <h3 className="text-label text-ink3">What to know about these figures</h3>
      <ul className="mt-1 flex flex-col gap-1">
        {groups.map(({ message, notes }) => (
          <li key={message}>
            {notes.map((note, index) => (
              <b key={`${note} ${index}`} className="text-ink font-semibold">
                {index > 0 && ', '}
                <NoteName note={note} />
              </b>
            ))}
            {notes.length > 0 && ': '}
            {message}
          </li>
        ))}
      </ul>
    </section>
  );
}

function grouped(prediction: DesignPrediction): Grouped[] {
  const groups = new Map<string, string[]>();
  for (const { message } of prediction.notices) groups.set(message, []);
  for (const { note, notices } of prediction.fingerings) {
    for (const { message } of notices) groups.set(message, [...(groups.get(message) ?? []), note]);
  }
  return [...groups].map(([message, notes]) => ({ message, notes }));
}
