import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';

const ENTRY = fileURLToPath(new URL('../../server/src/index.ts', import.meta.url));
const ROOT = fileURLToPath(new URL('../..', import.meta.url));

export interface ServerProcess {
  /** Where it answers; null when it ended instead, having said why on `stderr`. */
  address: string | null;
  stderr: () => string;
  signal: (name: 'SIGINT' | 'SIGTERM') => void;
  /** Resolves with the exit code. */
  ended: Promise<number | null>;
}

/** Starts the server as `npm start` does, and waits until it answers or ends. */
export async function runServer(environment: Record<string, string>): Promise<ServerProcess> {
  const child = spawn(process.execPath, ['--import', 'tsx', ENTRY], {
    cwd: ROOT,
    env: {
      PATH: process.env.PATH,
      PORT: '0',
      SESSION_SECRET: 'x'.repeat(40),
      BOREWRIGHT_DEMO: '0',
      ...environment,
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let stdout = '';
  let stderr = '';
  child.stderr.on('data', (chunk: Buffer) => (stderr += chunk.toString()));
  const ended = once(child, 'exit').then(([code]) => code as number | null);
  const address = new Promise<string>((resolve) => {
    child.stdout.on('data', (chunk: Buffer) => {
      stdout += chunk.toString();
      const match = /^Borewright answers at (\S+)$/m.exec(stdout);
      if (match !== null) resolve(match[1]!);
    });
  });
  return {
    address: await Promise.race([address, ended.then(() => null)]),
    stderr: () => stderr,
    signal: (name) => void child.kill(name),
    ended,
  };
}
