import type { DesignDocument } from '#shared/document/design-document.ts';
import { WorkshopScope } from '../../server/src/db/workshop-scope.ts';
import { createDesign, predictDraft } from '../../server/src/predicting/store-draft.ts';
import type { BuiltPerson } from './build-person.ts';
import type { TestServer } from './start-test-server.ts';
import { whistleDocument } from './whistle-document.ts';

interface DesignSettings {
  by: BuiltPerson;
  document?: Partial<DesignDocument>;
  archived?: boolean;
}

/** A design of somebody, whatever their role lets them make; returns its id. */
export async function buildDesign(
  { database }: TestServer,
  { by, document = {}, archived = false }: DesignSettings,
): Promise<number> {
  const { id: personId, role, workshop } = by;
  const caller = { personId, workshopId: workshop.id, role, sessionId: 0, tokenExpiresAt: new Date() };
  const scope = new WorkshopScope(database, caller);
  const id = await createDesign(scope, predictDraft(whistleDocument(document)));
  if (archived) await scope.designs.update({ archivedAt: new Date() }, { where: { id } });
  return id;
}
