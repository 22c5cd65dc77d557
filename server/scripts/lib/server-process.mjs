import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { writeFileSync, existsSync, readFileSync, rmSync } from 'node:fs';
import { guardChildren } from './guard.mjs';
import { inRoot, inVar } from './paths.mjs';
import { endLeftover, isAlive, stopChild, until } from './processes.mjs';

const ENTRY = inRoot('server', 'src', 'index.ts');
const PID_FILE = inVar('server.pid');

async function isHealthy(port) {
  try {
    return (await fetch(`http://127.0.0.1:${port}/api/health`)).ok;
  } catch {
    // Not listening yet.
    return false;
  }
}

/** A run that was killed outright may have left its server on the port. */
export async function endLeftoverServer() {
  if (existsSync(PID_FILE)) await endLeftover(Number(readFileSync(PID_FILE, 'utf8')), ENTRY);
}

/**
 * Starts the API server and waits until it answers.
 *
 * @param settings port, environment, and `watch` to start anew when a source changes
 * @returns `{ status: 'up' }`, or `{ status: 'ended', code }` when it gave up and said why itself
 */
export async function startServer(shutdown, { port, environment, watch = false }) {
  const parameters = watch
    ? [inRoot('node_modules', 'tsx', 'dist', 'cli.mjs'), 'watch', '--clear-screen=false', ENTRY]
    : ['--import', 'tsx', ENTRY];
  // Its own process group, so that Ctrl-C reaches us alone and the order of stopping is ours.
  const child = spawn(process.execPath, parameters, {
    cwd: inRoot(),
    env: { ...process.env, ...environment, PORT: String(port) },
    stdio: ['ignore', 'inherit', 'inherit'],
    detached: true,
  });
  writeFileSync(PID_FILE, String(child.pid));
  const disarm = guardChildren([child.pid]);
  await shutdown.add(async () => {
    await stopChild(child);
    disarm();
    rmSync(PID_FILE, { force: true });
  });
  await until(async () => !isAlive(child) || (await isHealthy(port)), { timeoutMs: 120_000 });
  if (!isAlive(child)) return { status: 'ended', code: child.exitCode ?? 1 };
  return { status: 'up', ended: once(child, 'exit') };
}
