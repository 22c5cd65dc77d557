import type { DesignDocument, Fingering, ToneHole } from '#shared/document/design-document.ts';
import { transposeNote } from '#shared/music/note-name.ts';
import { holeMark } from '../../bench/fingering-marks.ts';

/** A finger that lies over half the hole, when nothing else is said. */
const HALF = { fraction: 0.5, from: 'side' } as const;

export function changeFingering(
  document: DesignDocument,
  id: string,
  change: (fingering: Fingering) => Fingering,
): DesignDocument {
  return {
    ...document,
    fingerings: document.fingerings.map((fingering) => (fingering.id === id ? change(fingering) : fingering)),
  };
}

/** One tap further: open, covered, half covered, open. A vent hole stays as it is. */
export function tapped(fingering: Fingering, hole: ToneHole): Fingering {
  const covered = fingering.covered.filter((id) => id !== hole.id);
  const half = fingering.half.filter((entry) => entry.hole !== hole.id);
  switch (holeMark(fingering, hole)) {
    case 'never':
      return fingering;
    case 'open':
      return { ...fingering, covered: [...covered, hole.id], half };
    case 'covered':
      return { ...fingering, covered, half: [...half, { hole: hole.id, ...HALF }] };
    case 'half':
      return { ...fingering, covered, half };
  }
}

/** A new fingering after the chosen one, a semitone above it, fingered alike; on an empty chart all holes covered. */
export function addFingering(
  document: DesignDocument,
  afterId: string | null,
): { document: DesignDocument; id: string } {
  const after = document.fingerings.find(({ id }) => id === afterId) ?? document.fingerings.at(-1);
  const fresh: Fingering = {
    ...(after ?? emptyFingering(document)),
    id: unusedId(document),
    ...(after === undefined ? {} : { note: noteAbove(after.note) }),
  };
  return { document: inserted(document, after?.id ?? null, fresh), id: fresh.id };
}

export function duplicateFingering(
  document: DesignDocument,
  id: string,
): { document: DesignDocument; id: string } {
  const original = document.fingerings.find((fingering) => fingering.id === id);
  if (original === undefined) return { document, id };
  const copy = { ...original, id: unusedId(document) };
  return { document: inserted(document, id, copy), id: copy.id };
}

export function removeFingering(document: DesignDocument, id: string): DesignDocument {
  return { ...document, fingerings: document.fingerings.filter((fingering) => fingering.id !== id) };
}

function inserted(document: DesignDocument, afterId: string | null, fingering: Fingering): DesignDocument {
  const at = document.fingerings.findIndex(({ id }) => id === afterId);
  const place = at < 0 ? document.fingerings.length : at + 1;
  return { ...document, fingerings: document.fingerings.toSpliced(place, 0, fingering) };
}

/** The highest octave that a note name can carry ends the chart: there the same note is offered again. */
function noteAbove(note: string): string {
  return note.endsWith('9') ? note : transposeNote(note, 1);
}

function emptyFingering(document: DesignDocument): Fingering {
  return {
    id: '',
    note: `${document.pitch.tonic}4`,
    register: 1,
    covered: document.holes.filter(({ cover }) => cover !== 'vent').map(({ id }) => id),
    half: [],
    weight: 1,
    centsOffset: 0,
  };
}

function unusedId(document: DesignDocument): string {
  const taken = new Set(document.fingerings.map(({ id }) => id));
  let number = document.fingerings.length + 1;
  while (taken.has(`f${number}`)) number += 1;
  return `f${number}`;
}
