import type { DesignDocument, ToneHole } from './design-document.ts';

export interface LabelledHole {
  hole: ToneHole;
  /** Place in `document.holes`: what document paths count by. */
  index: number;
  /** What stands over the hole: its own short name, else 1, 2, 3… from the mouth end, T for a thumb hole, V for a vent. */
  label: string;
  /** Heading and spoken name: `Hole 4`, `Thumb hole`. */
  title: string;
}

/** A name longer than this does not fit over a hole. */
const SHORT_NAME = 3;

const LETTERED: Partial<Record<ToneHole['cover'], { letter: string; title: string }>> = {
  thumb: { letter: 'T', title: 'Thumb hole' },
  vent: { letter: 'V', title: 'Vent hole' },
};

/** The holes from the mouth end to the foot, with what they are called. */
export function labelledHoles(document: DesignDocument): LabelledHole[] {
  const counts = new Map<string, number>();
  const next = (kind: string) => {
    const count = (counts.get(kind) ?? 0) + 1;
    counts.set(kind, count);
    return count;
  };
  return document.holes
    .map((hole, index) => ({ hole, index }))
    .sort((a, b) => a.hole.positionMm - b.hole.positionMm)
    .map(({ hole, index }) => ({ hole, index, ...labelOf(hole, next) }));
}

function labelOf(hole: ToneHole, next: (kind: string) => number): { label: string; title: string } {
  const lettered = LETTERED[hole.cover];
  const count = next(lettered?.letter ?? 'finger');
  const own = hole.name.length <= SHORT_NAME ? hole.name : '';
  if (lettered !== undefined) {
    const which = own === '' && count > 1 ? String(count) : own.replace(lettered.letter, '');
    return {
      label: own === '' ? `${lettered.letter}${which}` : own,
      title: `${lettered.title} ${which}`.trim(),
    };
  }
  const label = own === '' ? String(count) : own;
  return { label, title: `Hole ${hole.name === '' ? label : hole.name}` };
}

/** What a maker calls one hole: `Hole 4`, `Thumb hole`. */
export function holeTitle(document: DesignDocument, id: string): string {
  return labelledHoles(document).find(({ hole }) => hole.id === id)?.title ?? `Hole ${id}`;
}
