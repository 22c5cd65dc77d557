import { useEffect, useRef, useState } from 'react';

/** Live changes are spoken at most this often, ms. */
const SPEAK_EVERY_MS = 2000;

/** The sentence of the newest change, held back so that a drag is not a stream of speech. */
export function useSpokenChange(sentence: string): string {
  const [spoken, setSpoken] = useState('');
  const first = useRef(sentence);
  const lastAt = useRef(-SPEAK_EVERY_MS);
  useEffect(() => {
    if (sentence === first.current) return undefined;
    first.current = '';
    const wait = Math.max(150, lastAt.current + SPEAK_EVERY_MS - performance.now());
    const timer = setTimeout(() => {
      lastAt.current = performance.now();
      setSpoken(sentence);
    }, wait);
    return () => clearTimeout(timer);
  }, [sentence]);
  return spoken;
}
