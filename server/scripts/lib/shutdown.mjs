import { endRunningCommands } from './processes.mjs';

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

/** An npm that is killed outright passes nothing on; we notice by our parent changing. */
function watchNpm(onGone) {
  if (!process.env.npm_lifecycle_event) return;
  const parent = process.ppid;
  const timer = setInterval(() => {
    if (process.ppid === parent) return;
    clearInterval(timer);
    onGone();
  }, 1000);
  timer.unref();
}
