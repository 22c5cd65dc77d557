import type { TransformOutcome } from '#shared/transform/transform-design.ts';

interface TransformWordsProps {
  /** null while it is worked out. */
  outcome: TransformOutcome | null;
  isAsked: boolean;
}

/** What was done, what was kept and what has to be looked at; or why it cannot be done. */
export function TransformWords({ outcome, isAsked }: TransformWordsProps) {
  if (!isAsked) return <p className="text-ink2 mt-3">Choose another lowest note or another A.</p>;
  return (
    <div role="status" className="mt-3 grid gap-2">
      {outcome === null && <p className="text-ink2">Working it out…</p>}
      {outcome?.status === 'transformed' && (
        <>
          {outcome.done.map((sentence) => (
            <p key={sentence}>{sentence}</p>
          ))}
          {outcome.cautions.length > 0 && (
            <ul className="bg-wait text-ink rounded-chip grid gap-1 px-3 py-2">
              {outcome.cautions.map((sentence) => (
                <li key={sentence}>{sentence}</li>
              ))}
            </ul>
          )}
        </>
      )}
      {outcome?.status === 'refused' && (
        <div className="rounded-control border-stop bg-stop-soft text-ink border-l-3 px-3 py-2">
          <p className="font-semibold">
            This instrument cannot be taken there as it is. Nothing was changed.
          </p>
          <ul className="mt-1 grid gap-1">
            {outcome.faults.map(({ path, message }) => (
              <li key={`${path.join('.')} ${message}`}>{message}</li>
            ))}
          </ul>
        </div>
      )}
    </div>
  );
}
