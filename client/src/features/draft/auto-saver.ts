import type { Draft } from '#shared/contract/designs.ts';
import type { Problem } from '#shared/contract/problem.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { isSameDocument } from './document-changes.ts';
import type { DraftApi, SaveOutcome } from './draft-api.ts';

/** How the newest document stands with the server; what the header shows. */
export type SaveState =
  | { status: 'saved'; at: string }
  | { status: 'saving' }
  /** Kept on this device until somebody answers again. */
  | { status: 'waiting'; since: string }
  | { status: 'refused'; problem: Problem }
  /** Somebody else saved meanwhile; `ancestor` is what both started from. */
  | { status: 'conflict'; newer: Draft; ancestor: DesignDocument };

/** The stored draft that the edits build on. */
export interface SaverBase {
  document: DesignDocument;
  version: number;
  savedAt: string;
  /** Documents sent whose answer never came: the server may have taken one of them. */
  unanswered: readonly DesignDocument[];
  waitingSince: string | null;
}

/** Quiet time after the last change before it is sent, ms. */
export const SAVE_AFTER_MS = 600;
/** Waits between attempts while nobody answers, ms; the last one repeats. */
const RETRY_AFTER_MS = [2000, 5000, 10_000, 20_000, 30_000] as const;
/** So many unanswered documents are remembered. */
const UNANSWERED_KEPT = 5;

export interface AutoSaverDeps {
  api: Pick<DraftApi, 'save'>;
  isOnline: () => boolean;
  now: () => Date;
  /** Called whenever state or base changed. */
  onChange: () => void;
  onSaved: (document: DesignDocument, version: number) => void;
}

/** Sends the newest document once it has been quiet for a moment, one request at a time, until the server has it. */
export class AutoSaver {
  state: SaveState;
  private newest: DesignDocument;
  private sending = false;
  private closed = false;
  private attempts = 0;
  private timer: ReturnType<typeof setTimeout> | undefined;

  constructor(
    private readonly deps: AutoSaverDeps,
    public base: SaverBase,
    newest: DesignDocument,
  ) {
    this.newest = newest;
    this.state =
      newest === base.document ? { status: 'saved', at: base.savedAt } : this.unsavedState(base.waitingSince);
    if (newest !== base.document) this.schedule(0);
  }

  changed(document: DesignDocument): void {
    this.newest = document;
    if (this.state.status === 'conflict' || this.sending) return;
    if (document === this.base.document) this.settle();
    else {
      this.state = this.unsavedState(this.base.waitingSince);
      this.schedule(SAVE_AFTER_MS);
    }
    this.deps.onChange();
  }

  /** Now instead of in a moment: the line is back, or the page goes away. */
  async sendNow({ leaving = false } = {}): Promise<void> {
    clearTimeout(this.timer);
    const document = this.newest;
    if (this.closed || this.sending || this.state.status === 'conflict') return;
    if (document === this.base.document) return;
    if (!this.deps.isOnline()) {
      this.wait();
      return;
    }
    this.sending = true;
    this.base = {
      ...this.base,
      unanswered: [...this.base.unanswered, document].slice(-UNANSWERED_KEPT),
    };
    this.deps.onChange();
    const outcome = await this.deps.api.save({ document, version: this.base.version, leaving });
    this.sending = false;
    this.answered(document, outcome);
  }

  /** Takes another stored draft as what the edits build on: after a conflict, or when somebody saved in between. */
  rebase(base: SaverBase, newest: DesignDocument): void {
    this.base = base;
    this.newest = newest;
    this.state = { status: 'saving' };
    if (newest === this.base.document) this.settle();
    else this.schedule(0);
    this.deps.onChange();
  }

  close(): void {
    this.closed = true;
    clearTimeout(this.timer);
  }

  private answered(document: DesignDocument, outcome: SaveOutcome): void {
    if (this.closed) return;
    if (outcome.status === 'saved') this.saved(document, outcome.draft);
    else if (outcome.status === 'newer') this.overtaken(outcome.newer);
    else if (outcome.status === 'no-line') this.wait();
    else {
      this.attempts = 0;
      this.base = { ...this.base, unanswered: [] };
      this.state = { status: 'refused', problem: outcome.problem };
      // What was refused is not sent again; what was typed meanwhile is.
      if (this.newest !== document) this.changed(this.newest);
    }
    this.deps.onChange();
  }

  private saved(document: DesignDocument, draft: Draft): void {
    this.base = { ...baseOf(draft), document };
    this.goOn();
    this.deps.onSaved(document, draft.version);
  }

  private overtaken(newer: Draft): void {
    const own = [this.newest, ...this.base.unanswered].find((sent) => isSameDocument(sent, newer.document));
    if (own === undefined) {
      this.state = { status: 'conflict', newer, ancestor: this.base.document };
      return;
    }
    // Our own document, saved by a request whose answer was lost.
    this.base = { ...baseOf(newer), document: own };
    this.goOn();
    this.deps.onSaved(own, newer.version);
  }

  private goOn(): void {
    this.attempts = 0;
    if (this.newest === this.base.document) this.settle();
    else {
      this.state = { status: 'saving' };
      this.schedule(SAVE_AFTER_MS);
    }
  }

  private settle(): void {
    clearTimeout(this.timer);
    this.base = { ...this.base, waitingSince: null };
    this.state = { status: 'saved', at: this.base.savedAt };
  }

  private wait(): void {
    const since = this.base.waitingSince ?? this.deps.now().toISOString();
    this.base = { ...this.base, waitingSince: since };
    this.state = { status: 'waiting', since };
    this.schedule(RETRY_AFTER_MS[Math.min(this.attempts, RETRY_AFTER_MS.length - 1)] ?? 0);
    this.attempts += 1;
    this.deps.onChange();
  }

  private unsavedState(waitingSince: string | null): SaveState {
    return waitingSince === null ? { status: 'saving' } : { status: 'waiting', since: waitingSince };
  }

  private schedule(afterMs: number): void {
    clearTimeout(this.timer);
    if (this.closed) return;
    this.timer = setTimeout(() => void this.sendNow(), afterMs);
  }
}

export function baseOf(draft: Draft): SaverBase {
  return {
    document: draft.document,
    version: draft.version,
    savedAt: draft.savedAt,
    unanswered: [],
    waitingSince: null,
  };
}
