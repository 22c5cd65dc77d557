import { useCallback, useState } from 'react';

/** Width of an element, followed as it changes; null until it is on the page. */
export function useElementWidth(): [
  (element: HTMLElement | null) => (() => void) | undefined,
  number | null,
] {
  const [width, setWidth] = useState<number | null>(null);
  const ref = useCallback((element: HTMLElement | null) => {
    if (element === null) return undefined;
    const observer = new ResizeObserver(([entry]) => {
      if (entry !== undefined) setWidth(entry.contentRect.width);
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, width];
}
