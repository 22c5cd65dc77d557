import {
  copyDesignRequest,
  createDesignRequest,
  designIdParams,
  designListSchema,
  designSummarySchema,
  listDesignsQuery,
  renameDesignRequest,
} from '#shared/contract/designs.ts';
import { route, type Route } from '../../http/route.ts';
import { archiveDesign, restoreDesign } from './archive-design.ts';
import { copyDesign } from './copy-design.ts';
import { createDesignFrom } from './create-design.ts';
import { listDesigns } from './list-designs.ts';
import { readDesign } from './read-design.ts';
import { renameDesign } from './rename-design.ts';

const tag = 'Designs';
const params = designIdParams;

export function designRoutes(): Route[] {
  return [...collectionRoutes(), ...singleRoutes()];
}

function collectionRoutes(): Route[] {
  return [
    route({
      method: 'get',
      path: '/designs',
      tag,
      action: 'see-designs',
      summary:
        'The designs one may see: searched, filtered, sorted and in pages, with counts for the filters.',
      query: listDesignsQuery,
      answer: { status: 200, description: 'One page of designs.', schema: designListSchema },
      handle: async ({ scope, query }) => ({ body: await listDesigns(scope, query) }),
    }),
    route({
      method: 'post',
      path: '/designs',
      tag,
      action: 'create-design',
      summary: 'Make a design from a document; its name is the name of the document.',
      body: createDesignRequest,
      answer: { status: 201, description: 'The new design.', schema: designSummarySchema },
      refusals: [422],
      handle: async ({ scope, body }) => ({ body: await createDesignFrom(scope, body.document) }),
    }),
  ];
}

function singleRoutes(): Route[] {
  const answer = { status: 200, description: 'The design.', schema: designSummarySchema } as const;
  return [
    route({
      method: 'get',
      path: '/designs/:id',
      tag,
      action: 'see-designs',
      summary: 'One design as the rack shows it.',
      params,
      answer,
      handle: async ({ scope, params: { id } }) => ({ body: await readDesign(scope, id) }),
    }),
    route({
      method: 'patch',
      path: '/designs/:id',
      tag,
      action: 'edit-design',
      summary: 'Rename a design; the name inside its draft follows, as a new version.',
      params,
      body: renameDesignRequest,
      answer,
      refusals: [409],
      handle: async ({ scope, params: { id }, body }) => ({ body: await renameDesign(scope, id, body.name) }),
    }),
    route({
      method: 'post',
      path: '/designs/:id/copies',
      tag,
      action: 'copy-design',
      summary: 'Copy the draft of a design into a new design.',
      params,
      body: copyDesignRequest,
      answer: { ...answer, status: 201, description: 'The copy.' },
      handle: async ({ scope, params: { id }, body }) => ({ body: await copyDesign(scope, id, body.name) }),
    }),
    route({
      method: 'post',
      path: '/designs/:id/archive',
      tag,
      action: 'archive-design',
      summary: 'Put a design away; nothing of it is lost.',
      params,
      answer,
      handle: async ({ scope, params: { id } }) => ({ body: await archiveDesign(scope, id) }),
    }),
    route({
      method: 'post',
      path: '/designs/:id/restore',
      tag,
      action: 'archive-design',
      summary: 'Take a design out of the archive.',
      params,
      answer,
      handle: async ({ scope, params: { id } }) => ({ body: await restoreDesign(scope, id) }),
    }),
  ];
}
