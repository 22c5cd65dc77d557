import { spawn } from 'node:child_process';

const TIDY_UP = `
  cat > /dev/null
  kill -s TERM -- $GROUPS_LEFT 2> /dev/null
  for second in 1 2 3 4 5 6 7 8 9 10; do
    kill -s 0 -- $GROUPS_LEFT 2> /dev/null || break
    sleep 1
  done
  for folder in "$@"; do rm -rf -- "$folder"; done`;

/**
 * A small process that outlives us for a moment: when we die without a chance to tidy up (SIGKILL, a crash), the pipe
 * to it closes, and it ends the children we left, with all that they started, and removes their scratch folders.
 *
 * @param leaders process numbers of children that lead groups of their own
 * @returns a function to call after an orderly stop
 */
export function guardChildren(leaders, scratchFolders = []) {
  const guard = spawn('/bin/sh', ['-c', TIDY_UP, 'borewright-guard', ...scratchFolders], {
    stdio: ['pipe', 'ignore', 'ignore'],
    env: { PATH: process.env.PATH, GROUPS_LEFT: leaders.map((pid) => -pid).join(' ') },
    detached: true,
  });
  guard.unref();
  guard.stdin.unref();
  return () => guard.kill('SIGKILL');
}
