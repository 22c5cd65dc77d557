import { releaseProxy, wrap, type Remote } from 'comlink';
import type { EngineWorker } from './engine-worker.ts';

export interface RunningEngine {
  remote: Remote<EngineWorker>;
  close: () => void;
}

/** The engine in a worker of its own; closing ends the worker. */
export function startEngine(name: string): RunningEngine {
  const worker = new Worker(new URL('./engine-worker.ts', import.meta.url), { type: 'module', name });
  const remote = wrap<EngineWorker>(worker);
  return {
    remote,
    close: () => {
      remote[releaseProxy]();
      worker.terminate();
    },
  };
}
