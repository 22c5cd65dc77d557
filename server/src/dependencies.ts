import type { Logger } from 'pino';
import type { AppConfig } from './config.ts';
import type { Database } from './db/connect.ts';
import { SessionDirectory } from './identity/session-directory.ts';
import { EnginePool } from './jobs/engine-pool.ts';

interface Given {
  config: AppConfig;
  database: Database;
  log: Logger;
}

/** What the app is built from, and what its features are handed. */
export interface Dependencies extends Given {
  sessions: SessionDirectory;
  engine: EnginePool;
}

/** Adds to what a process is given what it keeps in memory. */
export function gatherDependencies(given: Given): Dependencies {
  return { ...given, sessions: new SessionDirectory(given.database), engine: new EnginePool() };
}
