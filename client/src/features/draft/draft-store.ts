import type { Draft } from '#shared/contract/designs.ts';
import type { Problem } from '#shared/contract/problem.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { DesignEdit } from '../../bench/panel-props.ts';
import { AutoSaver, baseOf, type SaveState, type SaverBase } from './auto-saver.ts';
import type { CopyPlace, DeviceCopies, DeviceCopy } from './device-copy.ts';
import { isSameDocument } from './document-changes.ts';
import type { DraftApi } from './draft-api.ts';
import { redone, sealed, startHistory, undone, withEdit, type DraftHistory } from './draft-history.ts';
import type { PredictionOptions } from '../../engine/engine-answers.ts';
import type { PredictionEngine } from './prediction-engine.ts';
import { Predictor, type PredictorState } from './predictor.ts';

export interface OpenDraft {
  status: 'open';
  history: DraftHistory;
  version: number;
  save: SaveState;
  predictor: PredictorState;
  /** False when the device is full: then only the server keeps what is typed. */
  keptOnDevice: boolean;
}

export type DraftView =
  { status: 'loading' } | { status: 'unreachable' } | { status: 'refused'; problem: Problem } | OpenDraft;

export interface DraftStoreDeps {
  api: DraftApi;
  copies: DeviceCopies;
  place: CopyPlace;
  engine: PredictionEngine;
  isOnline: () => boolean;
  now: () => Date;
  onBroken: (error: unknown) => void;
}

/** A pause this long ends a run of edits that merge into one step, ms. */
const SEAL_AFTER_MS = 1000;
/** Writing the copy waits this long, so that a drag does not write with every frame, ms. Leaving the page does not wait. */
const COPY_AFTER_MS = 100;

/** One open draft: its document and history, its way to the server, its copy on the device, its figures. */
export class DraftStore {
  private view: DraftView = { status: 'loading' };
  private readonly listeners = new Set<() => void>();
  private readonly predictor: Predictor;
  private saver: AutoSaver | null = null;
  private history: DraftHistory | null = null;
  private keptOnDevice = true;
  private sealTimer: ReturnType<typeof setTimeout> | undefined;
  private copyTimer: ReturnType<typeof setTimeout> | undefined;
  private runIsHeld = false;
  private closed = false;

  constructor(private readonly deps: DraftStoreDeps) {
    this.predictor = new Predictor(deps.engine, () => this.publish(), deps.onBroken);
  }

  subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  getView = (): DraftView => this.view;

  /** Fetches the stored draft and lays this device's unsent edits over it; without a line, the device's copy alone. */
  async open(): Promise<void> {
    const copy = this.deps.copies.read(this.deps.place);
    const outcome = await this.deps.api.load();
    if (this.closed) return;
    if (outcome.status === 'loaded') this.start(...openingOf(outcome.draft, copy));
    else if (outcome.status === 'refused') this.show({ status: 'refused', problem: outcome.problem });
    else if (copy === null) this.show({ status: 'unreachable' });
    else this.start(copy.history, baseOfCopy(copy));
  }

  edit = (edit: DesignEdit): void => {
    if (this.history === null || this.isInConflict()) return;
    this.become(withEdit(this.history, edit));
    this.sealAfterPause();
  };

  /** While a pointer is down a run goes on, however long the hand rests: one drag is one step. */
  holdRun(): void {
    this.runIsHeld = true;
    clearTimeout(this.sealTimer);
  }

  releaseRun(): void {
    this.runIsHeld = false;
    this.sealAfterPause();
  }

  undo = (): void => {
    if (this.history !== null && !this.isInConflict()) this.become(undone(this.history));
  };

  redo = (): void => {
    if (this.history !== null && !this.isInConflict()) this.become(redone(this.history));
  };

  chooseOptions = (options: PredictionOptions): void => this.predictor.choose(options);

  /** Settles a conflict with one document, of which every word was chosen; it is one step and can be undone. */
  settle = (document: DesignDocument, label: string): void => {
    const { saver, history } = this;
    if (saver?.state.status !== 'conflict' || history === null) return;
    const { newer } = saver.state;
    const settled = isSameDocument(document, newer.document) ? newer.document : document;
    this.history = isSameDocument(settled, history.present)
      ? { ...history, present: settled }
      : withEdit(history, { label, change: () => settled });
    saver.rebase(baseOf(newer), settled);
    this.predictor.ask(settled);
    this.keepCopy();
    this.publish();
  };

