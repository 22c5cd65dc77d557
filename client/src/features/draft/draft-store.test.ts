import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Draft } from '#shared/contract/designs.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { DesignEdit } from '../../bench/panel-props.ts';
import { MemoryStorage } from '../../../../tests/support/memory-storage.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { DeviceCopies } from './device-copy.ts';
import type { DraftApi, LoadOutcome, PredictOutcome, SaveOutcome, SaveRequest } from './draft-api.ts';
import { DraftStore, type OpenDraft } from './draft-store.ts';
import type { PredictionEngine } from './prediction-engine.ts';

const rename = (name: string): DesignEdit => ({
  label: 'Rename',
  change: (document) => ({ ...document, name }),
});
const warm = (temperatureC: number): DesignEdit => ({
  label: 'Warm the air',
  change: (document) => ({ ...document, air: { ...document.air, temperatureC } }),
});

/** One workshop with one draft, reached by any number of windows. */
class Workshop implements DraftApi {
  draft = draftOf(whistleDocument({ name: 'stored' }), 1, 'Ines Varrow');
  reachable = true;
  saves = 0;

  load = (): Promise<LoadOutcome> =>
    Promise.resolve(this.reachable ? { status: 'loaded', draft: this.draft } : { status: 'no-line' });

  save = ({ document, version }: SaveRequest): Promise<SaveOutcome> => {
    if (!this.reachable) return Promise.resolve({ status: 'no-line' });
    if (version !== this.draft.version) return Promise.resolve({ status: 'newer', newer: this.draft });
    this.saves += 1;
    this.draft = draftOf(structuredClone(document), version + 1, 'Ines Varrow');
    return Promise.resolve({ status: 'saved', draft: this.draft });
  };

  predict = (): Promise<PredictOutcome> =>
    Promise.resolve({
      status: 'predicted',
      stored: {
        draftVersion: this.draft.version,
        documentHash: 'aa',
        computedAt: this.draft.savedAt,
        prediction: { engine: 'server', notices: [], fingerings: [] },
        sensitivities: { engine: 'server', fingerings: [] },
      },
    });

  saveByOther(document: DesignDocument) {
    this.draft = draftOf(document, this.draft.version + 1, 'Bryn Askell');
  }
}

function draftOf(document: DesignDocument, version: number, name: string): Draft {
  return { designId: 12, version, savedAt: '2025-03-18T11:32:00Z', savedBy: { id: 2, name }, document };
}

const engine = (): PredictionEngine => ({
  predict: () =>
    Promise.resolve({ status: 'predicted', prediction: { engine: 'worker', notices: [], fingerings: [] } }),
  sensitivities: () => Promise.resolve({ engine: 'worker', fingerings: [] }),
  close: () => undefined,
});

let workshop: Workshop;
let storage: MemoryStorage;

function openWindow(windowId = 'a') {
  return new DraftStore({
    api: workshop,
    copies: new DeviceCopies(storage),
    place: { personId: 1, designId: 12, windowId },
    engine: engine(),
    isOnline: () => true,
    now: () => new Date('2025-03-18T14:06:00Z'),
    onBroken: (error) => {
      throw error;
    },
  });
}

function opened(store: DraftStore): OpenDraft {
  const view = store.getView();
  if (view.status !== 'open') throw new Error(`The draft is ${view.status}.`);
  return view;
}

const settleDown = () => vi.advanceTimersByTimeAsync(5000);
const nameIn = (store: DraftStore) => opened(store).history.present.name;

