import type { IncomingMessage } from 'node:http';
import type { Dependencies } from '../dependencies.ts';
import { readAccessToken } from '../identity/access-token.ts';
import type { Caller } from '../identity/caller.ts';
import { signedOut } from './http-error.ts';
import { accessTokenOf } from './session-cookies.ts';

/**
 * Who is asking.
 *
 * @throws HttpError 401 without a token that holds, or when its session has ended
 */
export async function authenticate(
  req: IncomingMessage,
  { config, sessions }: Pick<Dependencies, 'config' | 'sessions'>,
): Promise<Caller> {
  const token = accessTokenOf(req);
  if (token === undefined) throw signedOut();
  const claims = readAccessToken(token, config.sessionSecret);
  if (claims === null) throw signedOut();
  const session = await sessions.find(claims.sessionId);
  if (session === null) throw signedOut();
  return { ...session, sessionId: claims.sessionId, tokenExpiresAt: claims.expiresAt };
}
