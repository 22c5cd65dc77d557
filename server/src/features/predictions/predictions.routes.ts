import { designIdParams } from '#shared/contract/designs.ts';
import { storedPredictionSchema } from '#shared/contract/prediction.ts';
import type { Dependencies } from '../../dependencies.ts';
import { route, type Route } from '../../http/route.ts';
import { predictStoredDraft, readPrediction } from './stored-prediction.ts';

export function predictionRoutes(dependencies: Dependencies): Route[] {
  const shared = {
    path: '/designs/:id/draft/prediction',
    tag: 'Predictions',
    params: designIdParams,
  } as const;
  return [
    route({
      ...shared,
      method: 'get',
      action: 'see-designs',
      summary: 'The newest saved prediction of the draft.',
      answer: { status: 200, description: 'The prediction.', schema: storedPredictionSchema },
      handle: async ({ scope, params }) => ({ body: await readPrediction(scope, params.id) }),
    }),
    route({
      ...shared,
      method: 'post',
      action: 'edit-design',
      summary: 'Predict the stored draft anew, with the cents of each dimension, and save that.',
      answer: { status: 200, description: 'The prediction, saved.', schema: storedPredictionSchema },
      refusals: [422],
      handle: async ({ scope, params }) => ({
        body: await predictStoredDraft(dependencies, scope, params.id),
      }),
    }),
  ];
}
