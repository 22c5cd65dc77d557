import { createServer, type Server } from 'node:http';
import { once } from 'node:events';
import type { AddressInfo } from 'node:net';
import { pino } from 'pino';
import { createApp } from './app.ts';
import { readConfig, StartRefusal, type Config } from './config.ts';
import { connectDatabase, type Database } from './db/connect.ts';
import { gatherDependencies, type Dependencies } from './dependencies.ts';
import { migrateDatabase } from './db/migrate.ts';
import { loadDemoWorkshop } from './demo/load-demo-workshop.ts';

/** How long requests that are under way may take to finish once we are asked to stop, ms. */
const PATIENCE_MS = 10_000;

async function main(): Promise<void> {
  const config = readConfig(process.env);
  const log = pino({ level: config.logLevel });
  const database = connectDatabase(config.databaseUrl);
  try {
    await prepareDatabase(database, config);
    const dependencies = gatherDependencies({ config: config.app, database, log });
    const server = await listen(config, dependencies);
    stopOnSignal(server, dependencies);
    const { port } = server.address() as AddressInfo;
    process.stdout.write(`Borewright answers at http://${config.host}:${port}\n`);
  } catch (error) {
    await database.sequelize.close();
    throw error;
  }
}

async function prepareDatabase(database: Database, config: Config): Promise<void> {
  try {
    await database.sequelize.authenticate();
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    throw new StartRefusal(
      `Borewright cannot reach its database (${reason}): start MariaDB or mend DATABASE_URL.`,
    );
  }
  await migrateDatabase(database.sequelize);
  if (config.loadDemo) await loadDemoWorkshop({ database, config: config.app });
}

async function listen(config: Config, dependencies: Dependencies): Promise<Server> {
  const server = createServer(createApp(dependencies));
  server.listen(config.port, config.host);
  try {
    await once(server, 'listening');
  } catch (error) {
    if (!(error instanceof Error && 'code' in error && error.code === 'EADDRINUSE')) throw error;
    throw new StartRefusal(
      `Port ${config.port} is in use: stop the program that uses it, or choose another with PORT.`,
    );
  }
  return server;
}

function stopOnSignal(server: Server, { database, engine, log }: Dependencies): void {
  let stopping = false;
  const stop = () => {
    if (stopping) return;
    stopping = true;
    const force = setTimeout(() => server.closeAllConnections(), PATIENCE_MS);
    server.close(() => {
      clearTimeout(force);
      Promise.all([engine.close(), database.sequelize.close()]).catch((error: unknown) => {
        log.error({ err: error }, 'closing what the server had open');
      });
    });
    server.closeIdleConnections();
  };
  process.once('SIGINT', stop);
  process.once('SIGTERM', stop);
}

main().catch((error: unknown) => {
  const text =
    error instanceof StartRefusal ? error.message : error instanceof Error ? error.stack : String(error);
  process.stderr.write(`${text ?? 'Borewright cannot start.'}\n`);
  process.exitCode = 1;
});
