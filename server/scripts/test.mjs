import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensureClientBuilt } from './lib/client-build.mjs';
import { ensureChromium, ensureMariadb } from './lib/debian.mjs';
import { startThrowAwayMariadb } from './lib/mariadb.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { inRoot } from './lib/paths.mjs';
import { stopGroup } from './lib/processes.mjs';
import { guardChildren } from './lib/guard.mjs';
import { runLauncher } from './lib/refusal.mjs';
import { orderlyShutdown } from './lib/shutdown.mjs';
import { addCounts, countReport, noCounts, printCounts } from './lib/vitest-report.mjs';

const LAYERS = ['unit', 'reference', 'api', 'e2e'];
const WITH_DATABASE = ['api', 'e2e'];

/** `npm test`, `npm test -- api`, `npm test -- api unit tests/api/session.test.ts -t refuses` */
function readCommand(words) {
  const layers = words.filter((word) => LAYERS.includes(word));
  const rest = words.filter((word) => !LAYERS.includes(word));
  return { layers: layers.length > 0 ? layers : LAYERS, rest };
}

async function prepare(layers, shutdown) {
  await ensurePackages();
  const environment = {};
  if (layers.some((layer) => WITH_DATABASE.includes(layer))) {
    await ensureMariadb();
    const database = await startThrowAwayMariadb();
    await shutdown.add(database.stop);
    environment.TEST_DATABASE_URL = database.url;
  }
  if (layers.includes('e2e')) {
    await ensureChromium();
    await ensureClientBuilt();
  }
  return environment;
}

async function runLayer(layer, { rest, environment, shutdown, reports }) {
  process.stdout.write(`\n${layer}\n`);
  const report = join(reports, `${layer}.json`);
  const child = spawn(
    process.execPath,
    [
      inRoot('node_modules', 'vitest', 'vitest.mjs'),
      'run',
      `--project=${layer}`,
      '--reporter=default',
      '--reporter=json',
      `--outputFile.json=${report}`,
      ...(rest.length > 0 ? ['--passWithNoTests'] : []),
      ...rest,
    ],
    {
      cwd: inRoot(),
      env: { ...process.env, ...environment, NODE_ENV: 'test' },
      stdio: ['ignore', 'inherit', 'inherit'],
      // A group of its own, workers included, so that all of it can be ended.
      detached: true,
    },
  );
  const disarm = guardChildren([child.pid], [reports]);
  await shutdown.add(() => stopGroup(child));
  const [code] = await once(child, 'exit');
  disarm();
  return countReport(report, code ?? 1);
}

/** A layer that ran nothing has not passed: somebody moved its files. A filter may well leave layers out. */
function refuseEmptyLayer(layer, counts, rest) {
  if (rest.length > 0 || counts.passed + counts.failed > 0) return counts;
  process.stderr.write(`No test ran in the layer ${layer}.\n`);
  return { ...counts, failed: 1 };
}

async function runLayers(shutdown) {
  const { layers, rest } = readCommand(process.argv.slice(2));
  const reports = mkdtempSync(join(tmpdir(), 'borewright-reports-'));
  await shutdown.add(() => rmSync(reports, { recursive: true, force: true }));
  const environment = await prepare(layers, shutdown);
  let total = noCounts();
  for (const layer of layers) {
    const counts = await runLayer(layer, { rest, environment, shutdown, reports });
    total = addCounts(total, refuseEmptyLayer(layer, counts, rest));
  }
  return total;
}

const shutdown = orderlyShutdown({ signalCode: 130 });

await runLauncher(async () => {
  try {
    const total = await runLayers(shutdown);
    await shutdown.stop();
    process.stdout.write(`\n${printCounts(total)}\n`);
    process.exitCode = total.failed > 0 || total.passed === 0 ? 1 : 0;
  } finally {
    await shutdown.stop();
  }
});
