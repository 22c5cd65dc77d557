import { titleInSentence } from '#shared/document/title-in-sentence.ts';
import { useMemo, useState } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import { leadingNote } from '../../bench/hole-sensitivity.ts';
import { hungNotes } from '../../bench/hung-notes.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import type { Suggestion } from './find-suggestion.ts';
import { useSuggestions } from './use-suggestions.ts';

export interface SuggestionDesk {
  /** Best first; null while they are looked for. */
  suggestions: readonly Suggestion[] | null;
  /** The document as it was before the last one tried; null when there is nothing to put back. */
  canPutBack: boolean;
  tryOut: (suggestion: Suggestion) => void;
  putBack: () => void;
}

interface Tried {
  before: DesignDocument;
  after: DesignDocument | null;
}

/** Looks for suggestions, tries them as ordinary edits, and puts the last one back as long as nothing else changed. */
export function useSuggestionDesk(props: PanelProps, isDragging: boolean): SuggestionDesk {
  const { document, prediction, selection, unit, bandCents, readOnly, onEdit } = props;
  const [tried, setTried] = useState<Tried | null>(null);
  const fingering = useMemo(() => {
    const notes = hungNotes(document, prediction);
    return selection.hole === null
      ? null
      : (leadingNote(notes, selection.hole, selection)?.fingering.id ?? null);
  }, [document, prediction, selection]);
  const suggestions = useSuggestions({
    document,
    prediction,
    hole: selection.hole,
    fingering,
    unit,
    bandCents,
    isResting: isDragging || readOnly !== null,
  });
  const titleOf = (id: string) => labelledHoles(document).find(({ hole }) => hole.id === id)?.title ?? 'hole';
  return {
    suggestions,
    canPutBack:
      tried !== null && (tried.after === null || tried.after === document) && tried.before !== document,
    tryOut: (suggestion) => {
      const after = suggestion.change(document);
      onEdit({ label: `Try ${titleInSentence(titleOf(suggestion.hole))}`, change: () => after });
      setTried({ before: document, after });
    },
    putBack: () => {
      if (tried === null) return;
      onEdit({ label: 'Put it back', change: () => tried.before });
      setTried(null);
    },
  };
}
