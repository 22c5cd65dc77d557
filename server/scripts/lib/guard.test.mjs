import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { commandLineOf } from './processes.mjs';

/** Starts two processes in a group, has them guarded, says who they are, and dies without a word. */
const CARELESS = `
  import { spawn } from 'node:child_process';
  import { guardChildren } from '${new URL('./guard.mjs', import.meta.url).href}';
  const script = 'sleep 1000 & echo $!; wait';
  const leader = spawn('/bin/sh', ['-c', script], { detached: true, stdio: ['ignore', 'pipe', 'ignore'] });
  guardChildren([leader.pid], [process.argv[1]]);
  leader.stdout.once('data', (below) => {
    process.stdout.write(leader.pid + ' ' + below, () => process.kill(process.pid, 'SIGKILL'));
  });
`;

it('ends what a killed launcher left, whatever that had started itself, and its scratch folder', async () => {
  const folder = mkdtempSync(join(tmpdir(), 'borewright-guard-test-'));
  const launcher = spawn(process.execPath, ['--input-type=module', '--eval', CARELESS, folder]);
  const [written] = await once(launcher.stdout, 'data');
  const pids = String(written).trim().split(' ').map(Number);
  expect(pids).toHaveLength(2);
  await expect.poll(() => pids.map(commandLineOf), { timeout: 15_000 }).toEqual([null, null]);
  await expect.poll(() => existsSync(folder), { timeout: 15_000 }).toBe(false);
}, 30_000);
