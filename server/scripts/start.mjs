import { ensureClientBuilt } from './lib/client-build.mjs';
import { demoSignIns } from './lib/demo-sign-ins.mjs';
import { prepareHome } from './lib/home.mjs';
import { runLauncher } from './lib/refusal.mjs';
import { startServer } from './lib/server-process.mjs';
import { orderlyShutdown } from './lib/shutdown.mjs';

const shutdown = orderlyShutdown();

await runLauncher(async () => {
  try {
    const { port, environment } = await prepareHome(shutdown, 'npm start');
    const pages = { STATIC_DIR: await ensureClientBuilt() };
    const server = await startServer(shutdown, { port, environment: { ...environment, ...pages } });
    if (server.status === 'ended') return await shutdown.leave(server.code);
    process.stdout.write(`${demoSignIns(process.env)}Ctrl-C stops Borewright; what you made is kept.\n`);
    const [code] = await server.ended;
    if (!shutdown.isStopping()) await shutdown.leave(code ?? 1);
  } finally {
    await shutdown.stop();
  }
});
