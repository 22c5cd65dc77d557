import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { VAR, inVar } from './paths.mjs';

/** This clone's own secrets, made on its first start and readable by its owner alone. */
export function readSecrets() {
  const file = inVar('secrets.json');
  if (!existsSync(file)) {
    mkdirSync(VAR, { recursive: true });
    const secrets = {
      sessionSecret: randomBytes(48).toString('hex'),
      databasePassword: randomBytes(24).toString('hex'),
    };
    writeFileSync(file, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 });
  }
  return JSON.parse(readFileSync(file, 'utf8'));
}
