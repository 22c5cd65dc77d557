import type { DesignRow } from '../models/design.ts';
import { conflict } from '../http/http-error.ts';

/** @throws HttpError 409: what was put away is not worked on by accident */
export function refuseArchived(design: Pick<DesignRow, 'archivedAt'>): void {
  if (design.archivedAt !== null) {
    throw conflict('This design is in the archive. Nothing was changed. Restore it first.');
  }
}
