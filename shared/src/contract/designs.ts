import { z } from 'zod';
import { designDocumentSchema } from '../document/design-document.ts';

/** What a row of the rack draws: outline, holes and pitch, without the whole document. */
const outlineSchema = z.object({
  mouthEndKind: z.enum(['embouchure', 'window', 'rim', 'reed', 'ideal-open', 'ideal-closed']),
  mouthMm: z.number(),
  footMm: z.number(),
  outside: z.array(z.object({ positionMm: z.number(), diameterMm: z.number() })),
  holes: z.array(
    z.object({ id: z.string(), positionMm: z.number(), diameterMm: z.number(), angleDeg: z.number() }),
  ),
});

export const DESIGN_STATES = ['draft', 'in-review', 'approved', 'superseded', 'withdrawn'] as const;

const furthestSchema = z.object({ note: z.string(), cents: z.number() }).nullable();

export const designSummarySchema = z.object({
  id: z.int(),
  name: z.string(),
  kind: outlineSchema.shape.mouthEndKind,
  lowestNote: z.string().nullable(),
  temperament: z.string(),
  a4Hz: z.number(),
  draftVersion: z.int(),
  revisionNumber: z.int(),
  state: z.enum(DESIGN_STATES),
  archived: z.boolean(),
  outline: outlineSchema,
  /** Predicted cents of the register-1 notes by the hole they vent at (null: foot), for the small plumb lines. */
  plumb: z.array(z.object({ ventHole: z.string().nullable(), cents: z.number() })),
  furthest1: furthestSchema,
  furthest2: furthestSchema,
  createdBy: z.object({ id: z.int(), name: z.string() }),
  changedBy: z.object({ id: z.int(), name: z.string() }),
  changedAt: z.string(),
});

/** `:id` of every route under /api/designs. */
export const designIdParams = z.object({ id: z.coerce.number().int().min(1).max(2_147_483_647) });

export const DESIGN_SORTS = ['name', 'changed', 'kind', 'lowest-note'] as const;

/** GET /api/designs */
export const listDesignsQuery = z.strictObject({
  search: z.string().trim().max(120).default(''),
  kind: outlineSchema.shape.mouthEndKind.optional(),
  mine: z.stringbool().default(false),
  archived: z.stringbool().default(false),
  sort: z.enum(DESIGN_SORTS).default('changed'),
  order: z.enum(['asc', 'desc']).default('desc'),
  page: z.coerce.number().int().min(1).max(100_000).default(1),
  pageSize: z.coerce.number().int().min(1).max(100).default(50),
});

export const designListSchema = z.object({
  items: z.array(designSummarySchema),
  total: z.int(),
  page: z.int(),
  pageSize: z.int(),
  /** How many unarchived designs there are of each kind, for the filters. */
  counts: z.object({ all: z.int(), mine: z.int(), archived: z.int(), kinds: z.record(z.string(), z.int()) }),
});

/** POST /api/designs: from a document. The document's name is the design's name. */
export const createDesignRequest = z.strictObject({ document: designDocumentSchema });

/** POST /api/designs/:id/copies */
export const copyDesignRequest = z.strictObject({ name: z.string().trim().min(1).max(120) });

/** PATCH /api/designs/:id: renames; the name inside the draft follows, and its version moves on. */
export const renameDesignRequest = z.strictObject({
  name: z.string().trim().min(1, 'Give the design a name.').max(120),
});

/** GET and PUT /api/designs/:id/draft. The ETag and If-Match header carry the version: `"7"`. */
export const draftSchema = z.object({
  designId: z.int(),
  version: z.int(),
  savedAt: z.string(),
  savedBy: z.object({ id: z.int(), name: z.string() }),
  document: designDocumentSchema,
});

export const saveDraftRequest = z.strictObject({ document: designDocumentSchema });

/** The 412 answer: a problem document with the newer draft beside it. */
export const newerDraftSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.literal(412),
  detail: z.string(),
  newer: draftSchema,
});

/** GET /api/designs/:id/draft/sheet.pdf */
export const sheetQuery = z.strictObject({
  paper: z.enum(['A4', 'Letter']).default('A4'),
  unit: z.enum(['mm', 'inch']).optional(),
});

export type DesignState = (typeof DESIGN_STATES)[number];
export type DesignSummary = z.infer<typeof designSummarySchema>;
export type DesignList = z.infer<typeof designListSchema>;
export type Draft = z.infer<typeof draftSchema>;
export type ListDesignsQuery = z.infer<typeof listDesignsQuery>;
