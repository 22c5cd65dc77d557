import type { Draft } from '#shared/contract/designs.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { DraftRow } from '../../models/draft.ts';
import { presentName } from '../../models/present-name.ts';

export function presentDraft(row: DraftRow): Draft {
  return {
    designId: row.designId,
    version: row.version,
    savedAt: row.savedAt.toISOString(),
    savedBy: presentName(row.savedBy),
    // Read by the schema on its way in; a second reading at every opening would find nothing.
    document: JSON.parse(row.document) as DesignDocument,
  };
}
