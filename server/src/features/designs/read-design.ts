import type { DesignSummary } from '#shared/contract/designs.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import { DESIGN_PEOPLE, presentDesign } from './present-design.ts';

export async function readDesign(scope: WorkshopScope, id: number): Promise<DesignSummary> {
  return presentDesign(await scope.visibleDesign(id, { include: DESIGN_PEOPLE }));
}
