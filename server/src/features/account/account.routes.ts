import { changePasswordRequest } from '#shared/contract/session.ts';
import type { Dependencies } from '../../dependencies.ts';
import { route, type Route } from '../../http/route.ts';
import { changePassword } from './change-password.ts';

export function accountRoutes(dependencies: Dependencies): Route[] {
  return [
    route({
      method: 'put',
      path: '/account/password',
      tag: 'Account',
      action: 'change-own-password',
      summary: 'Change the password. Every other device is signed out.',
      limit: 'sign-in',
      body: changePasswordRequest,
      answer: { status: 204, description: 'Changed.' },
      refusals: [409, 429],
      handle: async ({ caller, body }) => {
        await changePassword(dependencies, caller, body);
        return {};
      },
    }),
  ];
}
