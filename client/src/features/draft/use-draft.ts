import { useEffect, useMemo, useState } from 'react';
import type { DesignPrediction, DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { Problem } from '#shared/contract/problem.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { DesignEdit } from '../../bench/panel-props.ts';
import { useSession } from '../../lib/session.ts';
import type { SaveState } from './auto-saver.ts';
import { DeviceCopies } from './device-copy.ts';
import { draftRequests } from './draft-requests.ts';
import { DraftStore, type DraftView, type OpenDraft } from './draft-store.ts';
import type { PredictionOptions } from '../../engine/engine-answers.ts';
import type { Figures, PredictionFailure } from './predictor.ts';
import { deviceStorage, windowId } from './window-id.ts';
import { startPredictionEngine } from './prediction-engine.ts';

/** Everything the workbench knows of an open draft and can do to it. */
export interface DraftOnBench {
  status: 'open';
  document: DesignDocument;
  version: number;
  save: SaveState;
  /** False when the device keeps nothing: then an unsaved edit is lost with the page. */
  keptOnDevice: boolean;
  edit: (edit: DesignEdit) => void;
  undo: () => void;
  redo: () => void;
  canUndo: boolean;
  canRedo: boolean;
  /** What Undo would take back, in words; null with nothing to take back. */
  undoLabel: string | null;
  redoLabel: string | null;
  prediction: DesignPrediction | null;
  sensitivities: DesignSensitivities | null;
  /** The document that prediction and sensitivities belong to; they say nothing about any other. */
  predictionOf: DesignDocument | null;
  source: 'worker' | 'server' | null;
  /** Why the newest document has no figures. */
  predictionFailure: PredictionFailure | null;
  /** This device and the server disagree by so many cents; null while they agree, as they must. */
  mismatchCents: number | null;
  predictionOptions: PredictionOptions;
  choosePredictionOptions: (options: PredictionOptions) => void;
  settle: (document: DesignDocument, label: string) => void;
}

export type UseDraft =
  | { status: 'loading' }
  | { status: 'unreachable'; retry: () => void }
  | { status: 'refused'; problem: Problem }
  | DraftOnBench;

interface Shown {
  designId: number;
  store: DraftStore;
  view: DraftView;
}

/** Opens the draft of a design and keeps it safe until the page closes it. */
export function useDraft(designId: number): UseDraft {
  const { person } = useSession();
  const [shown, setShown] = useState<Shown | null>(null);
  useEffect(() => {
    const store = new DraftStore({
      api: draftRequests(designId),
      copies: new DeviceCopies(deviceStorage()),
      place: { personId: person.id, designId, windowId: windowId() },
      engine: startPredictionEngine(),
      isOnline: () => navigator.onLine,
      now: () => new Date(),
      onBroken: reportError,
    });
    const unsubscribe = store.subscribe(() => setShown({ designId, store, view: store.getView() }));
    void store.open();
    const stopWatching = watchPage(store);
    return () => {
      stopWatching();
      unsubscribe();
      store.close();
    };
  }, [designId, person.id]);
  return useMemo(() => onBench(designId, shown), [designId, shown]);
}

function onBench(designId: number, shown: Shown | null): UseDraft {
  // Between two designs, the last one's draft is not the new one's.
  if (shown?.designId !== designId) return { status: 'loading' };
  const { store, view } = shown;
  if (view.status === 'unreachable') return { ...view, retry: () => void store.open() };
  return view.status === 'open' ? openOnBench(store, view) : view;
}

function openOnBench(store: DraftStore, view: OpenDraft): DraftOnBench {
  const { history, predictor } = view;
  return {
    status: 'open',
    document: history.present,
    version: view.version,
    save: view.save,
    keptOnDevice: view.keptOnDevice,
    edit: store.edit,
    undo: store.undo,
    redo: store.redo,
    canUndo: history.past.length > 0,
    canRedo: history.future.length > 0,
    undoLabel: history.past.at(-1)?.label ?? null,
    redoLabel: history.future.at(-1)?.label ?? null,
    ...shownFigures(predictor.figures),
    predictionFailure: predictor.failure,
    mismatchCents: predictor.mismatchCents,
    predictionOptions: predictor.options,
    choosePredictionOptions: store.chooseOptions,
    settle: store.settle,
  };
}

function shownFigures(figures: Figures | null) {
  if (figures === null) return { prediction: null, sensitivities: null, predictionOf: null, source: null };
  const { prediction, sensitivities, of, source } = figures;
  return { prediction, sensitivities, predictionOf: of, source };
}

/** Lets the store know when the line comes back, the page comes to the front, or goes away. */
function watchPage(store: DraftStore): () => void {
  const watch = new AbortController();
  const { signal } = watch;
  window.addEventListener('online', () => void store.lineBack(), { signal });
  // Captured, so that no handler on the way can keep the end of a drag from the store.
  window.addEventListener('pointerdown', () => store.holdRun(), { signal, capture: true });
  window.addEventListener('pointerup', () => store.releaseRun(), { signal, capture: true });
  window.addEventListener('pointercancel', () => store.releaseRun(), { signal, capture: true });
  window.addEventListener('pagehide', () => store.leave(), { signal });
  document.addEventListener(
    'visibilitychange',
    () => {
      if (document.visibilityState === 'hidden') store.leave();
      else void store.refresh();
    },
    { signal },
  );
  window.addEventListener(
    'beforeunload',
    (event) => {
      // The device's copy makes the question needless, save where the device keeps none.
      const view = store.getView();
      if (view.status === 'open' && !view.keptOnDevice && view.save.status !== 'saved')
        event.preventDefault();
    },
    { signal },
  );
  return () => watch.abort();
}
