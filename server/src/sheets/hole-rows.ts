import type { DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { Fingering } from '#shared/document/design-document.ts';
import { boreEnds, chimneyMm } from '#shared/document/profile.ts';
import {
  drillsOf,
  MM_PER_INCH,
  nearestDrills,
  type Drill,
  type DrillSetName,
} from '#shared/lengths/drills.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
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

const EVERY_DRILL = drillsOf([...ORDINARY_DRILLS.mm, ...ORDINARY_DRILLS.inch]);

export function ordinaryDrills(input: SheetInput): Drill[] {
  return drillsOf(ORDINARY_DRILLS[writingOf(input).unit]);
}

/** Never a wider one: a hole drilled too wide stays too wide. */
function drillUpTo(diameterMm: number, drills: readonly Drill[]): Drill | null {
  const { exact, narrower } = nearestDrills(diameterMm, drills);
  return exact ?? narrower;
}

/** A length as far as its print shows it: a tenth of a millimetre, a thousandth of an inch. */
function asPrinted(mm: number, unit: LengthUnit): number {
  return unit === 'mm'
    ? Math.round(mm * 10) / 10
    : (Math.round((mm / MM_PER_INCH) * 1000) / 1000) * MM_PER_INCH;
}

/** The rows of the hole table in drilling order: from the foot upward. */
export function holeRows(input: SheetInput): HoleRow[] {
  const { document, sensitivities, workshop } = input;
  const drills = ordinaryDrills(input);
  const { unit } = writingOf(input);
  const { footMm } = boreEnds(document);
  const fromFootUp = numberedHoles(document).reverse();
  return fromFootUp.map((entry, at) => {
    const { hole, index } = entry;
    const reference = (positionMm: number) =>
      asPrinted(benchPositionMm(document, positionMm, workshop.referenceEnd), unit);
    const last = fromFootUp[at - 1]?.hole.positionMm ?? (workshop.referenceEnd === 'foot' ? footMm : null);
    const note = tunedNote(input, entry);
    const cents = (path: string) => centsPerTenth(sensitivities, note, `holes.${index}.${path}`);
    return {
      ...entry,
      fromReferenceMm: benchPositionMm(document, hole.positionMm, workshop.referenceEnd),
      fromFootMm: footMm - hole.positionMm,
      // From the figures as they are printed, so that whoever adds them up comes out where the column says.
      fromLastMm: last === null ? null : Math.abs(reference(hole.positionMm) - reference(last)),
      pilot: drillUpTo(hole.diameterMm * PILOT_SHARE, drills),
      then: drillUpTo(hole.diameterMm * NEXT_SHARE, drills),
      // A hole laid out for a drill of another system is bored with that drill.
      finalDrill: nearestDrills(hole.diameterMm, EVERY_DRILL).exact ?? drillUpTo(hole.diameterMm, drills),
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
