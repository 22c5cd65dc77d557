import type { DesignDocument } from '../document/design-document.ts';
import { boreEnds } from '../document/profile.ts';
import { printLength } from '../lengths/print-length.ts';
import type { LengthUnit } from '../lengths/read-length.ts';
import { formatCents } from '../music/cents.ts';

/** A plain note further from the scale than this was not reached, cents. */
const REACHED_WITHIN_CENTS = 2;
/** A change of diameter at the foot that would show on a rule, mm. */
const VISIBLE_MM = 0.05;

interface ScaledOrder {
  ratio: number;
  unit: LengthUnit;
  holeSizes: 'exact' | 'nearest-drill';
}

const size = (mm: number, unit: LengthUnit) => `${printLength(mm, unit)} ${unit === 'mm' ? 'mm' : 'in'}`;

/** What scaling every length did and left alone. */
export function scaledWords(
  before: DesignDocument,
  after: DesignDocument,
  { ratio, unit, holeSizes }: ScaledOrder,
): string[] {
  const [was, is] = [boreEnds(before).footMm, boreEnds(after).footMm];
  const drills = holeSizes === 'nearest-drill' ? ' Holes were then taken to the nearest drill.' : '';
  return [
    `Every length is ${(1 / ratio).toFixed(4)} of what it was: bore, outside, mouth end, holes and undercuts. From the mouth end to the foot ${size(is, unit)}, was ${size(was, unit)}.${drills}`,
    'Kept: the angles, the air, the correction of the mouth end, and the fingering of every note. Losses at the wall and fingertips do not change with the size: notes shift by up to 1.3 cents a semitone.',
  ];
}

interface KeptOrder {
  furthestCents: number | null;
  unit: LengthUnit;
}

/** What moving foot and holes along a kept bore did, left alone, and could not do. */
export function keptBoreWords(
  before: DesignDocument,
  after: DesignDocument,
  { furthestCents, unit }: KeptOrder,
): { done: string[]; cautions: string[] } {
  const [was, is] = [boreEnds(before).footMm, boreEnds(after).footMm];
  const end = is < was ? `cut ${size(was - is, unit)} shorter` : `carried on by ${size(is - was, unit)}`;
  return {
    done: [
      `The foot is ${end}, and every hole was moved so that the plain notes of register 1 meet the scale. Other registers and cross fingerings follow as they will.`,
      'Kept: the width of bore and outside, the mouth end, the diameter of every hole, the air, and the fingering of every note.',
    ],
    cautions: [
      ...unreached(furthestCents),
      ...footWidth(before, after, unit),
      ...(before.holes.length > 0 && furthestCents === null
        ? [
            'No plain note of register 1 tells where the holes belong. They were moved in proportion to the air column.',
          ]
        : []),
    ],
  };
}

function unreached(furthestCents: number | null): string[] {
  if (furthestCents === null || Math.abs(furthestCents) <= REACHED_WITHIN_CENTS) return [];
  return [
    `Not every plain note could be brought to the scale: the furthest hangs ${formatCents(furthestCents)} cents. Choose other drills, or scale the bore as well.`,
  ];
}

function footWidth(before: DesignDocument, after: DesignDocument, unit: LengthUnit): string[] {
  const [was, is] = [before, after].map(({ bore }) => bore.stations.at(-1)?.diameterMm ?? 0) as [
    number,
    number,
  ];
  if (Math.abs(was - is) < VISIBLE_MM) return [];
  return [
    `The taper ends elsewhere: the bore is ${size(is, unit)} wide at the foot, was ${size(was, unit)}.`,
  ];
}
