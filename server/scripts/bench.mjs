import { ensureClientBuilt } from './lib/client-build.mjs';
import { ensureChromium, ensureMariadb, findChromium } from './lib/debian.mjs';
import { startThrowAwayMariadb } from './lib/mariadb.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { inRoot } from './lib/paths.mjs';
import { run } from './lib/processes.mjs';
import { runLauncher } from './lib/refusal.mjs';
import { orderlyShutdown } from './lib/shutdown.mjs';

const shutdown = orderlyShutdown({ signalCode: 130 });

// Standard output carries the figures and nothing else; what the preparations have to say goes to standard error.
await runLauncher(async () => {
  try {
    await ensurePackages();
    await ensureMariadb();
    await ensureChromium();
    const database = await startThrowAwayMariadb();
    await shutdown.add(database.stop);
    const environment = {
      NODE_ENV: 'production',
      TEST_DATABASE_URL: database.url,
      BENCH_CLIENT: await ensureClientBuilt(),
      BENCH_CHROMIUM: findChromium(),
    };
    const { code } = await run(
      process.execPath,
      ['--expose-gc', '--import', 'tsx', inRoot('tests', 'bench', 'run-bench.ts')],
      {
        cwd: inRoot(),
        env: { ...process.env, ...environment },
      },
    );
    process.exitCode = code;
  } finally {
    await shutdown.stop();
  }
});
