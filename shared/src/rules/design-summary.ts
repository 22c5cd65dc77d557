import type { DesignPrediction, FingeringPrediction } from '../analysis/prediction.ts';
import type { DesignSummary } from '../contract/designs.ts';
import type { DesignDocument, Station } from '../document/design-document.ts';
import { boreEnds } from '../document/profile.ts';
import { midiNumber, readNoteName } from '../music/note-name.ts';

/** What a row of the rack draws and says of a design's newest state. */
export type RackView = Pick<DesignSummary, 'outline' | 'plumb' | 'furthest1' | 'furthest2'>;

/** At the rack's scale more points than this fall on the same pixels. */
const MOST_OUTLINE_POINTS = 60;

export function rackView(document: DesignDocument, prediction: DesignPrediction): RackView {
  const { mouthMm, footMm } = boreEnds(document);
  const register = (number: number) =>
    prediction.fingerings.filter((fingering) => fingering.register === number).flatMap(sounding);
  return {
    outline: {
      mouthEndKind: document.mouthEnd.kind,
      mouthMm,
      footMm,
      outside: thinned(document.outside.stations),
      holes: document.holes.map(({ id, positionMm, diameterMm, angleDeg }) => ({
        id,
        positionMm,
        diameterMm,
        angleDeg,
      })),
    },
    plumb: register(1).map(({ ventHole, cents }) => ({ ventHole, cents })),
    furthest1: furthest(register(1)),
    furthest2: furthest(register(2)),
  };
}

interface SoundingNote {
  note: string;
  ventHole: string | null;
  cents: number;
}

function sounding({ note, ventHole, centsFromScale }: FingeringPrediction): SoundingNote[] {
  return centsFromScale === null ? [] : [{ note, ventHole, cents: centsFromScale }];
}

function furthest(notes: readonly SoundingNote[]): DesignSummary['furthest1'] {
  const [first, ...others] = notes;
  if (first === undefined) return null;
  const far = others.reduce((a, b) => (Math.abs(b.cents) > Math.abs(a.cents) ? b : a), first);
  return { note: far.note, cents: far.cents };
}

function thinned(stations: readonly Station[]): Station[] {
  if (stations.length <= MOST_OUTLINE_POINTS) return [...stations];
  const step = (stations.length - 1) / (MOST_OUTLINE_POINTS - 1);
  const kept = new Set(Array.from({ length: MOST_OUTLINE_POINTS }, (_, index) => Math.round(index * step)));
  return stations.filter((_, index) => kept.has(index));
}

/** The lowest note of the fingering chart, with its keyboard number; null without fingerings. */
export function lowestNote(document: DesignDocument): { name: string; midi: number } | null {
  const notes = document.fingerings.flatMap(({ note }) => {
    const read = readNoteName(note);
    return read === null ? [] : [{ name: note, midi: midiNumber(read) }];
  });
  const [first, ...others] = notes;
  return first === undefined ? null : others.reduce((a, b) => (b.midi < a.midi ? b : a), first);
}
