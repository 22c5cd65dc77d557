import { useCallback, useLayoutEffect, useRef } from 'react';

/**
 * A handler that stays one object and always calls the newest function.
 *
 * For handlers of parts that are drawn again only when their figures change; never call it while rendering.
 */
export function useStable<Args extends unknown[], Result>(
  handler: (...args: Args) => Result,
): (...args: Args) => Result {
  const latest = useRef(handler);
  useLayoutEffect(() => {
    latest.current = handler;
  });
  return useCallback((...args: Args) => latest.current(...args), []);
}
