import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { VAR, inVar } from './paths.mjs';

export const SECRETS_FILE = inVar('secrets.json');

/** This clone's own secrets, made on its first start and readable by its owner alone. */
export function readSecrets() {
  if (!existsSync(SECRETS_FILE)) {
    mkdirSync(VAR, { recursive: true });
    const secrets = {
      // The server refuses these where NODE_ENV says production: there, secrets are set up with thought.
      purpose: 'demo',
      accessTokenSecret: randomBytes(48).toString('hex'),
      databasePassword: randomBytes(24).toString('hex'),
    };
    writeFileSync(SECRETS_FILE, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 });
  }
  return JSON.parse(readFileSync(SECRETS_FILE, 'utf8'));
}
