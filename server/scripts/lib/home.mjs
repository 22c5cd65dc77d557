import { ensureMariadb } from './debian.mjs';
import { startKeptMariadb } from './mariadb.mjs';
import { ensurePackages } from './packages.mjs';
import { inVar } from './paths.mjs';
import { isPortFree } from './ports.mjs';
import { Refusal } from './refusal.mjs';
import { readSecrets } from './secrets.mjs';
import { endLeftoverServer } from './server-process.mjs';
import { takeTheOnlyPlace } from './single-run.mjs';

function readPort() {
  const written = process.env.PORT ?? '3000';
  const port = Number(written);
  if (Number.isInteger(port) && port > 0 && port < 65_536) return port;
  throw new Refusal(`PORT is "${written}", which is no port: give a whole number from 1 to 65535.`);
}

async function refuseTakenPort(port, command) {
  if (await isPortFree(port)) return;
  throw new Refusal(
    `Port ${port} is in use: stop the program that uses it, or choose another, as in: PORT=${port + 1} ${command}`,
  );
}

/**
 * Everything a server needs before it can start: packages, secrets and a database.
 *
 * @returns port, and the environment to start the server with
 */
export async function prepareHome(shutdown, command) {
  const port = readPort();
  await shutdown.add(takeTheOnlyPlace(port));
  await endLeftoverServer();
  await refuseTakenPort(port, command);
  await ensurePackages();
  const secrets = readSecrets();
  return {
    port,
    environment: {
      SESSION_SECRET: process.env.SESSION_SECRET ?? secrets.sessionSecret,
      DATABASE_URL: await openDatabase(),
    },
  };

  async function openDatabase() {
    if (process.env.DATABASE_URL) return process.env.DATABASE_URL;
    await ensureMariadb();
    const database = await startKeptMariadb(inVar('mariadb'), secrets.databasePassword);
    await shutdown.add(database.stop);
    database.child.once('exit', () => {
      if (shutdown.isStopping()) return;
      process.stderr.write(`MariaDB ended by itself; its log is ${inVar('mariadb', 'mariadb.log')}.\n`);
      void shutdown.leave(1);
    });
    return database.url;
  }
}
