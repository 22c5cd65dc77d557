import { EngineInputError } from '../acoustics/engine-input-error.ts';
import type { DesignDocument } from '../document/design-document.ts';

/** Place of a fingering in the document; throws `EngineInputError` when it has none of that id. */
export function requireFingering(document: DesignDocument, fingeringId: string): number {
  const index = document.fingerings.findIndex((fingering) => fingering.id === fingeringId);
  if (index >= 0) return index;
  throw new EngineInputError('fingerings', fingeringId, `The design has no fingering ${fingeringId}.`);
}
