import type { DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { Fingering } from '#shared/document/design-document.ts';
import { boreEnds, chimneyMm } from '#shared/document/profile.ts';
import { drillsOf, nearestDrills, type Drill, type DrillSetName } from '#shared/lengths/drills.ts';
import { benchPositionMm, numberedHoles, type NumberedHole } from './bench-position.ts';
import type { SheetInput } from './sheet-input.ts';
import { writingOf } from './sheet-lengths.ts';

/** What the bench has to know of one hole, in figures. */
export interface HoleRow extends NumberedHole {
  fromReferenceMm: number;
  fromFootMm: number;
  /** From the hole drilled before it; null for the first one when the foot is not what is measured from. */
  fromLastMm: number | null;
  pilot: Drill | null;
  then: Drill | null;
  /** The drill that opens the hole: of the hole's own size, or the nearest that does not go beyond it. */
  finalDrill: Drill | null;
  chimneyMm: number;
  /** Cents for each 0.1 mm; null when no plain fingering vents at the hole. */
  centsWider: number | null;
  centsFootward: number | null;
  /** The note that sounds when this is the hole nearest the mouth end that is open. */
  tunes: string | null;
}

/** Workshop tolerances of common practice on a drilled wooden body, ± mm. */
export const POSITION_TOLERANCE_MM = 0.15;
export const DIAMETER_TOLERANCE_MM = 0.05;

/** A pilot leaves enough wood to correct where the drill ran; the next drill halves what is left. */
const PILOT_SHARE = 0.7;
const NEXT_SHARE = 0.85;

const ORDINARY_DRILLS: Record<'mm' | 'inch', DrillSetName[]> = {
  mm: ['metric-0.1', 'metric-0.5'],
  inch: ['inch-fraction', 'number', 'letter'],
};

export function ordinaryDrills(input: SheetInput): Drill[] {
  return drillsOf(ORDINARY_DRILLS[writingOf(input).unit]);
}

/** Never a wider one: a hole drilled too wide stays too wide. */
function drillUpTo(diameterMm: number, drills: readonly Drill[]): Drill | null {
  const { exact, narrower } = nearestDrills(diameterMm, drills);
  return exact ?? narrower;
}

/** The rows of the hole table in drilling order: from the foot upward. */
export function holeRows(input: SheetInput): HoleRow[] {
  const { document, sensitivities, workshop } = input;
  const drills = ordinaryDrills(input);
  const { footMm } = boreEnds(document);
  const fromFootUp = numberedHoles(document).reverse();
  return fromFootUp.map((entry, at) => {
    const { hole, index } = entry;
    const last = fromFootUp[at - 1]?.hole.positionMm ?? (workshop.referenceEnd === 'foot' ? footMm : null);
    const note = tunedNote(input, entry);
    const cents = (path: string) => centsPerTenth(sensitivities, note, `holes.${index}.${path}`);
    return {
      ...entry,
      fromReferenceMm: benchPositionMm(document, hole.positionMm, workshop.referenceEnd),
      fromFootMm: footMm - hole.positionMm,
      fromLastMm: last === null ? null : last - hole.positionMm,
      pilot: drillUpTo(hole.diameterMm * PILOT_SHARE, drills),
      then: drillUpTo(hole.diameterMm * NEXT_SHARE, drills),
      finalDrill: drillUpTo(hole.diameterMm, drills),
      chimneyMm: chimneyMm(document, hole),
      centsWider: cents('diameterMm'),
      centsFootward: cents('positionMm'),
      tunes: note?.note ?? null,
    };
  });
}

/** Plain fingerings tune a hole: first register, nothing half-covered, as few open holes covered below as can be. */
function tunedNote({ document, prediction }: SheetInput, { hole }: NumberedHole): Fingering | null {
  const vents = new Set(
    prediction.fingerings.filter((entry) => entry.ventHole === hole.id).map((entry) => entry.id),
  );
  const below = document.holes.filter((other) => other.positionMm > hole.positionMm).map((other) => other.id);
  const crossed = (fingering: Fingering) => fingering.covered.filter((id) => below.includes(id)).length;
  const candidates = document.fingerings
    .filter((fingering) => vents.has(fingering.id) && fingering.register === 1 && fingering.half.length === 0)
    .sort((a, b) => crossed(a) - crossed(b));
  return candidates[0] ?? null;
}

function centsPerTenth(
  sensitivities: DesignSensitivities,
  fingering: Fingering | null,
  path: string,
): number | null {
  const found = sensitivities.fingerings.find((entry) => entry.id === fingering?.id);
  const perMm = found?.centsPerUnit[path];
  return perMm === undefined ? null : perMm / 10;
}
