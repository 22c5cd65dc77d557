import type { Draft } from '#shared/contract/designs.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import { notFound } from '../../http/http-error.ts';
import { presentDraft } from './present-draft.ts';

export async function readDraft(scope: WorkshopScope, designId: number): Promise<Draft> {
  const draft = await scope.drafts.findOne({
    where: { designId },
    include: [
      'savedBy',
      { association: 'design', attributes: [], required: true, where: scope.visibleDesigns() },
    ],
  });
  if (draft === null) throw notFound();
  return presentDraft(draft);
}
