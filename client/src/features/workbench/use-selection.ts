import { useEffect, useState } from 'react';
import { useSearchParams } from 'react-router';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { Selection } from '../../bench/panel-props.ts';
import { readSelection, writeSelection } from './selection-address.ts';

/** What is chosen, kept in the address; the first note hangs chosen so that fingering and ladder are never empty. */
export function useSelection(document: DesignDocument): [Selection, (change: Partial<Selection>) => void] {
  const [search, setSearch] = useSearchParams();
  const [selection, setSelection] = useState<Selection>(() => readSelection(search, document));
  const written = writeSelection(search, selection, document).toString();
  useEffect(() => {
    if (written !== search.toString()) setSearch(written, { replace: true, preventScrollReset: true });
  }, [written, search, setSearch]);
  return [selection, (change) => setSelection((before) => ({ ...before, ...change }))];
}
