import { useMemo } from 'react';
import type { History } from './DesignHeader.tsx';

/** What can be undone and redone, as one object that changes only when that does. */
export function useHistory(draft: History): History {
  const { canUndo, canRedo, undoLabel, redoLabel, undo, redo } = draft;
  return useMemo(
    () => ({ canUndo, canRedo, undoLabel, redoLabel, undo, redo }),
    [canUndo, canRedo, undoLabel, redoLabel, undo, redo],
  );
}
