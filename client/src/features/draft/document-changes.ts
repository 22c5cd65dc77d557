/** One value that differs, and what stands there instead. `undefined` means that the key is not there. */
export interface PathChange {
  path: (string | number)[];
  value: unknown;
}

type Keyed = Record<string, unknown>;

const isKeyed = (value: unknown): value is Keyed =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/**
 * What has to change in `from` so that it equals `to`.
 *
 * Lists of equal length are compared entry by entry, so that a dragged hole costs a few bytes; a list that grew
 * or shrank is taken whole.
 */
export function changesBetween(from: unknown, to: unknown): PathChange[] {
  if (from === to) return [];
  if (Array.isArray(from) && Array.isArray(to) && from.length === to.length) {
    return to.flatMap((entry: unknown, index) => below(index, changesBetween(from[index], entry)));
  }
  if (isKeyed(from) && isKeyed(to)) {
    const keys = [...new Set([...Object.keys(from), ...Object.keys(to)])];
    return keys.flatMap((key) => below(key, changesBetween(from[key], to[key])));
  }
  return Object.is(from, to) ? [] : [{ path: [], value: to }];
}

const below = (key: string | number, changes: PathChange[]): PathChange[] =>
  changes.map((change) => ({ path: [key, ...change.path], value: change.value }));

/** A copy with the changes made; everything that did not change is shared with the original. */
export function applyChanges<T>(value: T, changes: readonly PathChange[]): T {
  return changes.reduce<unknown>(
    (result, change) => withValueAt(result, change.path, change.value),
    value,
  ) as T;
}

function withValueAt(target: unknown, path: readonly (string | number)[], value: unknown): unknown {
  const [key, ...rest] = path;
  if (key === undefined) return value;
  if (Array.isArray(target)) {
    return target.map((entry: unknown, index) => (index === key ? withValueAt(entry, rest, value) : entry));
  }
  if (!isKeyed(target)) throw new TypeError(`Nothing to change at ${path.join('.')}.`);
  const inner = withValueAt(target[key], rest, value);
  if (inner !== undefined) return { ...target, [key]: inner };
  return Object.fromEntries(Object.entries(target).filter(([other]) => other !== String(key)));
}

export function isSameDocument(a: unknown, b: unknown): boolean {
  return changesBetween(a, b).length === 0;
}
