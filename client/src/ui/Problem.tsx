import type { ReactNode } from 'react';
import { problemSentence } from '../lib/api-problem.ts';

/** What went wrong with a button or form, said beside it, once. */
export function Problem({ error, children }: { error: unknown; children?: ReactNode }) {
  if (error === null || error === undefined) return null;
  return (
    <div role="alert" className="rounded-control border-stop bg-stop-soft text-ink border-l-3 px-3 py-2">
      {problemSentence(error)}
      {children !== undefined && <> {children}</>}
    </div>
  );
}

/** Why something here cannot be done by this person, and the next move; quiet, in place of the button's effect. */
export function Refusal({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p id={id} className="text-data text-ink2">
      {children}
    </p>
  );
}
