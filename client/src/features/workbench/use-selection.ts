import { useEffect, useState } from 'react';
import { useSearchParams } from 'react-router';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { Selection } from '../../bench/panel-props.ts';
import { choosing } from './choosing.ts';
import { readSelection, writeSelection } from './selection-address.ts';

/** What is chosen, kept in the address. */
export function useSelection(document: DesignDocument): [Selection, (change: Partial<Selection>) => void] {
  const [search, setSearch] = useSearchParams();
  const [selection, setSelection] = useState<Selection>(() => openingSelection(search, document));
  const written = writeSelection(search, selection, document).toString();
  useEffect(() => {
    if (written !== search.toString()) setSearch(written, { replace: true, preventScrollReset: true });
  }, [written, search, setSearch]);
  return [selection, (change) => setSelection((before) => ({ ...before, ...change }))];
}

/** A link that names a hole alone means the note that hangs under it as well. */
function openingSelection(search: URLSearchParams, document: DesignDocument): Selection {
  const selection = readSelection(search, document);
  if (selection.hole === null || selection.fingering !== null) return selection;
  let opened = selection;
  choosing(document, selection, (change) => {
    opened = { ...selection, ...change };
  })({ hole: selection.hole });
  return opened;
}
