import { randomBytes } from 'node:crypto';
import { createConnection } from 'mariadb';

export interface OwnDatabase {
  url: string;
  drop: () => Promise<void>;
}

/** An empty database of one's own on the server that a test run was given. */
export async function createDatabase(serverUrl: string): Promise<OwnDatabase> {
  const name = `borewright_${randomBytes(6).toString('hex')}`;
  await runStatement(
    serverUrl,
    `CREATE DATABASE \`${name}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`,
  );
  const url = new URL(serverUrl);
  url.pathname = `/${name}`;
  return { url: url.href, drop: () => runStatement(serverUrl, `DROP DATABASE \`${name}\``) };
}

async function runStatement(serverUrl: string, statement: string): Promise<void> {
  const { hostname, port, username, password } = new URL(serverUrl);
  const connection = await createConnection({ host: hostname, port: Number(port), user: username, password });
  try {
    await connection.query(statement);
  } finally {
    await connection.end();
  }
}
