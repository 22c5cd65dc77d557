import type { ReactNode } from 'react';
import { StateTag, type RevisionState } from '../../bench/StateDisc.tsx';
import { Button } from '../../ui/Button.tsx';
import { TopBarFill } from '../../ui/TopBarFill.tsx';

export interface History {
  canUndo: boolean;
  canRedo: boolean;
  undoLabel: string | null;
  redoLabel: string | null;
  undo: () => void;
  redo: () => void;
}

interface DesignHeaderProps {
  name: string;
  revision: number;
  state: RevisionState;
  facts: string;
  /** null while something is only held against the design: there is nothing of it to undo. */
  history: History | null;
  /** Up to two quiet actions, then the primary one. */
  actions: ReactNode;
  /** Where the draft stands, for the narrow bar that has no row of conditions. */
  saveNote: ReactNode;
}

/** The thing in hand: name, state, facts, and what can be done with the whole of it. */
export function DesignHeader({
  name,
  revision,
  state,
  facts,
  history,
  actions,
  saveNote,
}: DesignHeaderProps) {
  return (
    <>
      <TopBarFill>
        <div className="flex min-w-0 flex-1 items-baseline gap-x-3.5 max-[899px]:flex-col">
          <h1 className="text-title max-[899px]:text-section max-w-full truncate font-semibold">{name}</h1>
          <StateTag state={state}>{`rev ${revision}`}</StateTag>
        </div>
        <span className="text-data ml-auto shrink-0 max-[699px]:hidden">{saveNote}</span>
        <span className="flex shrink-0 items-center max-[699px]:ml-auto">
          {history !== null && <HistoryButtons history={history} />}
        </span>
        <span className="flex shrink-0 items-center gap-2 max-[699px]:hidden">{actions}</span>
      </TopBarFill>
      <header className="bg-sheet px-margin max-bar:hidden flex h-14 items-center gap-5">
        <div className="flex min-w-0 items-baseline gap-3.5">
          <h1 className="text-title truncate font-semibold">{name}</h1>
          <StateTag state={state}>{`rev ${revision}`}</StateTag>
        </div>
        <p className="text-data text-ink3 min-w-0 truncate">{facts}</p>
        <div className="ml-auto flex shrink-0 items-center gap-2">
          {history !== null && <HistoryButtons history={history} />}
          {actions}
        </div>
      </header>
    </>
  );
}

function HistoryButtons({ history }: { history: History }) {
  const { canUndo, canRedo, undoLabel, redoLabel, undo, redo } = history;
  const named = (verb: string, label: string | null) =>
    label === null ? verb : `${verb}: ${label.charAt(0).toLowerCase()}${label.slice(1)}`;
  return (
    <>
      <Button
        look="quiet"
        className="px-2.5"
        disabled={!canUndo}
        onClick={undo}
        title={named('Undo', undoLabel)}
        aria-keyshortcuts="Control+Z"
      >
        Undo
      </Button>
      <Button
        look="quiet"
        className="px-2.5 max-[699px]:hidden"
        disabled={!canRedo}
        onClick={redo}
        title={named('Redo', redoLabel)}
        aria-keyshortcuts="Control+Shift+Z"
      >
        Redo
      </Button>
    </>
  );
}
