import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { demoSignIns } from './lib/demo-sign-ins.mjs';
import { guardChildren } from './lib/guard.mjs';
import { prepareHome } from './lib/home.mjs';
import { inRoot } from './lib/paths.mjs';
import { freePort } from './lib/ports.mjs';
import { stopChild } from './lib/processes.mjs';
import { runLauncher } from './lib/refusal.mjs';
import { startServer } from './lib/server-process.mjs';
import { orderlyShutdown } from './lib/shutdown.mjs';

const shutdown = orderlyShutdown();

async function startPages(port, apiPort) {
  const child = spawn(
    process.execPath,
    [inRoot('node_modules', 'vite', 'bin', 'vite.js'), '--port', String(port), '--clearScreen', 'false'],
    {
      cwd: inRoot(),
      env: { ...process.env, BOREWRIGHT_API: `http://127.0.0.1:${apiPort}` },
      stdio: ['ignore', 'inherit', 'inherit'],
      detached: true,
    },
  );
  const disarm = guardChildren([child.pid]);
  await shutdown.add(async () => {
    await stopChild(child);
    disarm();
  });
  return { ended: once(child, 'exit') };
}

await runLauncher(async () => {
  try {
    const { port, environment } = await prepareHome(shutdown, 'npm run dev');
    const apiPort = await freePort();
    const server = await startServer(shutdown, { port: apiPort, environment, watch: true });
    if (server.status === 'ended') return await shutdown.leave(server.code);
    const pages = await startPages(port, apiPort);
    process.stdout.write(`The pages are at http://127.0.0.1:${port}\n${demoSignIns(process.env)}`);
    const [code] = await Promise.race([server.ended, pages.ended]);
    if (!shutdown.isStopping()) await shutdown.leave(code ?? 1);
  } finally {
    await shutdown.stop();
  }
});
