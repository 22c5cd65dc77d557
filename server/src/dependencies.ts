import type { Logger } from 'pino';
import type { AppConfig } from './config.ts';
import type { Database } from './db/connect.ts';
import type { SessionDirectory } from './identity/session-directory.ts';

/** What the app is built from, and what its features are handed. */
export interface Dependencies {
  config: AppConfig;
  database: Database;
  log: Logger;
  sessions: SessionDirectory;
}
