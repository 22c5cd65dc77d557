import type { z } from 'zod';
import type { sheetQuery } from '#shared/contract/designs.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import type { Dependencies } from '../../dependencies.ts';
import { notFound } from '../../http/http-error.ts';
import type { Reply } from '../../http/route.ts';
import { presentWorkshop } from '../../identity/present-workshop.ts';
import { presentName } from '../../models/present-name.ts';
import { predictDocument } from '../../predicting/predict-document.ts';
import { storedDocument } from '../../predicting/stored-document.ts';
import { drawDrillingSheet } from '../../sheets/draw-drilling-sheet.ts';

/** Draws the sheet of the stored draft; every figure on it is worked out from that draft now. */
export async function makeSheet(
  { database, engine }: Dependencies,
  scope: WorkshopScope,
  { designId, paper, unit }: { designId: number } & z.output<typeof sheetQuery>,
): Promise<Reply<unknown>> {
  const design = await scope.visibleDesign(designId);
  const [draft, workshopRow] = await Promise.all([
    scope.drafts.findOne({ where: { designId }, include: ['savedBy'] }),
    database.models.Workshop.findByPk(scope.caller.workshopId),
  ]);
  if (draft === null || workshopRow === null) throw notFound();
  const document = storedDocument(draft.document);
  const workshop = presentWorkshop(workshopRow);
  const prediction = predictDocument(document);
  const sensitivities = await engine.sensitivities(document);
  const stream = drawDrillingSheet({
    document,
    prediction,
    sensitivities,
    workshop,
    revision: { number: design.revisionNumber, state: 'draft', draftSavedAt: draft.savedAt },
    printedAt: new Date(),
    paper,
    unit: unit ?? workshop.unit,
    drawnBy: presentName(draft.savedBy).name,
  });
  return { stream, headers: { 'Content-Disposition': disposition(document.name) } };
}

/** Shown in the browser, and saved under the design's name: in ASCII for old programs, and as it is written. */
function disposition(name: string): string {
  const ascii = name.replace(/[^A-Za-z0-9 _-]/g, '_');
  const encoded = encodeURIComponent(name).replace(/['()*]/g, (c) => `%${c.charCodeAt(0).toString(16)}`);
  return `inline; filename="${ascii}.pdf"; filename*=UTF-8''${encoded}.pdf`;
}