  /** Looks whether somebody else saved while this window was away; with nothing unsent, theirs is simply shown. */
  async refresh(): Promise<void> {
    if (this.saver === null) return this.open();
    if (this.saver.state.status === 'waiting') return this.saver.sendNow();
    if (this.saver.state.status !== 'saved') return;
    const outcome = await this.deps.api.load();
    const { saver, history } = this;
    if (outcome.status !== 'loaded' || this.closed || history === null) return;
    if (saver.state.status !== 'saved' || outcome.draft.version <= saver.base.version) return;
    const [merged, base] = openingOf(outcome.draft, copyOf(saver.base, history));
    this.history = merged;
    saver.rebase(base, merged.present);
    this.predictor.ask(merged.present);
    this.keepCopy();
    this.publish();
  }

  /** The line is back: send what waits, or open what could not be fetched. */
  lineBack(): Promise<void> {
    return this.saver === null ? this.open() : this.saver.sendNow();
  }

  /** The page may be gone in a moment: the copy is written now, and the newest document sent. */
  leave(): void {
    this.keepCopy();
    void this.saver?.sendNow({ leaving: true });
  }

  close(): void {
    this.leave();
    this.closed = true;
    clearTimeout(this.sealTimer);
    clearTimeout(this.copyTimer);
    this.saver?.close();
    this.predictor.close();
  }

  private sealAfterPause(): void {
    clearTimeout(this.sealTimer);
    if (this.runIsHeld || this.closed) return;
    this.sealTimer = setTimeout(() => {
      if (this.history !== null) this.history = sealed(this.history);
    }, SEAL_AFTER_MS);
  }

  private isInConflict(): boolean {
    return this.saver?.state.status === 'conflict';
  }

  private start(history: DraftHistory, base: SaverBase): void {
    this.history = history;
    this.saver = new AutoSaver(
      {
        api: this.deps.api,
        isOnline: this.deps.isOnline,
        now: this.deps.now,
        onChange: () => {
          this.keepCopy();
          this.publish();
        },
        onSaved: (document) => void this.predictStored(document),
      },
      base,
      history.present,
    );
    this.predictor.ask(history.present);
    this.keepCopy();
    this.publish();
  }

  private become(history: DraftHistory): void {
    if (history === this.history) return;
    this.history = history;
    this.predictor.ask(history.present);
    clearTimeout(this.copyTimer);
    this.copyTimer = setTimeout(() => {
      if (this.keepCopy()) this.publish();
    }, COPY_AFTER_MS);
    this.saver?.changed(history.present);
    this.publish();
  }

  /** Returns whether it became known or unknown that the device keeps the copy. */
  private keepCopy(): boolean {
    clearTimeout(this.copyTimer);
    if (this.history === null || this.saver === null || this.closed) return false;
    const before = this.keptOnDevice;
    this.keptOnDevice = this.deps.copies.write(this.deps.place, copyOf(this.saver.base, this.history));
    return before !== this.keptOnDevice;
  }

  private async predictStored(document: DesignDocument): Promise<void> {
    const outcome = await this.deps.api.predict();
    // Without an answer this device's figures stand; they are asked for again with the next save.
    if (outcome.status !== 'predicted' || this.closed) return;
    if (outcome.stored.draftVersion === this.saver?.base.version)
      this.predictor.takeStored(document, outcome.stored);
  }

  private publish(): void {
    const { history, saver } = this;
    if (history === null || saver === null || this.closed) return;
    this.show({
      status: 'open',
      history,
      version: saver.base.version,
      save: saver.state,
      predictor: this.predictor.state,
      keptOnDevice: this.keptOnDevice,
    });
  }

  private show(view: DraftView): void {
    this.view = view;
    this.listeners.forEach((listener) => listener());
  }
}

function copyOf(base: SaverBase, history: DraftHistory): DeviceCopy {
  return {
    history,
    base: base.document,
    baseVersion: base.version,
    savedAt: base.savedAt,
    unanswered: base.unanswered,
    waitingSince: base.waitingSince,
  };
}

function baseOfCopy(copy: DeviceCopy): SaverBase {
  return {
    document: copy.base,
    version: copy.baseVersion,
    savedAt: copy.savedAt,
    unanswered: copy.unanswered,
    waitingSince: copy.waitingSince,
  };
}

/** What to go on with: the stored draft, this device's history, and what both say about unsent edits. */
function openingOf(draft: Draft, copy: DeviceCopy | null): [DraftHistory, SaverBase] {
  const fresh = baseOf(draft);
  if (copy === null) return [startHistory(draft.document), fresh];
  const { history } = copy;
  if (isSameDocument(history.present, draft.document))
    return [history, { ...fresh, document: history.present }];
  if (copy.base === history.present) {
    const change = () => draft.document;
    return [withEdit(history, { label: `Changes saved by ${draft.savedBy.name}`, change }), fresh];
  }
  // Unsent edits: sent on their own base. If the server has moved on, it answers with the newer draft, and both are shown.
  return [history, baseOfCopy(copy)];
}
