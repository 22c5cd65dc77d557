import {
  createWorkshopRequest,
  sessionSchema,
  updateWorkshopRequest,
  workshopSchema,
} from '#shared/contract/session.ts';
import type { Dependencies } from '../../dependencies.ts';
import { openRoute, route, type Route } from '../../http/route.ts';
import { createWorkshop } from './create-workshop.ts';
import { readWorkshop } from './read-workshop.ts';
import { updateWorkshop } from './update-workshop.ts';

export function workshopRoutes(dependencies: Dependencies): Route[] {
  const tag = 'Workshop';
  return [
    openRoute({
      method: 'post',
      path: '/workshops',
      tag,
      summary: 'Open a workshop of your own, and be signed in as its owner.',
      limit: 'sign-up',
      body: createWorkshopRequest,
      answer: { status: 201, description: 'Opened and signed in.', schema: sessionSchema },
      refusals: [409, 429],
      handle: ({ body }) => createWorkshop(dependencies, body),
    }),
    route({
      method: 'get',
      path: '/workshop',
      tag,
      action: 'see-workshop',
      summary: "The workshop's name and settings.",
      answer: { status: 200, description: 'The workshop.', schema: workshopSchema },
      handle: async ({ caller }) => ({ body: await readWorkshop(dependencies, caller) }),
    }),
    route({
      method: 'patch',
      path: '/workshop',
      tag,
      action: 'change-workshop',
      summary: 'Change settings of the workshop; what is left out stays.',
      body: updateWorkshopRequest,
      answer: { status: 200, description: 'The workshop as it is now.', schema: workshopSchema },
      handle: async ({ caller, body }) => ({ body: await updateWorkshop(dependencies, caller, body) }),
    }),
  ];
}