beforeEach(() => {
  vi.useFakeTimers();
  workshop = new Workshop();
  storage = new MemoryStorage();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('an open draft', () => {
  it('saves by itself, counts versions, and takes the server’s figures', async () => {
    const store = openWindow();
    await store.open();
    store.edit(rename('mine'));
    expect(opened(store).save.status).toBe('saving');
    await settleDown();
    expect(workshop.draft.document.name).toBe('mine');
    expect(opened(store)).toMatchObject({ version: 2, save: { status: 'saved' } });
    expect(opened(store).predictor.figures).toMatchObject({ source: 'server' });
    expect(opened(store).predictor.figures?.of).toBe(opened(store).history.present);
  });

  it('ends a run of merging edits after a pause', async () => {
    const store = openWindow();
    await store.open();
    store.edit({ ...rename('a'), mergeKey: 'name' });
    store.edit({ ...rename('ab'), mergeKey: 'name' });
    await settleDown();
    store.edit({ ...rename('abc'), mergeKey: 'name' });
    expect(opened(store).history.past).toHaveLength(2);
  });

  it('makes one step of a drag in which the hand rested, and a new one of the next drag', async () => {
    const store = openWindow();
    await store.open();
    const drag = (name: string) => store.edit({ ...rename(name), mergeKey: 'name' });
    store.holdRun();
    drag('a');
    await settleDown();
    drag('ab');
    store.releaseRun();
    expect(opened(store).history.past).toHaveLength(1);
    await settleDown();
    store.holdRun();
    drag('abc');
    expect(opened(store).history.past).toHaveLength(2);
    store.undo();
    store.undo();
    expect(nameIn(store)).toBe('stored');
  });

  it('comes back after a reload with its undo steps', async () => {
    const before = openWindow();
    await before.open();
    before.edit(rename('one'));
    before.edit(rename('two'));
    await settleDown();
    before.close();
    const after = openWindow();
    await after.open();
    expect(opened(after).save.status).toBe('saved');
    after.undo();
    expect(nameIn(after)).toBe('one');
    after.undo();
    expect(nameIn(after)).toBe('stored');
    await settleDown();
    expect(workshop.draft.document.name).toBe('stored');
  });

  it('loses nothing when the browser dies a tenth of a second after an edit', async () => {
    const before = openWindow();
    await before.open();
    before.edit(rename('just typed'));
    await vi.advanceTimersByTimeAsync(100);
    const after = openWindow();
    await after.open();
    expect(nameIn(after)).toBe('just typed');
    await settleDown();
    expect(workshop.draft.document.name).toBe('just typed');
    expect(opened(after).save.status).toBe('saved');
  });

  it('opens from the device without a line, and sends what waited once it is back', async () => {
    const before = openWindow();
    await before.open();
    workshop.reachable = false;
    before.edit(rename('offline'));
    await settleDown();
    expect(opened(before).save).toEqual({ status: 'waiting', since: '2025-03-18T14:06:00.000Z' });
    before.close();
    const after = openWindow();
    await after.open();
    expect(nameIn(after)).toBe('offline');
    expect(opened(after).save.status).toBe('waiting');
    workshop.reachable = true;
    await after.lineBack();
    expect(workshop.draft.document.name).toBe('offline');
    expect(opened(after).save.status).toBe('saved');
  });

  it('says that it cannot be reached when this device has never seen it', async () => {
    workshop.reachable = false;
    const store = openWindow();
    await store.open();
    expect(store.getView()).toEqual({ status: 'unreachable' });
    workshop.reachable = true;
    await store.lineBack();
    expect(nameIn(store)).toBe('stored');
  });

  it('tells when the device is full', async () => {
    storage = new MemoryStorage(10);
    const store = openWindow();
    await store.open();
    expect(opened(store).keptOnDevice).toBe(false);
  });
});

describe('two windows on one draft', () => {
  it('show what the other saved when there is nothing unsent, as a step that can be undone', async () => {
    const store = openWindow();
    await store.open();
    workshop.saveByOther(whistleDocument({ name: 'theirs' }));
    await store.refresh();
    expect(nameIn(store)).toBe('theirs');
    expect(opened(store).history.past.at(-1)?.label).toBe('Changes saved by Bryn Askell');
    await settleDown();
    expect(workshop.saves).toBe(0);
  });

  async function conflict() {
    const store = openWindow();
    await store.open();
    workshop.saveByOther(whistleDocument({ name: 'theirs' }));
    store.edit(warm(30));
    await settleDown();
    expect(opened(store).save.status).toBe('conflict');
    return store;
  }

  it('never write over each other silently', async () => {
    const store = await conflict();
    expect(workshop.draft.document.name).toBe('theirs');
    store.edit(rename('typed on'));
    expect(opened(store).history.present.air.temperatureC).toBe(30);
    expect(nameIn(store)).toBe('stored');
  });

  it('keep mine', async () => {
    const store = await conflict();
    store.settle(opened(store).history.present, 'Kept mine');
    await settleDown();
    expect(workshop.draft).toMatchObject({
      version: 3,
      document: { name: 'stored', air: { temperatureC: 30 } },
    });
    expect(opened(store).save.status).toBe('saved');
  });

  it('take theirs, and can go back to mine', async () => {
    const store = await conflict();
    store.settle(structuredClone(workshop.draft.document), 'Took theirs');
    await settleDown();
    expect(workshop.draft.version).toBe(2);
    expect(nameIn(store)).toBe('theirs');
    store.undo();
    await settleDown();
    expect(workshop.draft.document).toMatchObject({ name: 'stored', air: { temperatureC: 30 } });
  });

  it('merge', async () => {
    const store = await conflict();
    store.settle({ ...workshop.draft.document, air: opened(store).history.present.air }, 'Merged');
    await settleDown();
    expect(workshop.draft.document).toMatchObject({ name: 'theirs', air: { temperatureC: 30 } });
    expect(opened(store).save.status).toBe('saved');
  });

  it('still stand side by side after a reload', async () => {
    const store = await conflict();
    store.close();
    const after = openWindow();
    await after.open();
    await settleDown();
    const { save, history } = opened(after);
    expect(save).toMatchObject({ status: 'conflict', newer: { document: { name: 'theirs' } } });
    expect(history.present.air.temperatureC).toBe(30);
    expect(save.status === 'conflict' && save.ancestor.name).toBe('stored');
  });
});
