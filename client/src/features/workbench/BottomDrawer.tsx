import { useState, type ReactNode } from 'react';

type Height = 'peek' | 'half' | 'full';

const LOOK: Record<Height, string> = {
  peek: 'h-36',
  half: 'h-[41dvh]',
  full: 'h-[calc(100dvh-180px)]',
};

const NEXT: Record<Height, { height: Height; verb: string }> = {
  peek: { height: 'half', verb: 'Open the drawer half' },
  half: { height: 'full', verb: 'Open the whole drawer' },
  full: { height: 'peek', verb: 'Close the drawer' },
};

interface BottomDrawerProps {
  label: string;
  /** With nothing to edit in it the drawer only peeps out, until a hand sets it. */
  isIdle: boolean;
  children: ReactNode;
}

/** The left zone on a standing tablet or a phone: a drawer at the bottom edge with three heights. */
export function BottomDrawer({ label, isIdle, children }: BottomDrawerProps) {
  const [chosen, setHeight] = useState<Height | null>(null);
  const height = chosen ?? (isIdle ? 'peek' : 'half');
  const next = NEXT[height];
  return (
    <>
      <div aria-hidden="true" className={LOOK[height]} />
      <aside
        aria-label={label}
        className={`bg-sheet shadow-pop border-hair fixed inset-x-0 bottom-15 z-25 flex flex-col rounded-t-[10px] border-t transition-[height] duration-180 ease-out ${LOOK[height]}`}
      >
        <button
          type="button"
          aria-label={next.verb}
          onClick={() => setHeight(next.height)}
          className="flex h-6 w-full shrink-0 items-center justify-center"
        >
          <span className="bg-line h-1 w-11 rounded-full" />
        </button>
        <div className="min-h-0 flex-1 overflow-y-auto px-4 pb-4">{children}</div>
      </aside>
    </>
  );
}
