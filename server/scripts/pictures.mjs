import { mkdir, rm } from 'node:fs/promises';
import { ensureClientBuilt } from './lib/client-build.mjs';
import { ensureChromium, ensureMariadb, findChromium } from './lib/debian.mjs';
import { startThrowAwayMariadb } from './lib/mariadb.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { inRoot } from './lib/paths.mjs';
import { run } from './lib/processes.mjs';
import { runLauncher } from './lib/refusal.mjs';
import { orderlyShutdown } from './lib/shutdown.mjs';

const shutdown = orderlyShutdown({ signalCode: 130 });

// Every screen and state, at three widths, by day and in the evening, for people to look at.
await runLauncher(async () => {
  try {
    await ensurePackages();
    await ensureMariadb();
    await ensureChromium();
    const database = await startThrowAwayMariadb();
    await shutdown.add(database.stop);
    const folder = inRoot('var', 'pictures');
    await rm(folder, { recursive: true, force: true });
    await mkdir(folder, { recursive: true });
    const environment = {
      NODE_ENV: 'production',
      TEST_DATABASE_URL: database.url,
      PICTURES_CLIENT: await ensureClientBuilt(),
      PICTURES_CHROMIUM: findChromium(),
      PICTURES_FOLDER: folder,
    };
    const script = inRoot('tests', 'pictures', 'take-pictures.ts');
    const { code } = await run(process.execPath, ['--import', 'tsx', script, ...process.argv.slice(2)], {
      cwd: inRoot(),
      env: { ...process.env, ...environment },
    });
    process.exitCode = code;
  } finally {
    await shutdown.stop();
  }
});
