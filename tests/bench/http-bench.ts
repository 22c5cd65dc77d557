import { fork, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';
import autocannon from 'autocannon';
import { createDatabase } from '../support/create-database.ts';
import { demoSignIn } from './demo-workshop.ts';
import { figureOf, type Figure } from './figure.ts';
import type { BenchAddresses } from './http-bench-server.ts';

const ROUNDS = 7;
const ROUND_S = 2;
const CONNECTIONS = 10;

const SERVER = fileURLToPath(new URL('./http-bench-server.ts', import.meta.url));

/** Reads of a design over HTTP as a share of the rate of a bare Express route that runs the same query. */
export async function measureReads(databaseUrl: string): Promise<Record<string, Figure>> {
  const own = await createDatabase(databaseUrl);
  const server = fork(SERVER, {
    execArgv: ['--import', 'tsx'],
    env: { ...process.env, BENCH_DATABASE_URL: own.url },
  });
  try {
    const addresses = await addressesOf(server);
    const cookie = await demoSignIn(addresses.ours);
    return {
      designRead: await compare(addresses, cookie, '/designs/1'),
      draftRead: await compare(addresses, cookie, '/designs/1/draft'),
    };
  } finally {
    server.disconnect();
    await once(server, 'exit');
    await own.drop();
  }
}

async function addressesOf(server: ChildProcess): Promise<BenchAddresses> {
  const [message] = (await Promise.race([
    once(server, 'message'),
    once(server, 'exit').then(() => {
      throw new Error('The server to be measured ended before it was up.');
    }),
  ])) as [BenchAddresses];
  return message;
}

/** Both are measured in turn, so that whatever else the machine does falls on both. */
async function compare(addresses: BenchAddresses, cookie: string, path: string): Promise<Figure> {
  const readOurs = () => ratePerSecond(`${addresses.ours}/api${path}`, { cookie });
  const readBare = () => ratePerSecond(`${addresses.bare}${path}`, {});
  await readBare();
  await readOurs();
  const shares: number[] = [];
  for (let round = 0; round < ROUNDS; round += 1) {
    const bare = await readBare();
    shares.push((await readOurs()) / bare);
  }
  const what = `GET ${path} against a bare Express route with the same query`;
  return figureOf({ what, unit: 'share of its rate', budget: 0.7, better: 'more' }, shares);
}

async function ratePerSecond(url: string, headers: Record<string, string>): Promise<number> {
  const result = await autocannon({ url, headers, connections: CONNECTIONS, duration: ROUND_S });
  if (result.non2xx > 0 || result.errors > 0) throw new Error(`${url} answered with errors under load.`);
  return result.requests.average;
}
