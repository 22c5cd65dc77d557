import { availableParallelism } from 'node:os';
import { Piscina } from 'piscina';
import type { DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { HttpError } from '../http/http-error.ts';

/** Longest that one request may keep a thread, or wait for one, ms. A six-hole whistle takes some 50. */
const PATIENCE_MS = 20_000;

/**
 * Threads for what the engine cannot answer in a few milliseconds.
 *
 * A prediction takes one and stays in the request. The cents of every dimension grow with stations times notes: at
 * the document's limits they would hold up everyone else's requests for most of a minute.
 */
export class EnginePool {
  readonly #patienceMs: number;
  #threads: Piscina | undefined;

  constructor(patienceMs = PATIENCE_MS) {
    this.#patienceMs = patienceMs;
  }

  /** @throws HttpError 422 when it takes too long */
  async sensitivities(document: DesignDocument): Promise<DesignSensitivities> {
    const signal = AbortSignal.timeout(this.#patienceMs);
    try {
      return (await this.#started().run(document, { name: 'sensitivities', signal })) as DesignSensitivities;
    } catch (error) {
      if (!signal.aborted) throw error;
      throw tooMuchWork();
    }
  }

  async close(): Promise<void> {
    await this.#threads?.destroy();
  }

  /** Started by the first who needs it: a command that only reads pays nothing. */
  #started(): Piscina {
    this.#threads ??= new Piscina({
      filename: new URL('./engine-thread.mjs', import.meta.url).href,
      minThreads: 1,
      maxThreads: Math.max(1, availableParallelism() - 1),
    });
    return this.#threads;
  }
}

function tooMuchWork(): HttpError {
  const message =
    'The cents of every dimension take too long for this many stations and fingerings. The draft and its prediction are saved. Use fewer stations.';
  return new HttpError(422, 'too-much-work', 'Too much to work out', {
    detail: message,
    errors: [{ path: 'document.bore.stations', message }],
  });
}
