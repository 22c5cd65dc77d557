import { createContext, useContext, useLayoutEffect, useMemo, useState, type ReactNode } from 'react';
import { createPortal } from 'react-dom';

interface TopBarRoom {
  element: HTMLElement | null;
  setElement: (element: HTMLElement | null) => void;
  isFilled: boolean;
  setFilled: (isFilled: boolean) => void;
}

const Room = createContext<TopBarRoom | null>(null);

/** Stands round the top bar and the page, so that the page can put something into the bar. */
export function TopBarProvider({ children }: { children: ReactNode }) {
  const [element, setElement] = useState<HTMLElement | null>(null);
  const [isFilled, setFilled] = useState(false);
  const room = useMemo(() => ({ element, setElement, isFilled, setFilled }), [element, isFilled]);
  return <Room value={room}>{children}</Room>;
}

export function useTopBarRoom(): TopBarRoom {
  const room = useContext(Room);
  if (room === null) throw new Error('The top bar stands outside its TopBarProvider.');
  return room;
}

/**
 * Puts its children into the top bar at 1024 px and below, beside the menu button, in place of the title and the person:
 * there one bar must do for both the product and the thing in hand. On wider screens it shows nothing.
 */
export function TopBarFill({ children }: { children: ReactNode }) {
  const { element, setFilled } = useTopBarRoom();
  useLayoutEffect(() => {
    setFilled(true);
    return () => setFilled(false);
  }, [setFilled]);
  return element === null ? null : createPortal(children, element);
}
