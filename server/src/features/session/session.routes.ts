import { sessionSchema, signInRequest } from '#shared/contract/session.ts';
import type { Dependencies } from '../../dependencies.ts';
import { endSession } from '../../identity/end-sessions.ts';
import { openRoute, route, type Route } from '../../http/route.ts';
import { readSession } from './read-session.ts';
import { refreshSession } from './refresh-session.ts';
import { signIn } from './sign-in.ts';

export function sessionRoutes(dependencies: Dependencies): Route[] {
  const tag = 'Session';
  return [
    openRoute({
      method: 'post',
      path: '/session',
      tag,
      summary: 'Sign in. The tokens come as cookies that scripts cannot read.',
      limit: 'sign-in',
      body: signInRequest,
      answer: { status: 200, description: 'Signed in.', schema: sessionSchema },
      refusals: [401, 429],
      handle: ({ body, address }) => signIn(dependencies, { ...body, address }),
    }),
    route({
      method: 'get',
      path: '/session',
      tag,
      action: 'see-session',
      summary: 'Who is signed in, in which workshop, and until when.',
      answer: { status: 200, description: 'The session.', schema: sessionSchema },
      handle: async ({ caller }) => ({ body: await readSession(dependencies, caller) }),
    }),
    openRoute({
      method: 'post',
      path: '/session/refresh',
      tag,
      summary:
        'Trade the refresh token for a new pair. Each is good for one use; a second use ends the whole session.',
      answer: { status: 200, description: 'The session goes on.', schema: sessionSchema },
      refusals: [401],
      handle: ({ refreshToken }) => refreshSession(dependencies, refreshToken),
    }),
    route({
      method: 'delete',
      path: '/session',
      tag,
      action: 'see-session',
      summary: 'Sign out of this device.',
      answer: { status: 204, description: 'Signed out.' },
      handle: async ({ caller }) => {
        await endSession(dependencies, caller.sessionId, 'signed-out');
        return { session: 'cleared' };
      },
    }),
  ];
}
