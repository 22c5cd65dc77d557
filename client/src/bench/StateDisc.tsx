export type RevisionState = 'draft' | 'in-review' | 'approved' | 'superseded' | 'withdrawn';

const WORDS: Record<RevisionState, string> = {
  draft: 'draft',
  'in-review': 'in review',
  approved: 'approved',
  superseded: 'superseded',
  withdrawn: 'withdrawn',
};

const COLOURS: Record<RevisionState, string> = {
  draft: 'text-ink2',
  'in-review': 'text-wait-ink',
  approved: 'text-true-ink',
  superseded: 'text-ink2',
  withdrawn: 'text-stop',
};

interface StateTagProps {
  state: RevisionState;
  /** Stands before the word: "rev 7". */
  children?: string;
}

/** State of a revision: a disc that reads like a finger hole, then the word. */
export function StateTag({ state, children }: StateTagProps) {
  return (
    <span
      className={`text-data inline-flex items-center gap-1.5 font-semibold whitespace-nowrap ${COLOURS[state]}`}
    >
      <StateDisc state={state} />
      {children === undefined ? WORDS[state] : `${children}, ${WORDS[state]}`}
    </span>
  );
}

function StateDisc({ state }: { state: RevisionState }) {
  return (
    <svg width="15" height="15" viewBox="0 0 15 15" aria-hidden="true" className="shrink-0">
      {state === 'withdrawn' ? (
        <rect x="1" y="1" width="13" height="13" fill="currentColor" />
      ) : (
        <circle cx="7.5" cy="7.5" r="6" fill="none" stroke="currentColor" strokeWidth="1.6" />
      )}
      {state === 'in-review' && <path d="M7.5 1.5a6 6 0 0 0 0 12z" fill="currentColor" />}
      {state === 'approved' && <circle cx="7.5" cy="7.5" r="6" fill="currentColor" />}
      {state === 'approved' && (
        <path d="M4.6 7.7l2.1 2.1 3.8-4.3" fill="none" stroke="var(--sheet)" strokeWidth="1.7" />
      )}
      {state === 'superseded' && <path d="M3.3 11.7l8.4-8.4" stroke="currentColor" strokeWidth="1.6" />}
      {state === 'withdrawn' && (
        <path d="M4.5 4.5l6 6m0-6l-6 6" fill="none" stroke="var(--sheet)" strokeWidth="1.8" />
      )}
    </svg>
  );
}
