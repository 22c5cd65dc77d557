/**
 * JSON with the keys of every object in order and no spaces: one text for one value, whatever order it came in.
 *
 * What a document's hash is taken of.
 */
export function canonicalJson(value: unknown): string {
  return JSON.stringify(value, (_key, part: unknown) => (isRecord(part) ? inOrder(part) : part));
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function inOrder(record: Record<string, unknown>): Record<string, unknown> {
  // By code unit: the order may not depend on anybody's language.
  return Object.fromEntries(Object.entries(record).sort(([a], [b]) => (a < b ? -1 : 1)));
}
