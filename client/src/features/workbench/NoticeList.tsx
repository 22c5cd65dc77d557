import { memo } from 'react';
import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import { useRestingValue } from '../../bench/use-resting-value.ts';

interface NoticeListProps {
  prediction: DesignPrediction | null;
  isDragging: boolean;
}

interface Grouped {
  message: string;
  notes: string[];
}

/**
 * What has to be known about the figures, each sentence once with the notes it is about.
 *
 * It rests while a hole is dragged: the marks beside the bobs follow, the sentences come when the hand is still.
 */
export function NoticeList({ isDragging, ...props }: NoticeListProps) {
  const prediction = useRestingValue(props.prediction, isDragging);
  return <Sentences prediction={prediction} />;
}

const Sentences = memo(function Sentences({ prediction }: Pick<NoticeListProps, 'prediction'>) {
  const groups = prediction === null ? [] : grouped(prediction);
  if (groups.length === 0) return null;
  return (
    <section
      aria-label="What to know about these figures"
      className="is-predicted text-data text-ink2 max-w-170 py-3"
    >
      <h2 className="text-label text-ink3">What to know about these figures</h2>
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
});

function grouped(prediction: DesignPrediction): Grouped[] {
  const groups = new Map<string, string[]>();
  for (const { message } of prediction.notices) groups.set(message, []);
  for (const { note, notices } of prediction.fingerings) {
    for (const { message } of notices) groups.set(message, [...(groups.get(message) ?? []), note]);
  }
  return [...groups].map(([message, notes]) => ({ message, notes }));
}
