import { once } from 'node:events';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { pino } from 'pino';
import { afterAll, inject } from 'vitest';
import { createApp } from '../../server/src/app.ts';
import type { AppConfig } from '../../server/src/config.ts';
import { connectDatabase } from '../../server/src/db/connect.ts';
import { migrateDatabase } from '../../server/src/db/migrate.ts';
import { gatherDependencies, type Dependencies } from '../../server/src/dependencies.ts';
import { createDatabase } from './create-database.ts';

export interface TestServer extends Dependencies {
  /** Without a slash at its end. */
  address: string;
}

const CONFIG: AppConfig = {
  staticDir: '/nonexistent',
  sessionSecret: 'only for tests, where no secret is to be kept',
  trustedProxies: 0,
  requestsPerMinute: 1_000_000,
  signUpsPerHour: 1000,
  // The least that bcrypt takes: nothing here is worth guessing.
  passwordRounds: 4,
};

/** The real server on an empty database of this test file's own; both go when the file is done. */
export async function startTestServer(changes: Partial<AppConfig> = {}): Promise<TestServer> {
  const own = await createDatabase(inject('databaseUrl'));
  const database = connectDatabase(own.url);
  await migrateDatabase(database.sequelize);
  const config = { ...CONFIG, ...changes };
  const dependencies = gatherDependencies({ config, database, log: pino({ level: 'silent' }) });
  const server = createServer(createApp(dependencies));
  server.listen(0, '127.0.0.1');
  await once(server, 'listening');
  afterAll(async () => {
    server.closeAllConnections();
    server.close();
    await dependencies.engine.close();
    await database.sequelize.close();
    await own.drop();
  });
  const { port } = server.address() as AddressInfo;
  return { ...dependencies, address: `http://127.0.0.1:${port}` };
}
