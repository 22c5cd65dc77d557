import { ensureClientBuilt } from './client-build.mjs';
import { ensureChromium, ensureMariadb, findChromium } from './debian.mjs';
import { startThrowAwayMariadb } from './mariadb.mjs';
import { ensurePackages } from './packages.mjs';
import { inRoot } from './paths.mjs';
import { run } from './processes.mjs';
import { runLauncher } from './refusal.mjs';
import { orderlyShutdown } from './shutdown.mjs';

/**
 * Runs a script of `tests/` with everything there that it needs: packages, a database to throw away, built pages, Chromium.
 *
 * @param {string[]} script - its place below the root
 * @param {{ nodeFlags?: string[], args?: string[], env?: Record<string, string> }} options - for the script
 */
export async function runInSurroundings(script, { nodeFlags = [], args = [], env = {} } = {}) {
  const shutdown = orderlyShutdown({ signalCode: 130 });
  await runLauncher(async () => {
    try {
      await ensurePackages();
      await ensureMariadb();
      await ensureChromium();
      const database = await startThrowAwayMariadb();
      await shutdown.add(database.stop);
      const surroundings = {
        NODE_ENV: 'production',
        TEST_DATABASE_URL: database.url,
        BUILT_CLIENT: await ensureClientBuilt(),
        CHROMIUM: findChromium(),
      };
      const { code } = await run(
        process.execPath,
        [...nodeFlags, '--import', 'tsx', inRoot(...script), ...args],
        { cwd: inRoot(), env: { ...process.env, ...surroundings, ...env } },
      );
      process.exitCode = code;
    } finally {
      await shutdown.stop();
    }
  });
}
