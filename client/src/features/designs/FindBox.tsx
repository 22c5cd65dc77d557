import { useEffect, useRef, useState } from 'react';
import { singleKeysPreference } from '../../lib/preferences.ts';
import { isSingleKey } from '../../ui/single-key.ts';

interface FindBoxProps {
  /** What the address looks for. */
  search: string;
  /** Stays the same from one render to the next. */
  onSearch: (search: string) => void;
}

/** While somebody types, each pause is a search; the address follows and Back undoes it. */
const PAUSE_MS = 250;

export function FindBox({ search, onSearch }: FindBoxProps) {
  const [typed, setTyped] = useState(search);
  const [sent, setSent] = useState(search);
  const [seen, setSeen] = useState(search);
  const input = useRef<HTMLInputElement>(null);
  if (search !== seen) {
    setSeen(search);
    // Not our own doing: Back, a link, another filter. Our own must not undo what was typed since.
    if (search !== sent) {
      setSent(search);
      setTyped(search);
    }
  }

  useEffect(() => {
    const wanted = typed.trim();
    if (wanted === sent) return undefined;
    const pause = setTimeout(() => {
      setSent(wanted);
      onSearch(wanted);
    }, PAUSE_MS);
    return () => clearTimeout(pause);
  }, [typed, sent, onSearch]);

  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (!isSingleKey(event, '/')) return;
      event.preventDefault();
      input.current?.focus();
      input.current?.select();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, []);

  return (
    <label className="tablet:w-60 desk:w-75 relative block w-full">
      <span className="sr-only">Find a design</span>
      <input
        ref={input}
        type="search"
        value={typed}
        maxLength={120}
        placeholder="Find a design"
        onChange={(event) => setTyped(event.currentTarget.value)}
        onKeyDown={(event) => {
          if (event.key === 'Escape') setTyped('');
        }}
        className="rounded-control border-line bg-sheet text-body placeholder:text-ink3 target w-full border pr-10 pl-3 max-[1100px]:text-[16px]"
      />
      {singleKeysPreference.use() === 'on' && typed === '' && (
        <kbd
          aria-hidden="true"
          className="rounded-chip border-hair text-small text-ink3 pointer-events-none absolute top-1/2 right-3 -translate-y-1/2 border px-1.5 font-sans max-[1100px]:hidden pointer-coarse:hidden"
        >
          /
        </kbd>
      )}
    </label>
  );
}
