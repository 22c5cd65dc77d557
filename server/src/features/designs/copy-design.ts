import type { DesignSummary } from '#shared/contract/designs.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import { notFound } from '../../http/http-error.ts';
import { storedDocument } from '../../predicting/stored-document.ts';
import { createDesignFrom } from './create-design.ts';

export async function copyDesign(scope: WorkshopScope, id: number, name: string): Promise<DesignSummary> {
  const design = await scope.visibleDesign(id);
  const draft = await scope.drafts.findOne({ where: { designId: design.id } });
  if (draft === null) throw notFound();
  return createDesignFrom(scope, { ...storedDocument(draft.document), name });
}
