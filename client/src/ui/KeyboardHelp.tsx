import { lazy, Suspense, useEffect, useState } from 'react';
import { isSingleKey } from './single-key.ts';

/** Fetched when it is first asked for. */
const KeyList = lazy(async () => ({ default: (await import('./KeyList.tsx')).KeyList }));

const OPEN = 'borewright:keyboard-help';

/** Opens the list of keys from anywhere; the frame shows it. */
export function openKeyboardHelp(): void {
  window.dispatchEvent(new Event(OPEN));
}

/** The list of keys: `?` on any page, and Help in the person's menu. */
export function KeyboardHelp() {
  const [isOpen, setOpen] = useState(false);
  useEffect(() => {
    const open = () => setOpen(true);
    const onKey = (event: KeyboardEvent) => {
      if (isSingleKey(event, '?')) open();
    };
    window.addEventListener(OPEN, open);
    window.addEventListener('keydown', onKey);
    return () => {
      window.removeEventListener(OPEN, open);
      window.removeEventListener('keydown', onKey);
    };
  }, []);
  if (!isOpen) return null;
  return (
    <Suspense fallback={null}>
      <KeyList open onOpenChange={setOpen} />
    </Suspense>
  );
}
