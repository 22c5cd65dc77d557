import { z } from 'zod';

/** Counts that keep a document drawable and a prediction quick. */
export const DOCUMENT_LIMITS = { stations: 400, holes: 24, fingerings: 120 } as const;

/** Longest instrument that the program draws and predicts, mm. */
const LONGEST_MM = 5000;

const positionMm = z.number().min(-LONGEST_MM).max(LONGEST_MM);
const lengthMm = z.number().min(0).max(LONGEST_MM);
const diameterMm = z.number().positive().max(500);
const fraction = z.number().min(0).max(1);
const identifier = z
  .string()
  .min(1)
  .max(40)
  .regex(/^[A-Za-z0-9_-]+$/, 'Use letters, figures, - and _ only.');
const correctionScale = z.number().min(0.2).max(5).default(1);

export const stationSchema = z.strictObject({ positionMm, diameterMm });

const profileSchema = z.strictObject({
  stations: z
    .array(stationSchema)
    .min(2, 'Give at least two stations.')
    .max(DOCUMENT_LIMITS.stations, `Keep to ${DOCUMENT_LIMITS.stations} stations.`),
});

export const undercutSchema = z.strictObject({ innerDiameterMm: diameterMm, depthMm: lengthMm.positive() });

export const TEMPERAMENTS = ['equal', 'just', 'pythagorean', 'quarter-comma-meantone', 'own'] as const;

const pitchSchema = z.strictObject({
  a4Hz: z.number().min(300).max(600),
  temperament: z.enum(TEMPERAMENTS),
  tonic: z.string().regex(/^[A-G][#b]?$/, 'Type a note name such as D, F# or Bb.'),
  /** Only for `own`: cents from equal temperament for the twelve semitones upwards from the tonic. */
  centsOffsets: z.array(z.number().min(-100).max(100)).length(12).nullable().default(null),
});

const airSchema = z.strictObject({
  temperatureC: z.number().min(0).max(40),
  relativeHumidity: fraction,
  co2Fraction: z.number().min(0).max(0.06),
  pressurePa: z.number().min(60_000).max(110_000),
  mouthTemperatureC: z.number().min(0).max(40).nullable().default(null),
  warmLengthMm: lengthMm.positive().nullable().default(null),
  losses: z.boolean().default(true),
  fixed: z
    .strictObject({ speedOfSound: z.number().min(100).max(2000), density: z.number().min(0.01).max(100) })
    .nullable()
    .default(null),
});

export const mouthEndSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('embouchure'),
    lengthMm: diameterMm,
    widthMm: diameterMm,
    chimneyMm: lengthMm.positive(),
    undercut: undercutSchema.nullable().default(null),
    lipCover: z.number().min(0).max(0.9),
    lipAngleDeg: z.number().min(30).max(180),
    stopperMm: lengthMm.positive(),
    correctionScale,
  }),
  z.strictObject({
    kind: z.literal('window'),
    widthMm: diameterMm,
    lengthMm: diameterMm,
    wallMm: lengthMm.positive(),
    rampDeg: z.number().min(5).max(60),
    correctionScale,
  }),
  z.strictObject({ kind: z.literal('rim'), cover: z.number().min(0).max(0.95), correctionScale }),
  z.strictObject({
    kind: z.literal('reed'),
    equivalentVolumeMm3: z.number().min(0).max(1e6),
    correctionScale,
  }),
  z.strictObject({ kind: z.literal('ideal-open'), correctionScale }),
  z.strictObject({ kind: z.literal('ideal-closed'), correctionScale }),
]);

export const COVERS = ['finger', 'thumb', 'pad', 'vent', 'lid'] as const;

export const holeSchema = z.strictObject({
  id: identifier,
  name: z.string().max(40),
  positionMm,
  diameterMm,
  /** Round the body from the centre line, clockwise seen from the foot. */
  angleDeg: z.number().min(-360).max(360).default(0),
  /** null: taken from the outside profile. */
  chimneyMm: lengthMm.positive().nullable().default(null),
  undercut: undercutSchema.nullable().default(null),
  cover: z.enum(COVERS),
  padHeightMm: lengthMm.positive().nullable().optional(),
  hand: z.enum(['left', 'right']).default('left'),
});

const halfCoverSchema = z.strictObject({
  hole: identifier,
  fraction: z.number().min(0).max(0.95),
  from: z.enum(['side', 'end']),
});

export const fingeringSchema = z.strictObject({
  id: identifier,
  note: z.string().regex(/^[A-G](#|b)?-?\d$/, 'Type a note such as D5, F#5 or Bb4.'),
  register: z.int().min(1).max(8),
  covered: z.array(identifier).max(DOCUMENT_LIMITS.holes),
  half: z.array(halfCoverSchema).max(DOCUMENT_LIMITS.holes).default([]),
  weight: z.number().min(0).max(100).default(1),
  centsOffset: z.number().min(-1200).max(1200).default(0),
});

/** The shape of a design document; what the parts mean to one another is checked by `documentFaults`. */
export const designDocumentSchema = z.strictObject({
  format: z.literal('borewright-design/1'),
  name: z.string().trim().min(1, 'Give the design a name.').max(120, 'Keep the name to 120 letters.'),
  pitch: pitchSchema,
  air: airSchema,
  mouthEnd: mouthEndSchema,
  bore: profileSchema,
  outside: profileSchema,
  foot: z.strictObject({ kind: z.enum(['open', 'flanged', 'stopped']) }),
  holes: z.array(holeSchema).max(DOCUMENT_LIMITS.holes, `Keep to ${DOCUMENT_LIMITS.holes} holes.`),
  fingerings: z
    .array(fingeringSchema)
    .max(DOCUMENT_LIMITS.fingerings, `Keep to ${DOCUMENT_LIMITS.fingerings} fingerings.`),
});

export type DesignDocument = z.infer<typeof designDocumentSchema>;
export type Station = z.infer<typeof stationSchema>;
export type ToneHole = z.infer<typeof holeSchema>;
export type Fingering = z.infer<typeof fingeringSchema>;
export type MouthEnd = z.infer<typeof mouthEndSchema>;
export type MouthEndKind = MouthEnd['kind'];
export type Undercut = z.infer<typeof undercutSchema>;
export type Air = DesignDocument['air'];
export type Pitch = DesignDocument['pitch'];
export type Temperament = (typeof TEMPERAMENTS)[number];
