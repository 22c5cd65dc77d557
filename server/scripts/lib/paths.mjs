import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

export const ROOT = resolve(fileURLToPath(new URL('../../..', import.meta.url)));
export const VAR = join(ROOT, 'var');
export const CLIENT_BUILD = join(VAR, 'client');

export const inRoot = (...parts) => join(ROOT, ...parts);
export const inVar = (...parts) => join(VAR, ...parts);
