import type { DesignDocument } from '#shared/document/design-document.ts';
import { designDocumentSchema } from '#shared/document/design-document.ts';

/** A stored draft's document; what is stored was read by this schema once, so a failure is a bug and not an answer. */
export function storedDocument(json: string): DesignDocument {
  return designDocumentSchema.parse(JSON.parse(json));
}
