import type { DesignDocument } from '#shared/document/design-document.ts';
import {
  documentDifference,
  takeDifference,
  type DocumentDifference,
} from '#shared/document/document-difference.ts';

export type Side = 'mine' | 'theirs';

/** One value in which my draft and the newer one differ. */
export interface ConflictRow extends DocumentDifference {
  key: string;
  /** What stood there when both began. */
  ancestor: unknown;
  changedBy: 'me' | 'them' | 'both';
}

export function conflictRows(
  mine: DesignDocument,
  theirs: DesignDocument,
  ancestor: DesignDocument,
): ConflictRow[] {
  const byMe = keysOf(documentDifference(ancestor, mine));
  const byThem = keysOf(documentDifference(ancestor, theirs));
  return documentDifference(mine, theirs).map((difference) => {
    const touched = (keys: readonly string[]) => keys.some((key) => overlaps(key, keyOf(difference)));
    const who = touched(byMe) ? (touched(byThem) ? 'both' : 'me') : 'them';
    return {
      ...difference,
      key: keyOf(difference),
      ancestor: valueAt(ancestor, difference.path),
      changedBy: who,
    };
  });
}

/** What is chosen before anybody chooses: the side that changed; nothing where both did. */
export function firstChoices(rows: readonly ConflictRow[]): Record<string, Side | undefined> {
  return Object.fromEntries(
    rows.map(({ key, changedBy }) => [
      key,
      changedBy === 'both' ? undefined : changedBy === 'me' ? 'mine' : 'theirs',
    ]),
  );
}

/** My document with theirs where theirs was chosen. */
export function mergedDocument(
  mine: DesignDocument,
  rows: readonly ConflictRow[],
  choices: Readonly<Record<string, Side | undefined>>,
): DesignDocument {
  return rows.filter((row) => choices[row.key] === 'theirs').reduce(takeDifference, mine);
}

const keyOf = ({ path }: Pick<DocumentDifference, 'path'>) => path.join('.');
const keysOf = (differences: readonly DocumentDifference[]) => differences.map(keyOf);

/** A hole taken away as a whole touches each of its fields, and the other way round. */
function overlaps(a: string, b: string): boolean {
  return a === b || a.startsWith(`${b}.`) || b.startsWith(`${a}.`);
}

function valueAt(value: unknown, path: readonly string[]): unknown {
  const [key, ...rest] = path;
  if (key === undefined || typeof value !== 'object' || value === null) return value;
  if (Array.isArray(value)) {
    const items: unknown[] = value;
    return valueAt(
      items.find((item) => typeof item === 'object' && item !== null && 'id' in item && item.id === key),
      rest,
    );
  }
  return valueAt((value as Record<string, unknown>)[key], rest);
}
