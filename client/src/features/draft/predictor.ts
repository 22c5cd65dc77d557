import type { DesignPrediction, DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { StoredPrediction } from '#shared/contract/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { DocumentFault } from '#shared/document/fault-words.ts';
import type { PredictionOptions } from '../../engine/engine-answers.ts';
import type { PredictionEngine } from './prediction-engine.ts';
import { largestDifferenceCents } from './prediction-difference.ts';

/** Figures, and the document they belong to: never to be shown beside another one. */
export interface Figures {
  of: DesignDocument;
  prediction: DesignPrediction;
  /** Follow a moment later; null until then. */
  sensitivities: DesignSensitivities | null;
  source: 'worker' | 'server';
}

export interface PredictionFailure {
  of: DesignDocument;
  faults: DocumentFault[];
}

export interface PredictorState {
  /** The newest figures there are; after a failure those from before it. */
  figures: Figures | null;
  /** Why there are none for the newest document. */
  failure: PredictionFailure | null;
  /** Largest difference between this device's and the server's figures for one document, when they should be one. */
  mismatchCents: number | null;
  options: PredictionOptions;
}

/** Quiet time before the sensitivities are worked out, ms: they cost many predictions. */
const SENSITIVITIES_AFTER_MS = 120;
/** Same engine, same document: more than this apart is a fault of ours, cents. */
const SAME_WITHIN_CENTS = 0.01;

/** Keeps figures beside the newest document: one question on the way, and only the newest document waits. */
export class Predictor {
  state: PredictorState = {
    figures: null,
    failure: null,
    mismatchCents: null,
    options: { coupling: true },
  };
  private waiting: DesignDocument | null = null;
  private newest: DesignDocument | null = null;
  private busy = false;
  private closed = false;
  private timer: ReturnType<typeof setTimeout> | undefined;

  constructor(
    private readonly engine: PredictionEngine,
    private readonly onChange: () => void,
    private readonly onBroken: (error: unknown) => void,
  ) {}

  ask(document: DesignDocument): void {
    if (document === this.newest) return;
    this.newest = document;
    this.waiting = document;
    clearTimeout(this.timer);
    void this.work();
  }

  choose(options: PredictionOptions): void {
    this.state = { ...this.state, options };
    this.waiting = this.newest;
    clearTimeout(this.timer);
    void this.work();
    this.onChange();
  }

  /** The server's answer for a document takes the place of this device's, and is held against it. */
  takeStored(document: DesignDocument, stored: StoredPrediction): void {
    const { figures, options } = this.state;
    if (figures?.of !== document || !options.coupling) return;
    const apart = largestDifferenceCents(figures.prediction, stored.prediction);
    this.state = {
      ...this.state,
      mismatchCents: apart > SAME_WITHIN_CENTS ? apart : null,
      figures: {
        of: document,
        prediction: stored.prediction,
        sensitivities: stored.sensitivities,
        source: 'server',
      },
    };
    this.onChange();
  }

  close(): void {
    this.closed = true;
    clearTimeout(this.timer);
    this.engine.close();
  }

  private async work(): Promise<void> {
    if (this.busy) return;
    this.busy = true;
    try {
      while (this.waiting !== null && !this.isClosed()) await this.predict(this.waiting);
    } catch (error) {
      // Not an outcome but a fault of the program: the figures go, so that none stands beside a newer drawing.
      if (!this.isClosed()) this.broken(error);
    } finally {
      this.busy = false;
    }
  }

  private async predict(document: DesignDocument): Promise<void> {
    this.waiting = null;
    const { options } = this.state;
    const answer = await this.engine.predict(document, options);
    if (this.isClosed() || options !== this.state.options) return;
    if (answer.status === 'failed') {
      this.state = { ...this.state, failure: { of: document, faults: answer.faults } };
    } else {
      const { prediction } = answer;
      this.state = {
        ...this.state,
        failure: null,
        figures: { of: document, prediction, sensitivities: null, source: 'worker' },
      };
      if (document === this.newest) this.timer = setTimeout(() => void this.refine(), SENSITIVITIES_AFTER_MS);
    }
    this.onChange();
  }

  private async refine(): Promise<void> {
    const { figures } = this.state;
    if (figures?.sensitivities !== null || this.busy) return;
    this.busy = true;
    try {
      const sensitivities = await this.engine.sensitivities(figures.of);
      if (this.isClosed() || this.state.figures !== figures) return;
      this.state = { ...this.state, figures: { ...figures, sensitivities } };
      this.onChange();
    } catch (error) {
      if (!this.isClosed()) this.broken(error);
    } finally {
      this.busy = false;
    }
    void this.work();
  }

  private broken(error: unknown): void {
    if (this.newest === null) return;
    const message = 'The figures could not be worked out here. The sizes are kept. Load the page again.';
    this.state = { ...this.state, failure: { of: this.newest, faults: [{ path: [], message }] } };
    this.onChange();
    this.onBroken(error);
  }

  private isClosed(): boolean {
    return this.closed;
  }
}
