import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { accessSync, constants, readFileSync } from 'node:fs';
import { delimiter, join } from 'node:path';

/** Full path of a program, also where Debian keeps servers that are not on a user's PATH. */
export function findProgram(...names) {
  const folders = [...(process.env.PATH ?? '').split(delimiter), '/usr/local/sbin', '/usr/sbin', '/usr/bin'];
  for (const name of names) {
    for (const folder of folders.filter(Boolean)) {
      const path = join(folder, name);
      try {
        accessSync(path, constants.X_OK);
        return path;
      } catch {
        continue;
      }
    }
  }
  return null;
}

const running = new Set();

/**
 * Runs a command to its end.
 *
 * @param {{ output?: 'show' | 'to-stderr' | 'keep', env?: object, cwd?: string }} options `show` lets the command write
 *   to our terminal, `keep` returns what it wrote
 */
export async function run(command, parameters, options = {}) {
  const { output = 'show', ...rest } = options;
  const stdio = {
    show: ['ignore', 'inherit', 'inherit'],
    'to-stderr': ['ignore', 2, 2],
    keep: ['ignore', 'pipe', 'pipe'],
  }[output];
  const child = spawn(command, parameters, { ...rest, stdio });
  running.add(child);
  let written = '';
  child.stdout?.on('data', (data) => (written += data));
  child.stderr?.on('data', (data) => (written += data));
  const [code, signal] = await once(child, 'close');
  running.delete(child);
  return { code: code ?? 1, signal, written };
}

/** For when we are told to stop in the middle of a command. */
export function endRunningCommands() {
  for (const child of running) child.kill('SIGTERM');
}

export const isAlive = (child) => child.exitCode === null && child.signalCode === null;

/** Asks a child to end, and ends it for good when it has not within the time. */
export async function stopChild(child, { signal = 'SIGTERM', patienceMs = 15_000 } = {}) {
  if (!isAlive(child)) return;
  const ended = once(child, 'exit');
  child.kill(signal);
  const timer = setTimeout(() => child.kill('SIGKILL'), patienceMs);
  await ended;
  clearTimeout(timer);
}

/** The same for a child that leads a group of its own, and for all that it started: a busy one heeds no polite request. */
export async function stopGroup(leader, { patienceMs = 5_000 } = {}) {
  const signalAll = (signal) => {
    try {
      process.kill(-leader.pid, signal);
    } catch (error) {
      // All of them have ended already.
      if (error.code !== 'ESRCH') throw error;
    }
  };
  signalAll('SIGTERM');
  await until(() => !isAlive(leader), { timeoutMs: patienceMs });
  signalAll('SIGKILL');
}

/** The command line of a running process, or null when there is none (or it is a zombie). */
export function commandLineOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ').trim() || null;
  } catch {
    return null;
  }
}

/** Name, parent and moment of beginning of a process, or null when there is none (any more). */
export function statOf(pid) {
  try {
    const written = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The name stands in parentheses and may itself hold spaces and parentheses.
    const name = written.slice(written.indexOf('(') + 1, written.lastIndexOf(')'));
    const fields = written.slice(written.lastIndexOf(')') + 2).split(' ');
    return { name, parent: Number(fields[1]), beginning: fields[19] };
  } catch {
    return null;
  }
}

const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** Asks again and again until the answer is neither false nor null. */
export async function until(ask, { timeoutMs, everyMs = 50 }) {
  const deadline = Date.now() + timeoutMs;
  for (;;) {
    const answer = await ask();
    if (answer) return answer;
    if (Date.now() > deadline) return null;
    await pause(everyMs);
  }
}

/** Ends a process left over by a crashed run; `mark` must stand in its command line, so that a reused number is safe. */
export async function endLeftover(pid, mark) {
  const isOurs = () => commandLineOf(pid)?.includes(mark) ?? false;
  if (!Number.isInteger(pid) || !isOurs()) return;
  process.kill(pid, 'SIGTERM');
  if (!(await until(() => !isOurs(), { timeoutMs: 15_000 }))) process.kill(pid, 'SIGKILL');
  await until(() => !isOurs(), { timeoutMs: 5_000 });
}
