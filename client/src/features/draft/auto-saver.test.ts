import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Draft } from '#shared/contract/designs.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { AutoSaver, baseOf, SAVE_AFTER_MS } from './auto-saver.ts';
import type { SaveOutcome, SaveRequest } from './draft-api.ts';

const named = (name: string) => whistleDocument({ name });

function draftOf(document: DesignDocument, version: number): Draft {
  return {
    designId: 1,
    version,
    savedAt: `2025-03-18T11:3${version}:00Z`,
    savedBy: { id: 2, name: 'Bryn Askell' },
    document,
  };
}

/** A server with one draft, that can be out of reach, lose its answers, or refuse. */
class FakeServer {
  draft = draftOf(named('stored'), 1);
  sent: SaveRequest[] = [];
  reachable = true;
  losesAnswer = false;
  refuses = false;
  private held: (() => void) | null = null;
  holds = false;

  save = async (request: SaveRequest): Promise<SaveOutcome> => {
    this.sent.push(request);
    if (this.holds) await new Promise<void>((resolve) => (this.held = resolve));
    if (!this.reachable) return { status: 'no-line' };
    if (this.refuses) {
      const problem = { type: 'about:blank', title: 'Refused', status: 422, detail: 'Hole 3 is 13.0.' };
      return { status: 'refused', problem };
    }
    if (request.version !== this.draft.version) return { status: 'newer', newer: this.draft };
    this.draft = draftOf(request.document, request.version + 1);
    return this.losesAnswer ? { status: 'no-line' } : { status: 'saved', draft: this.draft };
  };

  release() {
    this.holds = false;
    this.held?.();
  }
}

let server: FakeServer;
let online: boolean;
const saved = vi.fn<(document: DesignDocument, version: number) => void>();

function openSaver(newest?: DesignDocument) {
  const base = {
    document: server.draft.document,
    version: 1,
    savedAt: server.draft.savedAt,
    unanswered: [],
    waitingSince: null,
  };
  return new AutoSaver(
    {
      api: server,
      isOnline: () => online,
      now: () => new Date('2025-03-18T14:06:00Z'),
      onChange: () => undefined,
      onSaved: saved,
    },
    base,
    newest ?? base.document,
  );
}

const quiet = (ms = SAVE_AFTER_MS) => vi.advanceTimersByTimeAsync(ms);

