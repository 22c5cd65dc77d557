import { once } from 'node:events';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { pino } from 'pino';
import { createApp } from '../../server/src/app.ts';
import { connectDatabase } from '../../server/src/db/connect.ts';
import { migrateDatabase } from '../../server/src/db/migrate.ts';
import { gatherDependencies } from '../../server/src/dependencies.ts';
import { loadDemoWorkshop } from '../../server/src/demo/load-demo-workshop.ts';
import { createDatabase } from './create-database.ts';

export interface RunningApp {
  /** Without a slash at its end. */
  address: string;
  stop: () => Promise<void>;
}

export interface AppSettings {
  /** A MariaDB whose account may create databases. */
  databaseUrl: string;
  clientFolder: string;
}

/** The real server with the built pages and the demo workshop, on a free port and a database of its own. */
export async function startApp({ databaseUrl, clientFolder }: AppSettings): Promise<RunningApp> {
  const own = await createDatabase(databaseUrl);
  const database = connectDatabase(own.url);
  const config = {
    staticDir: clientFolder,
    sessionSecret: 'only for tests, where no secret is to be kept',
    trustedProxies: 0,
    requestsPerMinute: 1_000_000,
    signUpsPerHour: 1000,
    // The least that bcrypt takes: nothing here is worth guessing.
    passwordRounds: 4,
  };
  await migrateDatabase(database.sequelize);
  await loadDemoWorkshop({ database, config });
  const dependencies = gatherDependencies({ config, database, log: pino({ level: 'silent' }) });
  const server = createServer(createApp(dependencies));
  const address = await listen(server);
  return {
    address,
    stop: async () => {
      server.closeAllConnections();
      server.close();
      await once(server, 'close');
      await dependencies.engine.close();
      await database.sequelize.close();
      await own.drop();
    },
  };
}

async function listen(server: Server): Promise<string> {
  server.listen(0, '127.0.0.1');
  await once(server, 'listening');
  const { port } = server.address() as AddressInfo;
  return `http://127.0.0.1:${port}`;
}
