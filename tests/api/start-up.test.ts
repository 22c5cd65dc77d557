import { request as httpRequest } from 'node:http';
import { afterAll, describe, expect, inject, it } from 'vitest';
import { connectDatabase } from '../../server/src/db/connect.ts';
import { createDatabase } from '../support/create-database.ts';
import { runServer } from '../support/run-server.ts';

const own = await createDatabase(inject('databaseUrl'));
afterAll(() => own.drop());
const settings = { DATABASE_URL: own.url };

/** It ends by itself with one sentence and no stack. */
async function expectRefusal(environment: Record<string, string>, sentence: RegExp) {
  const server = await runServer({ ...settings, ...environment });
  expect(server.address).toBeNull();
  expect(await server.ended).toBe(1);
  const lines = server.stderr().trim().split('\n');
  expect(lines).toEqual([expect.stringMatching(sentence)]);
}

describe('starting', { timeout: 90_000 }, () => {
  it('migrates an empty database, answers, refuses a second on its port, and stops when asked', async () => {
    const server = await runServer(settings);
    const health = await fetch(`${server.address!}/api/health`);
    expect(await health.json()).toEqual({ status: 'up' });
    await expectRefusal({ PORT: new URL(server.address!).port }, /^Port \d+ is in use: stop .*PORT\.$/);
    server.signal('SIGINT');
    expect(await server.ended).toBe(0);
    expect(server.stderr()).toBe('');
  });

  it('finishes a request that is under way before it stops', async () => {
    const server = await runServer(settings);
    const body = JSON.stringify({ email: 'nobody@yard.example', password: 'wrong' });
    const half = Math.floor(body.length / 2);
    const request = httpRequest(`${server.address!}/api/session`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', 'Content-Length': String(body.length) },
    });
    const status = new Promise<number | undefined>((resolve, reject) => {
      request.on('response', (response) => resolve(response.resume().statusCode));
      request.on('error', reject);
    });
    await new Promise<void>((resolve) => request.write(body.slice(0, half), () => resolve()));
    // Answered on another connection: the half request has arrived too.
    await fetch(`${server.address!}/api/health`);
    server.signal('SIGTERM');
    await expect.poll(() => refusesConnections(server.address!)).toBe(true);
    request.end(body.slice(half));
    expect(await status).toBe(401);
    expect(await server.ended).toBe(0);
  });

  it('loads the demo workshop into an empty database, once', async () => {
    const demo = await createDatabase(inject('databaseUrl'));
    const counts: number[] = [];
    for (let round = 0; round < 2; round += 1) {
      const server = await runServer({ DATABASE_URL: demo.url, BOREWRIGHT_DEMO: '1' });
      const answer = await fetch(`${server.address!}/api/session`, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json' },
        body: JSON.stringify({ email: 'ines@saltgate.example', password: 'saltgate-yard' }),
      });
      expect(answer.status).toBe(200);
      counts.push(await workshopsIn(demo.url));
      server.signal('SIGTERM');
      expect(await server.ended).toBe(0);
    }
    await demo.drop();
    expect(counts).toEqual([1, 1]);
  });

  it('refuses a database that a newer version has been at', async () => {
    const newer = await createDatabase(inject('databaseUrl'));
    const database = connectDatabase(newer.url);
    await database.sequelize.query('CREATE TABLE migrations (name VARCHAR(255) PRIMARY KEY)');
    await database.sequelize.query("INSERT INTO migrations VALUES ('9999-from-the-future')");
    await database.sequelize.close();
    await expectRefusal(
      { DATABASE_URL: newer.url },
      /newer version of Borewright .*9999-from-the-future.*start that version/,
    );
    await newer.drop();
  });

  it.each([
    [
      'a database that is not there',
      { DATABASE_URL: 'mariadb://a:b@127.0.0.1:1/c' },
      /cannot reach its database/,
    ],
    [
      'a demo secret in production',
      { NODE_ENV: 'production', SESSION_SECRET: `demo-${'x'.repeat(40)}` },
      /demo secret/,
    ],
    ['a secret that can be guessed', { SESSION_SECRET: 'short' }, /set SESSION_SECRET/],
    ['a port that is none', { PORT: 'http' }, /set PORT/],
  ])('refuses %s', async (_, environment, sentence) => {
    await expectRefusal(environment, sentence);
  });
});

async function refusesConnections(address: string): Promise<boolean> {
  return fetch(`${address}/api/health`).then(
    () => false,
    () => true,
  );
}

async function workshopsIn(url: string): Promise<number> {
  const database = connectDatabase(url);
  const count = await database.models.Workshop.count();
  await database.sequelize.close();
  return count;
}
