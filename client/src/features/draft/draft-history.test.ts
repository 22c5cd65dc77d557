import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { DesignEdit } from '../../bench/panel-props.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { UNDO_STEPS, redone, sealed, startHistory, undone, withEdit } from './draft-history.ts';

const warmTo = (temperatureC: number, mergeKey?: string): DesignEdit => ({
  label: `Air ${temperatureC}`,
  change: (document) => ({ ...document, air: { ...document.air, temperatureC } }),
  ...(mergeKey === undefined ? {} : { mergeKey }),
});

const rename = (name: string): DesignEdit => ({
  label: 'Rename',
  change: (document) => ({ ...document, name }),
});

const anyEdit = fc.oneof(
  fc.integer({ min: 0, max: 40 }).map((celsius) => warmTo(celsius)),
  fc.string({ minLength: 1, maxLength: 5 }).map(rename),
  fc.constant<DesignEdit>({
    label: 'Take hole 1 out',
    change: (document) => ({ ...document, holes: document.holes.slice(1) }),
  }),
);

const undoTimes = (history: ReturnType<typeof startHistory>, times: number) =>
  Array.from({ length: times }).reduce<typeof history>((state) => undone(state), history);

describe('draft history', () => {
  it('comes back to the very document after undoing any row of edits, and forward again', () => {
    fc.assert(
      fc.property(fc.array(anyEdit, { maxLength: 30 }), (edits) => {
        const start = startHistory(whistleDocument());
        const edited = edits.reduce(withEdit, start);
        const back = undoTimes(edited, edits.length);
        expect(back.present).toBe(start.present);
        const forward = edits.reduce((state) => redone(state), back);
        expect(forward.present).toBe(edited.present);
      }),
    );
  });

  it('makes one step of a drag, whatever the number of moves', () => {
    const start = startHistory(whistleDocument());
    const dragged = [20, 21, 22.5].map((celsius) => warmTo(celsius, 'drag-1')).reduce(withEdit, start);
    expect(dragged.past).toHaveLength(1);
    expect(dragged.present.air.temperatureC).toBe(22.5);
    expect(undone(dragged).present).toBe(start.present);
  });

  it.each([
    ['another key', [warmTo(20, 'drag-1'), warmTo(21, 'drag-2')]],
    ['an edit without key between', [warmTo(20, 'drag-1'), rename('A'), warmTo(21, 'drag-1')]],
  ])('begins a new step after %s', (_case, edits) => {
    const history = edits.reduce(withEdit, startHistory(whistleDocument()));
    expect(history.past).toHaveLength(edits.length);
  });

  it('begins a new step with the same key once the run is sealed or a step was undone', () => {
    const first = withEdit(startHistory(whistleDocument()), warmTo(20, 'drag-1'));
    expect(withEdit(sealed(first), warmTo(21, 'drag-1')).past).toHaveLength(2);
    const second = withEdit(sealed(first), warmTo(21, 'drag-1'));
    expect(withEdit(undone(second), warmTo(23, 'drag-1')).past).toHaveLength(2);
  });

  it('keeps the newest 200 steps', () => {
    const start = startHistory(whistleDocument());
    const edits = Array.from({ length: UNDO_STEPS + 30 }, (_, index) => rename(`Name ${index}`));
    const history = edits.reduce(withEdit, start);
    expect(history.past).toHaveLength(200);
    expect(undoTimes(history, 500).present.name).toBe('Name 29');
  });

  it('forgets what could be redone once something new is done', () => {
    const history = withEdit(undone(withEdit(startHistory(whistleDocument()), rename('A'))), rename('B'));
    expect(history.future).toHaveLength(0);
    expect(redone(history)).toBe(history);
  });

  it('takes no step for an edit that changes nothing', () => {
    const start = startHistory(whistleDocument());
    expect(withEdit(start, { label: 'Nothing', change: (document) => document })).toBe(start);
  });
});
