import { createSecretKey, type KeyObject } from 'node:crypto';
import jwt from 'jsonwebtoken';
import { z } from 'zod';

/** How long an access token holds; its session is refreshed before, or ends. */
export const ACCESS_MINUTES = 15;

const claimsSchema = z.object({ sid: z.int(), exp: z.int() });

export interface AccessClaims {
  sessionId: number;
  expiresAt: Date;
}

const keys = new Map<string, KeyObject>();

/** A secret handed on as text is first tried as a public key, at every token: half the time of a request. */
function keyOf(secret: string): KeyObject {
  const key = keys.get(secret) ?? createSecretKey(secret, 'utf8');
  keys.set(secret, key);
  return key;
}

/** Signs a short-lived token that names a session and nothing else: role and workshop are looked up. */
export function signAccessToken(sessionId: number, secret: string): { token: string; expiresAt: Date } {
  const exp = Math.floor(Date.now() / 1000) + ACCESS_MINUTES * 60;
  const token = jwt.sign({ sid: sessionId, exp }, keyOf(secret), { algorithm: 'HS256' });
  return { token, expiresAt: new Date(exp * 1000) };
}

/** What a token says; null when it is not ours, was tampered with, or has run out. */
export function readAccessToken(token: string, secret: string): AccessClaims | null {
  try {
    const claims = claimsSchema.parse(jwt.verify(token, keyOf(secret), { algorithms: ['HS256'] }));
    return { sessionId: claims.sid, expiresAt: new Date(claims.exp * 1000) };
  } catch {
    // Whatever is wrong with a token, the answer is the same: sign in again.
    return null;
  }
}
