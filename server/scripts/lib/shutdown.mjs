import { endRunningCommands, statOf } from './processes.mjs';

/**
 * What has to be stopped, last started first stopped; once, whoever asks.
 *
 * Ctrl-C, a terminal that closes and an npm that is gone all end in the same orderly stop.
 *
 * @param options `signalCode`: what the process then ends with
 */
export function orderlyShutdown({ signalCode = 0 } = {}) {
  const stops = [];
  let stopping = null;
  const stopAll = async () => {
    endRunningCommands();
    while (stops.length > 0) await stops.pop()();
  };
  const stop = () => (stopping ??= stopAll());
  const leave = (code) => stop().then(() => process.exit(code));
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => leave(signalCode));
  watchNpm(() => leave(signalCode));
  return {
    /** Whatever starts while we already stop is stopped at once. */
    add: async (stopOne) => {
      if (!stopping) return void stops.push(stopOne);
      await stopOne();
    },
    stop,
    leave,
    isStopping: () => stopping !== null,
  };
}

/** The npm that runs us: our parent, or with a shell in between our parent's parent. */
function npmAbove() {
  if (!process.env.npm_lifecycle_event) return null;
  const isNpm = (pid) => statOf(pid)?.name.startsWith('npm');
  return [process.ppid, statOf(process.ppid)?.parent].find(isNpm) ?? null;
}

/** An npm that is killed outright passes nothing on; we have to notice by ourselves. */
function watchNpm(onGone) {
  const npm = npmAbove();
  if (npm === null) return;
  const { beginning } = statOf(npm);
  const timer = setInterval(() => {
    if (statOf(npm)?.beginning === beginning) return;
    clearInterval(timer);
    onGone();
  }, 1000);
  timer.unref();
}
