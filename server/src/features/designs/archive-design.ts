import type { DesignSummary } from '#shared/contract/designs.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import { readDesign } from './read-design.ts';

/** Archiving what is archived leaves it as it is. */
export async function archiveDesign(scope: WorkshopScope, id: number): Promise<DesignSummary> {
  const design = await scope.visibleDesign(id);
  await scope.designs.update({ archivedAt: new Date() }, { where: { id: design.id, archivedAt: null } });
  return readDesign(scope, id);
}

export async function restoreDesign(scope: WorkshopScope, id: number): Promise<DesignSummary> {
  const design = await scope.visibleDesign(id);
  await scope.designs.update({ archivedAt: null }, { where: { id: design.id } });
  return readDesign(scope, id);
}
