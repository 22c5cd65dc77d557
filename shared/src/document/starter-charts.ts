import { transposeNote } from '../music/note-name.ts';
import type { Fingering, ToneHole } from './design-document.ts';

/** Semitones of a major scale above its lowest note. Common practice. */
const MAJOR_SCALE = [0, 2, 4, 5, 7, 9, 11, 12, 14] as const;

interface ChartOrder {
  lowestNote: string;
  /** In order from the mouth end; a thumb hole last. */
  holes: readonly ToneHole[];
}

type Pattern = Pick<Fingering, 'covered' | 'half'>;

function fingering(note: string, register: number, { covered, half }: Pattern): Fingering {
  const id = `f${register}-${note.toLowerCase().replace('#', 's')}`;
  return { id, note, register, covered, half, weight: 1, centsOffset: 0 };
}

/** The finger holes opened one by one from the foot: the plain scale of any such instrument. */
function openedFromFoot(holes: readonly ToneHole[], alwaysCovered: readonly ToneHole[] = []): string[][] {
  const fingers = holes.filter((hole) => !alwaysCovered.includes(hole));
  const thumbs = alwaysCovered.map((hole) => hole.id);
  return Array.from({ length: fingers.length + 1 }, (_, open) => [
    ...fingers.slice(0, fingers.length - open).map((hole) => hole.id),
    ...thumbs,
  ]);
}

/** Six holes, major scale, the same fingerings an octave up. Common practice. */
export function sixHoleChart({ lowestNote, holes }: ChartOrder): Fingering[] {
  const patterns = openedFromFoot(holes);
  return [1, 2].flatMap((register) =>
    patterns.map((covered, step) => {
      const semitones = (MAJOR_SCALE[step] ?? 0) + 12 * (register - 1);
      return fingering(transposeNote(lowestNote, semitones), register, { covered, half: [] });
    }),
  );
}

/** Seven holes and a thumb hole: the scale, then the notes above the octave with the thumb hole half-covered. Common practice. */
export function recorderChart({ lowestNote, holes }: ChartOrder): Fingering[] {
  const thumb = holes.filter((hole) => hole.cover === 'thumb');
  const patterns = openedFromFoot(holes, thumb).slice(0, -1);
  const plain = patterns.map((covered, step) =>
    fingering(transposeNote(lowestNote, MAJOR_SCALE[step] ?? 0), 1, { covered, half: [] }),
  );
  const pinched = patterns.slice(2, 6).map((covered, step) => {
    const semitones = 12 + (MAJOR_SCALE[step + 2] ?? 0);
    const fingers = covered.filter((id) => !thumb.some((hole) => hole.id === id));
    const half = thumb.map((hole) => ({ hole: hole.id, fraction: 0.85, from: 'end' as const }));
    return fingering(transposeNote(lowestNote, semitones), 2, { covered: fingers, half });
  });
  return [...plain, ...pinched];
}

/** Seven holes and a thumb hole, one register: a closed-end pipe over a ninth. Common practice. */
export function reedPipeChart({ lowestNote, holes }: ChartOrder): Fingering[] {
  const thumb = holes.filter((hole) => hole.cover === 'thumb');
  const patterns = [...openedFromFoot(holes, thumb), []];
  return patterns.map((covered, step) =>
    fingering(transposeNote(lowestNote, MAJOR_SCALE[step] ?? 0), 1, { covered, half: [] }),
  );
}
