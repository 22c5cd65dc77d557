import { designIdParams, draftSchema, saveDraftRequest } from '#shared/contract/designs.ts';
import { seenVersion, versionTag } from '../../http/draft-version.ts';
import { route, type Route } from '../../http/route.ts';
import { readDraft } from './read-draft.ts';
import { saveDraft } from './save-draft.ts';

export function draftRoutes(): Route[] {
  const shared = { path: '/designs/:id/draft', tag: 'Drafts', params: designIdParams } as const;
  return [
    route({
      ...shared,
      method: 'get',
      action: 'see-designs',
      summary: 'The draft of a design; its ETag is its version.',
      answer: { status: 200, description: 'The draft.', schema: draftSchema },
      handle: async ({ scope, params }) => {
        const draft = await readDraft(scope, params.id);
        return { body: draft, headers: { ETag: versionTag(draft.version) } };
      },
    }),
    route({
      ...shared,
      method: 'put',
      action: 'edit-design',
      summary: 'Save the draft as the next version, if the version named in If-Match is still the newest.',
      ifMatch: true,
      body: saveDraftRequest,
      answer: { status: 200, description: 'Saved.', schema: draftSchema },
      refusals: [409, 412, 422, 428],
      handle: async ({ scope, params, body, ifMatch }) => {
        const seen = seenVersion(ifMatch);
        const draft = await saveDraft(scope, { designId: params.id, seenVersion: seen }, body.document);
        return { body: draft, headers: { ETag: versionTag(draft.version) } };
      },
    }),
  ];
}
