import { closeSync, existsSync, mkdirSync, openSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { VAR, inVar } from './paths.mjs';
import { statOf } from './processes.mjs';
import { Refusal } from './refusal.mjs';

const LOCK = inVar('running.json');

function readRunning() {
  try {
    return JSON.parse(readFileSync(LOCK, 'utf8'));
  } catch {
    // Absent, or cut off in the middle by a crash: either way nobody holds it.
    return null;
  }
}

/** A crashed run leaves its note behind; by now its number may belong to another program, begun at another moment. */
const isRunning = ({ pid, beginning }) => statOf(pid)?.beginning === beginning;

/**
 * Lets one launcher at a time run in this clone, since two would share one database folder.
 *
 * @returns a function that gives the place back
 */
export function takeTheOnlyPlace(port) {
  mkdirSync(VAR, { recursive: true });
  const running = readRunning();
  if (running && isRunning(running)) {
    throw new Refusal(
      `Borewright already runs in this folder at http://127.0.0.1:${running.port} (process ${running.pid}): use that, or stop it there with Ctrl-C first.`,
    );
  }
  if (existsSync(LOCK)) rmSync(LOCK);
  const file = openSync(LOCK, 'wx');
  writeFileSync(file, JSON.stringify({ pid: process.pid, beginning: statOf(process.pid)?.beginning, port }));
  closeSync(file);
  return () => rmSync(LOCK, { force: true });
}
