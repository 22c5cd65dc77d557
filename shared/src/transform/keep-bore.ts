import { predictDesign } from '../analysis/predict-design.ts';
import type { DesignDocument, Station } from '../document/design-document.ts';
import { boreEnds } from '../document/profile.ts';
import { placeHoles } from '../fit/place-holes.ts';

/** Placing the holes moves the foot; the bore is cut again there, and after so many rounds both have come to rest. */
const MOST_ROUNDS = 6;
/** Good enough to lay out a first length, mm/s; the engine takes over from there. */
const ROUGH_SPEED = 345_000;
/** What the ends add to an air column that cannot be worked out, in bores. Common practice. */
const USUAL_REACH_IN_BORES = 2;

export interface KeptBore {
  document: DesignDocument;
  /** The plain register-1 note furthest from the scale when the holes had come to rest, cents; null when there is none. */
  furthestCents: number | null;
}

/**
 * Holes and foot moved along a bore that stays as it is reamed: cut shorter at the foot, or carried on with the taper it ends in.
 *
 * @param document - the design with its chart and pitch already those wanted
 * @param original - as it is, with the chart it was laid out for
 * @param ratio - wanted frequency over present one
 */
export function keepBore(document: DesignDocument, original: DesignDocument, ratio: number): KeptBore {
  let { document: placed, furthestCents } = {
    document: firstLayout(document, original, ratio),
    furthestCents: null as number | null,
  };
  for (let round = 0; round < MOST_ROUNDS; round += 1) {
    const footBefore = boreEnds(placed).footMm;
    const placement = placeHoles(placed);
    placed = withFootAt(placement.document, original, boreEnds(placement.document).footMm);
    furthestCents = placement.furthestCents;
    if (Math.abs(boreEnds(placed).footMm - footBefore) < 0.05) break;
  }
  return { document: placed, furthestCents };
}

/** Every place moved in proportion along the air column, which reaches beyond the wood at both ends. */
export function firstLayout(
  document: DesignDocument,
  original: DesignDocument,
  ratio: number,
): DesignDocument {
  const reachMm = acousticReachMm(original);
  const along = (positionMm: number) => (positionMm + reachMm) / ratio - reachMm;
  const moved = {
    ...document,
    holes: document.holes.map((hole) => ({ ...hole, positionMm: along(hole.positionMm) })),
  };
  return withFootAt(moved, original, along(boreEnds(original).footMm));
}

/** How much longer the air column of the lowest note is than the bore from the mouth end to the foot, mm. */
function acousticReachMm(document: DesignDocument): number {
  const { footMm } = boreEnds(document);
  const usual = USUAL_REACH_IN_BORES * (document.bore.stations[0]?.diameterMm ?? 0);
  const firsts = document.fingerings.filter(({ register, half }) => register === 1 && half.length === 0);
  if (firsts.length === 0) return usual;
  const { fingerings } = predictDesign({ ...document, fingerings: firsts }, { modes: 1 });
  const lowest = fingerings.reduce<number | null>(
    (least, { frequencyHz, ventHole }) =>
      ventHole === null && frequencyHz !== null && (least === null || frequencyHz < least)
        ? frequencyHz
        : least,
    null,
  );
  if (lowest === null) return usual;
  return Math.max(0, ROUGH_SPEED / columnsInWave(document) / lowest - footMm);
}

/** A column closed at one end is a quarter of its wave, one open at both a half. */
function columnsInWave({ mouthEnd, foot }: DesignDocument): 2 | 4 {
  const isClosedAtMouth = mouthEnd.kind === 'reed' || mouthEnd.kind === 'ideal-closed';
  return isClosedAtMouth === (foot.kind === 'stopped') ? 2 : 4;
}

function withFootAt(document: DesignDocument, original: DesignDocument, footMm: number): DesignDocument {
  const byMm = footMm - boreEnds(original).footMm;
  return {
    ...document,
    bore: { stations: cutOrCarryOn(original.bore.stations, byMm) },
    outside: { stations: cutOrCarryOn(original.outside.stations, byMm) },
  };
}

/** A profile ended so much further on: cut where it gets shorter, its last taper carried on where it gets longer. */
export function cutOrCarryOn(stations: readonly Station[], byMm: number): Station[] {
  const last = stations.at(-1);
  const before = stations.at(-2);
  if (last === undefined || before === undefined || byMm === 0) return [...stations];
  const endMm = last.positionMm + byMm;
  if (byMm > 0) return [...stations.slice(0, -1), onLine(before, last, endMm)];
  const kept = stations.filter(({ positionMm }) => positionMm < endMm);
  const [a, b] = [kept.at(-1), stations[kept.length]];
  if (a === undefined || b === undefined) return [...stations];
  return [...kept, onLine(a, b, endMm)];
}

function onLine(a: Station, b: Station, positionMm: number): Station {
  const length = b.positionMm - a.positionMm;
  const share = length === 0 ? 1 : (positionMm - a.positionMm) / length;
  return { positionMm, diameterMm: a.diameterMm + share * (b.diameterMm - a.diameterMm) };
}
