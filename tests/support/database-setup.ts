import type { TestProject } from 'vitest/node';
import { ensureMariadb } from '../../server/scripts/lib/debian.mjs';
import { startThrowAwayMariadb } from '../../server/scripts/lib/mariadb.mjs';

/** `npm test` has one database server for all layers; a bare `npx vitest` gets one here. */
export async function setup(project: TestProject) {
  const given = process.env.TEST_DATABASE_URL;
  if (given !== undefined) {
    project.provide('databaseUrl', given);
    return undefined;
  }
  await ensureMariadb();
  const database = await startThrowAwayMariadb();
  project.provide('databaseUrl', database.url);
  return database.stop;
}