beforeEach(() => {
  vi.useFakeTimers();
  server = new FakeServer();
  online = true;
  saved.mockClear();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('saving by itself', () => {
  it('sends only the newest document once it has been quiet', async () => {
    const saver = openSaver();
    for (const name of ['A', 'AB', 'ABC']) {
      saver.changed(named(name));
      await quiet(SAVE_AFTER_MS - 100);
    }
    expect(server.sent).toHaveLength(0);
    expect(saver.state.status).toBe('saving');
    await quiet();
    expect(server.sent.map((request) => request.document.name)).toEqual(['ABC']);
    expect(saver.state).toEqual({ status: 'saved', at: server.draft.savedAt });
    expect(saved).toHaveBeenCalledWith(server.sent[0]!.document, 2);
  });

  it('sends nothing when an edit was undone before it was sent', async () => {
    const saver = openSaver();
    saver.changed(named('A'));
    saver.changed(saver.base.document);
    await quiet();
    expect(server.sent).toHaveLength(0);
    expect(saver.state.status).toBe('saved');
  });

  it('never has two requests on the way, and sends what changed meanwhile next', async () => {
    const saver = openSaver();
    server.holds = true;
    saver.changed(named('first'));
    await quiet();
    saver.changed(named('second'));
    await quiet();
    expect(server.sent).toHaveLength(1);
    server.release();
    await quiet();
    expect(server.sent.map((request) => [request.document.name, request.version])).toEqual([
      ['first', 1],
      ['second', 2],
    ]);
    expect(saver.state.status).toBe('saved');
  });

  it('waits on the device while the line is down, keeps the time it dropped, and sends when it is back', async () => {
    const saver = openSaver();
    server.reachable = false;
    saver.changed(named('A'));
    await quiet();
    saver.changed(named('AB'));
    expect(saver.state).toEqual({ status: 'waiting', since: '2025-03-18T14:06:00.000Z' });
    await quiet(60_000);
    expect(saver.state.status).toBe('waiting');
    server.reachable = true;
    await saver.sendNow();
    expect(server.draft.document.name).toBe('AB');
    expect(saver.state.status).toBe('saved');
  });

  it('tries again by itself', async () => {
    const saver = openSaver();
    server.reachable = false;
    saver.changed(named('A'));
    await quiet(3000);
    server.reachable = true;
    await quiet(30_000);
    expect(saver.state.status).toBe('saved');
  });

  it('does not even try while the browser knows that there is no line', async () => {
    online = false;
    const saver = openSaver();
    saver.changed(named('A'));
    await quiet(10_000);
    expect(server.sent).toHaveLength(0);
    expect(saver.state.status).toBe('waiting');
  });

  it('keeps what was refused, says why, and sends the mended document', async () => {
    const saver = openSaver();
    server.refuses = true;
    saver.changed(named('too wide'));
    await quiet(60_000);
    expect(server.sent).toHaveLength(1);
    expect(saver.state).toMatchObject({ status: 'refused', problem: { detail: 'Hole 3 is 13.0.' } });
    server.refuses = false;
    saver.changed(named('mended'));
    await quiet();
    expect(saver.state.status).toBe('saved');
  });

  it('sends what was typed while a refusal was on its way', async () => {
    const saver = openSaver();
    server.holds = true;
    server.refuses = true;
    saver.changed(named('too wide'));
    await quiet();
    saver.changed(named('mended'));
    server.release();
    await quiet(0);
    server.refuses = false;
    await quiet();
    expect(server.draft.document.name).toBe('mended');
  });

  it('stops when somebody else saved, with both documents and what they started from', async () => {
    const saver = openSaver();
    const ancestor = saver.base.document;
    server.draft = draftOf(named('theirs'), 5);
    saver.changed(named('mine'));
    await quiet(60_000);
    expect(saver.state).toEqual({ status: 'conflict', newer: server.draft, ancestor });
    saver.changed(named('mine too'));
    await quiet(60_000);
    expect(server.sent).toHaveLength(1);
  });

  it('goes on from the newer draft once the conflict is settled', async () => {
    const saver = openSaver();
    server.draft = draftOf(named('theirs'), 5);
    saver.changed(named('mine'));
    await quiet();
    saver.rebase(baseOf(server.draft), named('merged'));
    await quiet(0);
    expect(server.sent.at(-1)).toMatchObject({ version: 5, document: { name: 'merged' } });
    expect(saver.state.status).toBe('saved');
  });

  it('knows its own document again when only the answer was lost', async () => {
    const saver = openSaver();
    server.losesAnswer = true;
    saver.changed(named('mine'));
    await quiet();
    expect(saver.state.status).toBe('waiting');
    saver.changed(named('mine, and more'));
    server.losesAnswer = false;
    await quiet(5000);
    expect(server.draft.document.name).toBe('mine, and more');
    expect(saver.state.status).toBe('saved');
  });

  it('sends edits that waited on the device as soon as it is opened', async () => {
    const saver = openSaver(named('from yesterday'));
    await quiet(0);
    expect(server.draft.document.name).toBe('from yesterday');
    expect(saver.state.status).toBe('saved');
  });

  it('marks the request of a page that goes away', async () => {
    const saver = openSaver();
    saver.changed(named('A'));
    await saver.sendNow({ leaving: true });
    expect(server.sent[0]?.leaving).toBe(true);
  });

  it('is silent once closed', async () => {
    const saver = openSaver();
    saver.changed(named('A'));
    saver.close();
    await quiet(60_000);
    expect(server.sent).toHaveLength(0);
  });
});
