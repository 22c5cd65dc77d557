import { releaseProxy, wrap, type Remote } from 'comlink';
import type { EngineWorker } from './engine-worker.ts';

export interface RunningEngine {
  remote: Remote<EngineWorker>;
  close: () => void;
}

/** The engine in a worker of its own; closing ends the worker. */
export function startEngine(name: string): RunningEngine {
  const worker = new Worker(new URL('./engine-worker.ts', import.meta.url), { type: 'module', name });
  // A worker that cannot load answers nothing at all: without this the page would wait in silence.
  worker.addEventListener('error', ({ error, message }) => reportError(error ?? new Error(message)));
  const remote = wrap<EngineWorker>(worker);
  return {
    remote,
    close: () => {
      remote[releaseProxy]();
      worker.terminate();
    },
  };
}
