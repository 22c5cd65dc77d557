import { ensureClientBuilt } from './lib/client-build.mjs';
import { prepareHome } from './lib/home.mjs';
import { runLauncher } from './lib/refusal.mjs';
import { startServer } from './lib/server-process.mjs';
import { orderlyShutdown } from './lib/shutdown.mjs';

const shutdown = orderlyShutdown();

await runLauncher(async () => {
  try {
    const { port, environment } = await prepareHome(shutdown, 'npm start');
    const pages = { STATIC_DIR: await ensureClientBuilt() };
    const quiet = { BOREWRIGHT_LOG_LEVEL: process.env.BOREWRIGHT_LOG_LEVEL ?? 'warn' };
    const server = await startServer(shutdown, { port, environment: { ...environment, ...pages, ...quiet } });
    if (server.status === 'ended') return await shutdown.leave(server.code);
    process.stdout.write(`Borewright is at http://127.0.0.1:${port} (Ctrl-C stops it)\n`);
    const [code] = await server.ended;
    if (!shutdown.isStopping()) await shutdown.leave(code ?? 1);
  } finally {
    await shutdown.stop();
  }
});
