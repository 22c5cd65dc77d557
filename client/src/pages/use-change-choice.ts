import { useMemo, useState } from 'react';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { compareChanges, type Change } from '../features/compare/compare-changes.ts';
import type { Comparison } from '../features/compare/comparison.ts';

export interface ChangeChoice {
  changes: readonly Change[];
  /** Keys of those ticked; null where nothing can be copied from one to the other. */
  picked: ReadonlySet<string> | null;
  pick: (key: string, isPicked: boolean) => void;
}

/** What differs, and what of it is to be copied: everything until something is left out. */
export function useChangeChoice(comparison: Comparison, unit: LengthUnit, isSelf: boolean): ChangeChoice {
  const changes = useMemo(() => compareChanges(comparison, unit), [comparison, unit]);
  const [left, setLeft] = useState<ReadonlySet<string>>(new Set());
  // Two instruments that have no hole in common have nothing to give each other.
  const canCopy = !isSelf && !comparison.match.isByPlace;
  const picked = useMemo(
    () => (canCopy ? new Set(changes.map(({ key }) => key).filter((key) => !left.has(key))) : null),
    [canCopy, changes, left],
  );
  return {
    changes,
    picked,
    pick: (key, isPicked) =>
      setLeft(new Set(isPicked ? [...left].filter((other) => other !== key) : [...left, key])),
  };
}
