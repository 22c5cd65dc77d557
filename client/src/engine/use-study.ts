import { useEffect, useState } from 'react';
import type { Studies, StudyKind } from './engine-answers.ts';
import { startEngine, type RunningEngine } from './start-engine.ts';

/** Quiet time before a study is asked for, ms: while something is dragged only the prediction keeps up. */
const ASK_AFTER_MS = 120;

let engine: RunningEngine | null = null;

/** Studies share one worker apart from the predictions, so that they never hold up a drag; it stays for the visit. */
function studyEngine(): RunningEngine['remote'] {
  engine ??= startEngine('studies');
  return engine.remote;
}

export interface StudyView<Kind extends StudyKind> {
  answer: Studies[Kind]['answer'] | null;
  /** False while the answer belongs to an older question: it has to look that way. */
  isCurrent: boolean;
}

interface Answered<Kind extends StudyKind> {
  ask: Studies[Kind]['ask'];
  answer: Studies[Kind]['answer'] | null;
}

/**
 * Asks the engine something that a panel shows beside the prediction.
 *
 * @param ask - the question, the same object while it is the same question; null asks nothing
 */
export function useStudy<Kind extends StudyKind>(
  kind: Kind,
  ask: Studies[Kind]['ask'] | null,
): StudyView<Kind> {
  const [answered, setAnswered] = useState<Answered<Kind> | null>(null);
  useEffect(() => {
    if (ask === null) return;
    let isWanted = true;
    const timer = setTimeout(() => {
      // Comlink's types lose the bond between kind and question; both ends are typed by `Studies`.
      const study = studyEngine().study as unknown as (
        kind: Kind,
        ask: Studies[Kind]['ask'],
      ) => Promise<Studies[Kind]['answer'] | null>;
      study(kind, ask).then(
        (answer) => {
          if (isWanted) setAnswered({ ask, answer });
        },
        (error: unknown) => reportError(error),
      );
    }, ASK_AFTER_MS);
    return () => {
      isWanted = false;
      clearTimeout(timer);
    };
  }, [kind, ask]);
  return { answer: ask === null ? null : (answered?.answer ?? null), isCurrent: answered?.ask === ask };
}
