import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, it } from 'vitest';

const SOURCE = new URL('..', import.meta.url).pathname;
const DOOR = ['db/connect.ts', 'db/workshop-scope.ts', 'models/define-models.ts'];

function sources(): string[] {
  return readdirSync(SOURCE, { recursive: true, encoding: 'utf8' }).filter(
    (file) => file.endsWith('.ts') && !file.endsWith('.test.ts') && !file.startsWith('migrations/'),
  );
}

it('is the only door to the tables of a workshop', () => {
  const reaching = sources().filter((file) => /\bowned\b/.test(readFileSync(join(SOURCE, file), 'utf8')));
  expect(reaching.sort()).toEqual(DOOR);
});

it('is not gone round with a query in plain SQL', () => {
  const tables = /\b(?:FROM|JOIN|INTO|UPDATE)\s+(?:designs|drafts|predictions)\b/i;
  const reaching = sources().filter((file) => tables.test(readFileSync(join(SOURCE, file), 'utf8')));
  expect(reaching).toEqual([]);
});
