import { z } from 'zod';
import { designDocumentSchema, type DesignDocument } from '#shared/document/design-document.ts';
import { applyChanges, changesBetween, type PathChange } from './document-changes.ts';
import { UNDO_STEPS, type DraftHistory, type HistoryStep } from './draft-history.ts';

/** What of a draft stays on the device: enough to go on after a reload, a crash or a lost line. */
export interface DeviceCopy {
  history: DraftHistory;
  /** The version of the stored draft that the edits build on. */
  baseVersion: number;
  /** When that version was saved, as the server said. */
  savedAt: string;
  /** The document of that version: what the edits started from, and what tells mine from theirs in a conflict. */
  base: DesignDocument;
  /** Documents sent whose answer never came. */
  unanswered: readonly DesignDocument[];
  /** Since when edits wait for the line; null while they do not. */
  waitingSince: string | null;
}

const changeSchema = z.object({
  path: z.array(z.union([z.string(), z.number()])),
  value: z.unknown(),
});
const stepSchema = z.object({ label: z.string(), changes: z.array(changeSchema) });

const writtenSchema = z.object({
  format: z.literal('borewright-device-copy/1'),
  document: z.unknown(),
  baseVersion: z.int(),
  savedAt: z.string(),
  /** From the present back to the stored document; empty once the server has everything. */
  baseChanges: z.array(changeSchema),
  unanswered: z.array(z.array(changeSchema)),
  waitingSince: z.string().nullable(),
  writtenAt: z.number(),
  past: z.array(stepSchema),
  future: z.array(stepSchema),
});

type Written = z.infer<typeof writtenSchema>;

/** Where copies lie: one person, one design, one window. Two windows never write over each other's copy. */
export interface CopyPlace {
  personId: number;
  designId: number;
  windowId: string;
}

const shelfOf = (place: CopyPlace) => `borewright.draft.${place.personId}.${place.designId}.`;
const keyOf = (place: CopyPlace) => shelfOf(place) + place.windowId;

export class DeviceCopies {
  /** @param storage - null where the browser refuses to keep anything */
  constructor(private readonly storage: Storage | null) {}

  /**
   * Writes the copy at once; when the device is full, with as much of the undo steps as fits.
   *
   * @returns false when not even the document fits, and the person has to be told
   */
  write(place: CopyPlace, copy: DeviceCopy): boolean {
    if (this.storage === null) return false;
    for (let steps = UNDO_STEPS; ; steps = Math.floor(steps / 2)) {
      try {
        this.storage.setItem(keyOf(place), JSON.stringify(toWritten(copy, steps)));
        return true;
      } catch (error) {
        if (!isFull(error)) throw error;
        if (steps === 0) return false;
      }
    }
  }

  /**
   * The copy to go on from: this window's own, else one with unsaved edits that a closed window left behind.
   * A copy taken over moves to this window, so that it is not taken over a second time.
   */
  read(place: CopyPlace): DeviceCopy | null {
    const own = this.readKey(keyOf(place));
    if (own !== null) return fromWritten(own);
    const left = this.keysOf(place)
      .map((key) => ({ key, written: this.readKey(key) }))
      .filter(
        (entry): entry is { key: string; written: Written } => (entry.written?.baseChanges.length ?? 0) > 0,
      )
      .sort((a, b) => b.written.writtenAt - a.written.writtenAt)[0];
    if (left === undefined) return null;
    this.storage?.removeItem(left.key);
    const copy = fromWritten(left.written);
    if (copy !== null) this.write(place, copy);
    return copy;
  }

  private keysOf(place: CopyPlace): string[] {
    const { storage } = this;
    if (storage === null) return [];
    const keys = Array.from({ length: storage.length }, (_, index) => storage.key(index));
    return keys.filter((key): key is string => key?.startsWith(shelfOf(place)) === true);
  }

  private readKey(key: string): Written | null {
    const text = this.storage?.getItem(key);
    if (text === null || text === undefined) return null;
    const read = writtenSchema.safeParse(readJson(text));
    return read.success ? read.data : null;
  }
}

function readJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    // Half written by a crash: as good as no copy. What the server has is not touched.
    return null;
  }
}

const isFull = (error: unknown) => error instanceof DOMException && error.name === 'QuotaExceededError';

function toWritten(copy: DeviceCopy, steps: number): Written {
  const { history } = copy;
  return {
    format: 'borewright-device-copy/1',
    document: history.present,
    baseVersion: copy.baseVersion,
    savedAt: copy.savedAt,
    baseChanges: changesBetween(history.present, copy.base),
    unanswered: copy.unanswered.map((sent) => changesBetween(history.present, sent)),
    waitingSince: copy.waitingSince,
    writtenAt: Date.now(),
    past: steps === 0 ? [] : chained(history.present, history.past.slice(-steps)),
    future: steps === 0 ? [] : chained(history.present, history.future.slice(-steps)),
  };
}

/** Each step as what changes from the step nearer to the present: whole documents would fill the device. */
function chained(present: DesignDocument, steps: readonly HistoryStep[]): Written['past'] {
  return steps.map((step, index) => ({
    label: step.label,
    changes: changesBetween(steps[index + 1]?.document ?? present, step.document),
  }));
}

function unchained(present: DesignDocument, written: Written['past']): HistoryStep[] {
  let nearer = present;
  return written
    .toReversed()
    .map((step) => {
      nearer = applyChanges(nearer, step.changes as PathChange[]);
      return { label: step.label, document: nearer };
    })
    .reverse();
}

/** The same object where nothing differs, so that a saved draft is known by identity. */
function documentBefore(present: DesignDocument, changes: Written['baseChanges']): DesignDocument {
  return applyChanges(present, changes as PathChange[]);
}

function fromWritten(written: Written): DeviceCopy | null {
  const { document } = written;
  if (!hasShapeOfDocument(document)) return null;
  return {
    history: {
      present: document,
      past: unchained(document, written.past),
      future: unchained(document, written.future),
      openMergeKey: null,
    },
    baseVersion: written.baseVersion,
    savedAt: written.savedAt,
    base: documentBefore(document, written.baseChanges),
    unanswered: written.unanswered.map((changes) => documentBefore(document, changes)),
    waitingSince: written.waitingSince,
  };
}

/** Figures out of range are kept, for what was typed stays; a document of another shape is not one of ours. */
function hasShapeOfDocument(value: unknown): value is DesignDocument {
  const parsed = designDocumentSchema.safeParse(value);
  const foreign = ['invalid_type', 'invalid_union', 'invalid_value', 'unrecognized_keys'];
  return parsed.success || !parsed.error.issues.some((issue) => foreign.includes(issue.code));
}
