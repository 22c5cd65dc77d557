import type { IncomingMessage } from 'node:http';
import type { Request, Response } from 'express';
import type { SessionTokens } from '../identity/start-session.ts';

const ACCESS = 'borewright_access';
const REFRESH = 'borewright_refresh';

// Lax, so that a link to a sheet opens from a mail; the refresh token needs no such thing and is sent nowhere else.
const ACCESS_OPTIONS = { httpOnly: true, sameSite: 'lax', path: '/api' } as const;
const REFRESH_OPTIONS = { httpOnly: true, sameSite: 'strict', path: '/api/session' } as const;

/** Gives the browser its tokens, or takes them back. */
export function setSessionCookies(req: Request, res: Response, tokens: SessionTokens | 'cleared'): void {
  const { secure } = req;
  if (tokens === 'cleared') {
    res.clearCookie(ACCESS, { ...ACCESS_OPTIONS, secure });
    res.clearCookie(REFRESH, { ...REFRESH_OPTIONS, secure });
    return;
  }
  res.cookie(ACCESS, tokens.accessToken, { ...ACCESS_OPTIONS, secure, expires: tokens.accessExpiresAt });
  res.cookie(REFRESH, tokens.refreshToken, { ...REFRESH_OPTIONS, secure, expires: tokens.refreshExpiresAt });
}

export const accessTokenOf = (req: IncomingMessage) => readCookie(req, ACCESS);
export const refreshTokenOf = (req: IncomingMessage) => readCookie(req, REFRESH);

/** Our tokens hold no character that a cookie would have to encode. */
function readCookie({ headers }: IncomingMessage, name: string): string | undefined {
  const pair = headers.cookie?.split(/;\s*/).find((part) => part.startsWith(`${name}=`));
  return pair?.slice(name.length + 1);
}
