import { predictDesign } from '../analysis/predict-design.ts';
import type { FingeringPrediction } from '../analysis/prediction.ts';
import type { DesignDocument, Fingering, ToneHole } from '../document/design-document.ts';
import { boreEnds } from '../document/profile.ts';

/** Least wood kept between two neighbouring holes while they are moved, mm. Common practice. */
const LEAST_WOOD_MM = 1.5;

export interface Placement {
  document: DesignDocument;
  /** Furthest of the notes placed, cents; null when nothing sounds. */
  furthestCents: number | null;
  rounds: number;
}

/**
 * Moves the foot and every hole until the register-1 note that each of them vents meets the scale; diameters stay.
 *
 * A chain of single corrections, from the foot upwards, repeated until no note is further off than `withinCents`: enough
 * for a first layout of a plain scale. Notes of other registers and cross-fingerings follow as they will.
 */
export function placeHoles(document: DesignDocument, { withinCents = 0.5, mostRounds = 15 } = {}): Placement {
  let placed = document;
  for (let round = 1; ; round += 1) {
    const notes = ventedNotes(placed);
    const furthest = furthestCents(notes);
    if (furthest === null || Math.abs(furthest) <= withinCents || round >= mostRounds) {
      return { document: rounded(placed), furthestCents: furthest, rounds: round };
    }
    placed = corrected(placed, notes);
  }
}

/** For every hole, and for the foot (null), the plainest register-1 fingering that vents there, with its prediction. */
function ventedNotes(document: DesignDocument): Map<string | null, FingeringPrediction> {
  const firsts = document.fingerings.filter(
    (fingering) => fingering.register === 1 && isPlain(document, fingering),
  );
  if (firsts.length === 0) return new Map();
  const { fingerings } = predictDesign({ ...document, fingerings: firsts }, { modes: 1 });
  const notes = new Map<string | null, FingeringPrediction>();
  for (const note of fingerings) if (!notes.has(note.ventHole)) notes.set(note.ventHole, note);
  return notes;
}

/** Every hole open from the vent down to the foot: no fork, nothing half-covered. */
function isPlain(document: DesignDocument, fingering: Fingering): boolean {
  if (fingering.half.length > 0) return false;
  const inOrder = document.holes.toSorted((a, b) => a.positionMm - b.positionMm);
  const covered = inOrder.map((hole) => fingering.covered.includes(hole.id));
  return covered.lastIndexOf(true) === covered.filter(Boolean).length - 1;
}

function furthestCents(notes: Map<string | null, FingeringPrediction>): number | null {
  let furthest: number | null = null;
  for (const { centsFromScale } of notes.values()) {
    if (centsFromScale === null) continue;
    if (furthest === null || Math.abs(centsFromScale) > Math.abs(furthest)) furthest = centsFromScale;
  }
  return furthest;
}

function corrected(document: DesignDocument, notes: Map<string | null, FingeringPrediction>): DesignDocument {
  const lengthened = moveFoot(document, shiftMm(document, notes.get(null)));
  const { mouthMm, footMm } = boreEnds(lengthened);
  let limit = footMm;
  const placed = lengthened.holes
    .toSorted((a, b) => b.positionMm - a.positionMm)
    .map((hole) => {
      const wanted = hole.positionMm + shiftMm(document, notes.get(hole.id));
      const most = limit - hole.diameterMm / 2 - LEAST_WOOD_MM;
      const positionMm = Math.max(Math.min(wanted, most), mouthMm + hole.diameterMm);
      // A thumb hole lies on the other side of the body and takes no wood from the finger holes.
      if (hole.cover !== 'thumb') limit = positionMm - hole.diameterMm / 2;
      return { ...hole, positionMm };
    });
  const byId = new Map(placed.map((hole): [string, ToneHole] => [hole.id, hole]));
  return { ...lengthened, holes: lengthened.holes.map((hole) => byId.get(hole.id) ?? hole) };
}

/** A note that is sharp by some cents wants an air column longer by the same share. */
function shiftMm(document: DesignDocument, note: FingeringPrediction | undefined): number {
  if (note?.centsFromScale === undefined || note.centsFromScale === null) return 0;
  const isClosedAtMouth = document.mouthEnd.kind === 'reed' || document.mouthEnd.kind === 'ideal-closed';
  const isClosedBelow = note.ventHole === null && document.foot.kind === 'stopped';
  const speedMmPerS = 345_000;
  const columnMm = speedMmPerS / (isClosedAtMouth === isClosedBelow ? 2 : 4) / note.targetHz;
  return columnMm * (2 ** (note.centsFromScale / 1200) - 1);
}

function moveFoot(document: DesignDocument, shift: number): DesignDocument {
  const last = <T extends { positionMm: number }>(stations: T[]) =>
    stations.map((station, index) =>
      index === stations.length - 1 ? { ...station, positionMm: station.positionMm + shift } : station,
    );
  return {
    ...document,
    bore: { stations: last(document.bore.stations) },
    outside: { stations: last(document.outside.stations) },
  };
}

/** To a tenth of a millimetre: what a rule can mark. */
function rounded(document: DesignDocument): DesignDocument {
  const tenth = (value: number) => Math.round(value * 10) / 10;
  const stations = <T extends { positionMm: number }>(list: T[]) =>
    list.map((station) => ({ ...station, positionMm: tenth(station.positionMm) }));
  return {
    ...document,
    bore: { stations: stations(document.bore.stations) },
    outside: { stations: stations(document.outside.stations) },
    holes: document.holes.map((hole) => ({ ...hole, positionMm: tenth(hole.positionMm) })),
  };
}
