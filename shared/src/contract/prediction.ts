import { z } from 'zod';
import type { DesignPrediction, DesignSensitivities } from '../analysis/prediction.ts';

const noticeSchema = z.object({
  code: z.string(),
  message: z.string(),
  hole: z.string().optional(),
  fingering: z.string().optional(),
});

const rungSchema = z.object({
  mode: z.int(),
  frequencyHz: z.number(),
  centsFromMultiple: z.number(),
  strength: z.number(),
  weak: z.boolean(),
});

const fingeringPredictionSchema = z.object({
  id: z.string(),
  note: z.string(),
  register: z.int(),
  targetHz: z.number(),
  frequencyHz: z.number().nullable(),
  centsFromScale: z.number().nullable(),
  beatsHz: z.number().nullable(),
  mode: z.int().nullable(),
  ladder: z.array(rungSchema),
  ventHole: z.string().nullable(),
  cutoffHz: z.number().nullable(),
  accuracyCents: z.number(),
  calibratedAccuracyCents: z.number().optional(),
  accuracy: z
    .array(
      z.object({
        part: z.enum(['bore-and-holes', 'losses', 'undercut', 'half-covered', 'pad', 'mouth-end']),
        cents: z.number(),
        calibratedCents: z.number().optional(),
      }),
    )
    .optional(),
  notices: z.array(noticeSchema),
});

export const designPredictionSchema = z.object({
  engine: z.string(),
  notices: z.array(noticeSchema),
  fingerings: z.array(fingeringPredictionSchema),
}) satisfies z.ZodType<DesignPrediction>;

export const designSensitivitiesSchema = z.object({
  engine: z.string(),
  fingerings: z.array(z.object({ id: z.string(), centsPerUnit: z.record(z.string(), z.number()) })),
}) satisfies z.ZodType<DesignSensitivities>;

/** A prediction as the server computed and stored it. */
export const storedPredictionSchema = z.object({
  draftVersion: z.int(),
  /** SHA-256 of the stored draft's canonical JSON, hex. */
  documentHash: z.string(),
  computedAt: z.string(),
  prediction: designPredictionSchema,
  /** null until a prediction was asked for: a save stores the prediction alone. */
  sensitivities: designSensitivitiesSchema.nullable(),
});

export type StoredPrediction = z.infer<typeof storedPredictionSchema>;
