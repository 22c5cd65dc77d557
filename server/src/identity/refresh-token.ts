import { createHash, randomBytes } from 'node:crypto';

export const newRefreshToken = () => randomBytes(32).toString('base64url');

/** Only the hash is stored: whoever reads the database cannot sign in with it. */
export function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
