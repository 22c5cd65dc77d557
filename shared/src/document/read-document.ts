import { designDocumentSchema, type DesignDocument } from './design-document.ts';
import { plainWords } from './plain-words.ts';
import { MM_FROM_MOUTH_END, type DocumentFault, type FaultWords } from './fault-words.ts';
import { documentFaults } from './document-faults.ts';

export type DocumentReading =
  { status: 'read'; document: DesignDocument } | { status: 'refused'; faults: DocumentFault[] };

/** Reads a design document from unknown JSON: shape first, then what the parts mean to one another. */
export function readDocument(input: unknown, words: FaultWords = MM_FROM_MOUTH_END): DocumentReading {
  const parsed = designDocumentSchema.safeParse(input, { error: plainWords });
  if (!parsed.success) {
    const faults = parsed.error.issues.map((issue) => ({
      path: issue.path.map((key) => (typeof key === 'symbol' ? key.toString() : key)),
      message: issue.message,
    }));
    return { status: 'refused', faults };
  }
  const faults = documentFaults(parsed.data, words);
  return faults.length > 0 ? { status: 'refused', faults } : { status: 'read', document: parsed.data };
}
