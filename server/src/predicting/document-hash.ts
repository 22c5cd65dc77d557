import { createHash } from 'node:crypto';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { canonicalJson } from '#shared/document/canonical-json.ts';

/** SHA-256 of a document's canonical JSON, hex: the same document always has the same. */
export function documentHash(document: DesignDocument): string {
  return createHash('sha256').update(canonicalJson(document)).digest('hex');
}
