import { z } from 'zod';
import { BEYOND, COMBINATIONS, type FitChoices } from '#shared/measured-bore/fit-stations.ts';
import { COLUMN_UNITS } from '#shared/measured-bore/measurement-cell.ts';
import { COLUMN_KINDS } from '#shared/measured-bore/measurement-columns.ts';
import { DECIMAL_MARKS, SEPARATORS } from '#shared/measured-bore/measurement-table.ts';
import { ENDS, type MeaningChoices } from '#shared/measured-bore/read-measured-bore.ts';

/** What a person pasted and said of it: all that cannot be worked out again. */
export interface MeasuredSource {
  text: string;
  /** null where it was pasted. */
  fileName: string | null;
  meaning: MeaningChoices;
  fit: FitChoices;
  /** Shown as a second line over the drawn bore while other things are done. */
  isBeside: boolean;
}

/** What thinning may lose without a maker hearing or feeling it, mm; common practice. */
const USUAL_WITHIN_MM = 0.02;

export const NOTHING_SAID: Pick<MeasuredSource, 'meaning' | 'fit'> = {
  meaning: { separator: null, decimalMark: null, columns: {}, from: null, zeroMm: null },
  fit: {
    limitMm: null,
    withinMm: USUAL_WITHIN_MM,
    combination: 'mean',
    beyond: null,
    restored: [],
  },
};

export const NO_SOURCE: MeasuredSource = { text: '', fileName: null, isBeside: false, ...NOTHING_SAID };

const sourceSchema: z.ZodType<MeasuredSource> = z.object({
  text: z.string(),
  fileName: z.string().nullable(),
  isBeside: z.boolean(),
  meaning: z.object({
    separator: z.enum(SEPARATORS).nullable(),
    decimalMark: z.enum(DECIMAL_MARKS).nullable(),
    columns: z.record(
      z.coerce.number(),
      z.object({ kind: z.enum(COLUMN_KINDS).optional(), unit: z.enum(COLUMN_UNITS).optional() }),
    ),
    from: z.enum(ENDS).nullable(),
    zeroMm: z.number().nullable(),
  }),
  fit: z.object({
    limitMm: z.number().nullable(),
    withinMm: z.number(),
    combination: z.enum(COMBINATIONS),
    beyond: z.enum(BEYOND).nullable(),
    restored: z.array(z.string()),
  }),
});

/** One person's table for one design, in this window. */
export interface MeasuredPlace {
  personId: number;
  designId: number;
}

const keyOf = ({ personId, designId }: MeasuredPlace) => `borewright.measured-bore.${personId}.${designId}`;

/** Kept with the window: a reload or a panel closed by mistake loses nothing, and a shared device keeps nothing. */
export function readMeasuredCopy(place: MeasuredPlace): MeasuredSource {
  try {
    const text = sessionStorage.getItem(keyOf(place));
    if (text === null) return NO_SOURCE;
    const read = sourceSchema.safeParse(JSON.parse(text));
    return read.success ? read.data : NO_SOURCE;
  } catch (error) {
    // No storage, or half written by a crash: as good as nothing kept.
    if (error instanceof DOMException || error instanceof SyntaxError) return NO_SOURCE;
    throw error;
  }
}

/** Returns whether it was kept. */
export function keepMeasuredCopy(place: MeasuredPlace, source: MeasuredSource): boolean {
  try {
    if (source.text === '') sessionStorage.removeItem(keyOf(place));
    else sessionStorage.setItem(keyOf(place), JSON.stringify(source));
    return true;
  } catch (error) {
    if (error instanceof DOMException) return false;
    throw error;
  }
}
