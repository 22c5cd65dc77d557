import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { DeviceCopies, type CopyPlace, type DeviceCopy } from './device-copy.ts';
import { startHistory, undone, withEdit } from './draft-history.ts';
import { MemoryStorage } from '../../../../tests/support/memory-storage.ts';

const place: CopyPlace = { personId: 3, designId: 12, windowId: 'a' };

function editedCopy(names: readonly string[], changes: Partial<DeviceCopy> = {}): DeviceCopy {
  const history = names.reduce(
    (state, name) =>
      withEdit(state, { label: `Call it ${name}`, change: (document) => ({ ...document, name }) }),
    startHistory(whistleDocument()),
  );
  return {
    history,
    base: whistleDocument(),
    baseVersion: 7,
    savedAt: '2025-03-18T11:32:00Z',
    unanswered: [],
    waitingSince: null,
    ...changes,
  };
}

describe('copies on the device', () => {
  it('give back the document with its undo and redo steps', () => {
    const copies = new DeviceCopies(new MemoryStorage());
    const copy = editedCopy(['A', 'B', 'C']);
    const history = undone(copy.history);
    copies.write(place, { ...copy, history });
    expect(copies.read(place)).toEqual({ ...copy, history });
  });

  it('of two windows lie apart', () => {
    const copies = new DeviceCopies(new MemoryStorage());
    copies.write(place, editedCopy(['mine']));
    copies.write({ ...place, windowId: 'b' }, editedCopy(['theirs']));
    expect(copies.read(place)?.history.present.name).toBe('mine');
    expect(copies.read({ ...place, windowId: 'b' })?.history.present.name).toBe('theirs');
  });

  it('with unsaved edits of a closed window move to the window that opens the design', () => {
    const storage = new MemoryStorage();
    const copies = new DeviceCopies(storage);
    copies.write({ ...place, windowId: 'closed' }, editedCopy(['left behind']));
    expect(copies.read(place)?.history.present.name).toBe('left behind');
    expect(storage.length).toBe(1);
    expect(storage.key(0)).toBe('borewright.draft.3.12.a');
  });

  it.each([
    ['another person', { ...place, personId: 4, windowId: 'b' }],
    ['another design', { ...place, designId: 13, windowId: 'b' }],
    ['a design whose number begins alike', { ...place, designId: 1, windowId: 'b' }],
  ])('are not given to %s', (_who, other) => {
    const copies = new DeviceCopies(new MemoryStorage());
    copies.write(place, editedCopy(['mine']));
    expect(copies.read(other)).toBeNull();
  });

  it('that the server has already are not taken over', () => {
    const copies = new DeviceCopies(new MemoryStorage());
    const copy = editedCopy(['saved']);
    copies.write({ ...place, windowId: 'closed' }, { ...copy, base: copy.history.present });
    expect(copies.read(place)).toBeNull();
  });

  it('keep the document and drop old steps when the device is nearly full', () => {
    const names = Array.from({ length: 100 }, (_, index) => `Name ${index}`);
    const room = JSON.stringify(whistleDocument()).length + 2500;
    const copies = new DeviceCopies(new MemoryStorage(room));
    expect(copies.write(place, editedCopy(names))).toBe(true);
    const read = copies.read(place);
    expect(read?.history.present.name).toBe('Name 99');
    expect(read?.history.past.length).toBeGreaterThan(0);
    expect(read?.history.past.length).toBeLessThan(100);
  });

  it('come back saved as saved: base and present are one document', () => {
    const copies = new DeviceCopies(new MemoryStorage());
    const copy = editedCopy(['saved']);
    copies.write(place, { ...copy, base: copy.history.present });
    const read = copies.read(place);
    expect(read?.base).toBe(read?.history.present);
  });

  it('are not kept where the browser refuses', () => {
    const copies = new DeviceCopies(null);
    expect(copies.write(place, editedCopy(['A']))).toBe(false);
    expect(copies.read(place)).toBeNull();
  });

  it('say so when not even the document fits', () => {
    expect(new DeviceCopies(new MemoryStorage(100)).write(place, editedCopy(['A']))).toBe(false);
  });

  it.each([
    ['half written', '{"format":"borewright-device-c'],
    ['another format', '{"format":"something-else/1"}'],
    [
      'another shape',
      '{"format":"borewright-device-copy/1","document":{"holes":3},"baseVersion":1,"savedAt":"","baseChanges":[],"waitingSince":null,"unanswered":[],"writtenAt":1,"past":[],"future":[]}',
    ],
  ])('that are %s are left alone', (_what, text) => {
    const storage = new MemoryStorage();
    storage.setItem('borewright.draft.3.12.a', text);
    expect(new DeviceCopies(storage).read(place)).toBeNull();
  });

  it('keep a figure out of range, because what was typed stays', () => {
    const copies = new DeviceCopies(new MemoryStorage());
    const document = whistleDocument();
    const tooHot = { ...document, air: { ...document.air, temperatureC: 80 } };
    copies.write(place, { ...editedCopy([]), history: startHistory(tooHot) });
    expect(copies.read(place)?.history.present.air.temperatureC).toBe(80);
  });
});
