import { once } from 'node:events';
import { createServer, type RequestListener } from 'node:http';
import type { AddressInfo } from 'node:net';
import express, { type Express } from 'express';
import { pino } from 'pino';
import { createApp } from '../../server/src/app.ts';
import type { AppConfig } from '../../server/src/config.ts';
import { connectDatabase, type Database } from '../../server/src/db/connect.ts';
import { migrateDatabase } from '../../server/src/db/migrate.ts';
import { gatherDependencies } from '../../server/src/dependencies.ts';
import { loadDemoWorkshop } from '../../server/src/demo/load-demo-workshop.ts';

/** What this process tells the one that measures it. */
export interface BenchAddresses {
  ours: string;
  bare: string;
}

const config: AppConfig = {
  staticDir: '.',
  sessionSecret: 'only for measuring, where no secret is to be kept',
  trustedProxies: 0,
  requestsPerMinute: 100_000_000,
  signUpsPerHour: 1000,
  passwordRounds: 4,
};

/** The same two queries with nothing around them: no session, no rights, no contract. */
function bareApp({ owned }: Database): Express {
  const app = express();
  app.set('etag', false);
  app.get('/designs/:id', async (req, res) => {
    const where = { id: Number(req.params.id), workshopId: 1 };
    res.json(await owned.Design.findOne({ where, include: ['createdBy', 'changedBy'] }));
  });
  app.get('/designs/:id/draft', async (req, res) => {
    const where = { designId: Number(req.params.id), workshopId: 1 };
    const include = ['savedBy', { association: 'design', attributes: [], required: true }];
    res.json(await owned.Draft.findOne({ where, include }));
  });
  return app;
}

async function listen(listener: RequestListener): Promise<string> {
  const server = createServer(listener);
  server.listen(0, '127.0.0.1');
  await once(server, 'listening');
  return `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
}

const database = connectDatabase(process.env.BENCH_DATABASE_URL ?? '');
await migrateDatabase(database.sequelize);
await loadDemoWorkshop({ database, config });
const addresses: BenchAddresses = {
  ours: await listen(createApp(gatherDependencies({ config, database, log: pino({ level: 'silent' }) }))),
  bare: await listen(bareApp(database)),
};
process.send?.(addresses);
process.once('disconnect', () => process.exit());
