import { designIdParams, sheetQuery } from '#shared/contract/designs.ts';
import type { Dependencies } from '../../dependencies.ts';
import { route, type Route } from '../../http/route.ts';
import { makeSheet } from './make-sheet.ts';

export function sheetRoutes(dependencies: Dependencies): Route[] {
  return [
    route({
      method: 'get',
      path: '/designs/:id/draft/sheet.pdf',
      tag: 'Sheets',
      action: 'print-sheet',
      summary: 'The drilling sheet of the draft at full scale, marked NOT APPROVED.',
      params: designIdParams,
      query: sheetQuery,
      answer: { status: 200, description: 'The sheet.', contentType: 'application/pdf' },
      refusals: [422],
      handle: ({ scope, params, query }) => makeSheet(dependencies, scope, { designId: params.id, ...query }),
    }),
  ];
}
