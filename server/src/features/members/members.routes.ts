import { membersSchema } from '#shared/contract/session.ts';
import { route, type Route } from '../../http/route.ts';
import { listMembers } from './list-members.ts';

export function membersRoutes(): Route[] {
  return [
    route({
      method: 'get',
      path: '/members',
      tag: 'Members',
      action: 'see-members',
      summary: 'The people of the workshop and their roles, by name.',
      answer: { status: 200, description: 'The members.', schema: membersSchema },
      handle: async ({ scope }) => ({ body: await listMembers(scope) }),
    }),
  ];
}
