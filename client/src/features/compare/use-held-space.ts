import { useEffect, useState } from 'react';
import { isSingleKey } from '../../ui/single-key.ts';

/** True while Space is held down with nothing in focus that would take it: the older of the two is looked at alone. */
export function useHeldSpace(): boolean {
  const [isHeld, setHeld] = useState(false);
  useEffect(() => {
    const watch = new AbortController();
    const { signal } = watch;
    window.addEventListener(
      'keydown',
      (event) => {
        if (!isSingleKey(event, ' ') || isOnControl(event.target)) return;
        event.preventDefault();
        setHeld(true);
      },
      { signal },
    );
    const release = () => setHeld(false);
    window.addEventListener('keyup', (event) => event.key === ' ' && release(), { signal });
    window.addEventListener('blur', release, { signal });
    return () => watch.abort();
  }, []);
  return isHeld;
}

/** A button, a link or a box in focus keeps its own use of the bar. */
function isOnControl(target: EventTarget | null): boolean {
  return target instanceof Element && target.closest('button, a, input, [role="button"]') !== null;
}
