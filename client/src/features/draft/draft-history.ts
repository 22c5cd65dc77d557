import type { DesignDocument } from '#shared/document/design-document.ts';
import type { DesignEdit } from '../../bench/panel-props.ts';

/** How far back Undo goes. */
export const UNDO_STEPS = 200;

/** One step of Undo or Redo: the document it leads to, and what was done, in words for the button. */
export interface HistoryStep {
  document: DesignDocument;
  label: string;
}

export interface DraftHistory {
  present: DesignDocument;
  /** Oldest first; the last is where Undo goes. */
  past: readonly HistoryStep[];
  /** The last is where Redo goes. */
  future: readonly HistoryStep[];
  /** Edits with this key still belong to the newest step: one drag is one step. */
  openMergeKey: string | null;
}

export function startHistory(document: DesignDocument): DraftHistory {
  return { present: document, past: [], future: [], openMergeKey: null };
}

/** Takes an edit in as a step of its own, or as part of the step with the same merge key. */
export function withEdit(history: DraftHistory, edit: DesignEdit): DraftHistory {
  const document = edit.change(history.present);
  if (document === history.present) return history;
  const mergeKey = edit.mergeKey ?? null;
  const merges = mergeKey !== null && mergeKey === history.openMergeKey && history.past.length > 0;
  return {
    present: document,
    past: merges
      ? history.past
      : [...history.past, { document: history.present, label: edit.label }].slice(-UNDO_STEPS),
    future: [],
    openMergeKey: mergeKey,
  };
}

export function undone(history: DraftHistory): DraftHistory {
  const step = history.past.at(-1);
  if (step === undefined) return history;
  return {
    present: step.document,
    past: history.past.slice(0, -1),
    future: [...history.future, { document: history.present, label: step.label }],
    openMergeKey: null,
  };
}

export function redone(history: DraftHistory): DraftHistory {
  const step = history.future.at(-1);
  if (step === undefined) return history;
  return {
    present: step.document,
    past: [...history.past, { document: history.present, label: step.label }].slice(-UNDO_STEPS),
    future: history.future.slice(0, -1),
    openMergeKey: null,
  };
}

/** Ends a run of edits that merge: the next one is a step of its own, whatever its key. */
export function sealed(history: DraftHistory): DraftHistory {
  return history.openMergeKey === null ? history : { ...history, openMergeKey: null };
}
