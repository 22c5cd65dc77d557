import 'vitest';

declare module 'vitest' {
  export interface ProvidedContext {
    /** An empty database on a MariaDB of the run's own; its account may create further databases. */
    databaseUrl: string;
    /** Folder of the built pages. */
    clientFolder: string;
    /** Where workers reach the run's one Chromium. */
    browserEndpoint: string;
  }
}
