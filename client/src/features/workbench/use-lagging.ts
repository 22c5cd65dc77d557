import { useEffect, useState } from 'react';

/** Longer than a few frames: so long the eye takes figures for those of the drawing beside them, ms. */
const NOTICED_AFTER_MS = 80;

/** True once something has been behind for longer than a drag's frames, and at once false when it has caught up. */
export function useLagging(isBehind: boolean): boolean {
  const [isNoticed, setNoticed] = useState(false);
  if (!isBehind && isNoticed) setNoticed(false);
  useEffect(() => {
    if (!isBehind) return;
    const timer = setTimeout(() => setNoticed(true), NOTICED_AFTER_MS);
    return () => clearTimeout(timer);
  }, [isBehind]);
  return isBehind && isNoticed;
}
