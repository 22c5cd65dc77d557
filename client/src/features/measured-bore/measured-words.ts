import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument, MouthEndKind } from '#shared/document/design-document.ts';
import { fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import type { BoreReading } from '#shared/measured-bore/read-measured-bore.ts';
import type { FittedBore, Gap } from '#shared/measured-bore/fit-stations.ts';

/** The mouth's acting edge, from which the design counts. */
export const EDGE_WORDS: Record<MouthEndKind, string> = {
  window: 'Lip',
  embouchure: 'Embouchure hole',
  rim: 'Rim',
  reed: 'Reed seat',
  'ideal-open': 'Open end',
  'ideal-closed': 'Closed end',
};

/** Widths to a hundredth of a millimetre or a thousandth of an inch: what a gauge tells. */
export const printWidth = (mm: number, unit: LengthUnit) => printLength(mm, unit, unit === 'mm' ? 2 : 3);

/** Limits need one digit more than the widths they judge. */
export const printLimit = (mm: number, unit: LengthUnit) => printLength(mm, unit, unit === 'mm' ? 3 : 4);

export const counted = (count: number, one: string, many = `${one}s`) =>
  `${count} ${count === 1 ? one : many}`;

type Placed = Pick<BoreReading, 'positionMm' | 'diameterMm'>;

/** `12.87 at 220.0 from the foot`. */
export function readingWords(
  document: Pick<DesignDocument, 'bore'>,
  reading: Placed,
  unit: LengthUnit,
): string {
  return `${printWidth(reading.diameterMm, unit)} at ${printLength(fromFootMm(document, reading.positionMm), unit)} from the foot`;
}

const GAP_ENDS: Record<Gap['end'], string> = { mouth: 'at the mouth end', foot: 'at the foot' };

/** What happens where nothing was measured. */
export function gapWords({ gaps, beyond }: FittedBore, unit: LengthUnit): string | null {
  if (gaps.length === 0) return null;
  const where = gaps.map(({ end, lengthMm }) => `${printLength(lengthMm, unit)} ${GAP_ENDS[end]}`);
  const what = beyond === 'held' ? 'The nearest reading is held there.' : 'The bore stays as drawn there.';
  return `Nothing was measured over ${where.join(' and ')}. ${what}`;
}

export interface NoteMove {
  fingering: string;
  note: string;
  register: number;
  /** Cents from the scale; null where there is no steady note. */
  drawnCents: number | null;
  measuredCents: number | null;
}

/** What the measured bore does to every note, in the chart's order. */
export function noteMoves(
  document: DesignDocument,
  drawn: DesignPrediction | null,
  measured: DesignPrediction | null,
): NoteMove[] {
  const centsIn = (prediction: DesignPrediction | null, fingering: string) =>
    prediction?.fingerings.find(({ id }) => id === fingering)?.centsFromScale ?? null;
  return document.fingerings.map(({ id, note, register }) => ({
    fingering: id,
    note,
    register,
    drawnCents: centsIn(drawn, id),
    measuredCents: centsIn(measured, id),
  }));
}

export function movedCents({ drawnCents, measuredCents }: NoteMove): number | null {
  return drawnCents === null || measuredCents === null ? null : measuredCents - drawnCents;
}
