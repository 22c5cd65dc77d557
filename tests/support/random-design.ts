import fc from 'fast-check';
import { EngineInputError } from '#shared/acoustics/engine-input-error.ts';
import { prepareDesign } from '#shared/analysis/prepare-design.ts';
import type {
  DesignDocument,
  Fingering,
  MouthEnd,
  Station,
  ToneHole,
} from '#shared/document/design-document.ts';
import { documentFaults } from '#shared/document/document-faults.ts';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** What random designs are to be like; all else is left to chance. */
export interface DesignKind {
  mouth?: readonly MouthEnd['kind'][];
  losses?: boolean;
  /** False: air of 345 m/s. */
  moist?: boolean;
  /** Only shapes that scale as a whole: no fingertips, whose size stays. */
  scalable?: boolean;
  fewestHoles?: number;
}

const MOUTHS = ['ideal-open', 'ideal-closed', 'window', 'embouchure', 'rim', 'reed'] as const;

interface Draws {
  mouth: MouthEnd['kind'];
  lengthMm: number;
  /** Diameter at the mouth, and in the middle and at the foot as shares of it. */
  boreMm: number;
  middle: number;
  foot: number;
  /** A step of the bore by so much at its middle. */
  step: number;
  wallMm: number;
  footKind: DesignDocument['foot']['kind'];
  losses: boolean;
  temperatureC: number;
  mouthShares: [number, number, number, number];
  holes: HoleDraws[];
}

interface HoleDraws {
  place: number;
  width: number;
  cover: ToneHole['cover'];
  angleDeg: number;
  cut: number;
  state: 'open' | 'closed' | 'side' | 'end';
  fraction: number;
}

function holeDraws(kind: DesignKind): fc.Arbitrary<HoleDraws> {
  const covers = ['lid', 'vent', 'pad', 'finger', 'thumb'] as const;
  return fc.record({
    place: real(0.15, 0.85),
    width: fc.oneof(real(0.15, 0.6), real(0.3, 0.94)),
    cover: fc.constantFrom(...(kind.scalable === true ? covers.slice(0, 3) : covers)),
    angleDeg: fc.constantFrom(0, 0, 0, 15, -20, 180),
    cut: fc.oneof(fc.constant(0), fc.constant(0), real(0.06, 0.3)),
    state: fc.constantFrom('open', 'closed', 'open', 'closed', 'side', 'end'),
    fraction: real(0.2, 0.8),
  });
}

/** Random designs inside the formulas' ranges and a little beyond, thin and thick, plain and odd, with one fingering. */
export function randomDesigns(kind: DesignKind = {}): fc.Arbitrary<DesignDocument> {
  return fc
    .record<Draws>({
      mouth: fc.constantFrom(...(kind.mouth ?? MOUTHS)),
      lengthMm: real(150, 700),
      boreMm: real(8, 22),
      middle: fc.oneof(fc.constant(1), real(0.8, 1.3)),
      foot: fc.oneof(fc.constant(1), real(0.5, 2)),
      step: fc.oneof(fc.constant(1), fc.constant(1), real(0.8, 1.25)),
      wallMm: fc.constantFrom(0.5, 1, 2, 4, 8),
      footKind: fc.constantFrom('open', 'open', 'open', 'flanged', 'stopped'),
      losses: kind.losses === undefined ? fc.boolean() : fc.constant(kind.losses),
      temperatureC: real(5, 35),
      mouthShares: fc.tuple(real(0, 1), real(0, 1), real(0, 1), real(0.8, 1.2)),
      holes: fc.array(holeDraws(kind), { minLength: kind.fewestHoles ?? 0, maxLength: 7 }),
    })
    .map((draws) => documentOf(draws, kind.moist ?? true))
    .filter((document) => documentFaults(document).length === 0 && isAnswered(document));
}

function isAnswered(document: DesignDocument): boolean {
  try {
    prepareDesign(document);
    return true;
  } catch (error) {
    if (error instanceof EngineInputError) return false;
    throw error;
  }
}

const within = (share: number, from: number, to: number) => from + share * (to - from);

function mouthOf({ mouth, boreMm, mouthShares }: Draws): MouthEnd {
  const [a, b, c, correctionScale] = mouthShares;
  const radius = boreMm / 2;
  switch (mouth) {
    case 'window':
      return {
        kind: mouth,
        widthMm: within(a, 0.85, 1.5) * radius,
        lengthMm: within(b, 0.35, 0.85) * radius,
        wallMm: within(c, 0.12, 0.55) * radius,
        rampDeg: within(a, 16, 24),
        correctionScale,
      };
    case 'embouchure':
      return {
        kind: mouth,
        lengthMm: within(a, 0.42, 0.55) * boreMm,
        widthMm: within(a, 0.42, 0.55) * boreMm * within(b, 1, 1.18),
        chimneyMm: within(c, 2, 6),
        undercut: null,
        lipCover: within(b, 0.22, 0.6),
        lipAngleDeg: within(c, 60, 120),
        stopperMm: within(a, 0.7, 1.4) * boreMm,
        correctionScale,
      };
    case 'rim':
      return { kind: mouth, cover: within(a, 0.2, 0.85), correctionScale };
    case 'reed':
      return { kind: mouth, equivalentVolumeMm3: within(a, 100, 2000), correctionScale };
    case 'ideal-open':
    case 'ideal-closed':
      return { kind: mouth, correctionScale: 1 };
  }
}

function startOf(end: MouthEnd): number {
  if (end.kind === 'window') return -end.lengthMm;
  return end.kind === 'embouchure' ? -end.stopperMm : 0;
}

function documentOf(draws: Draws, moist: boolean): DesignDocument {
  const { lengthMm, boreMm, middle, foot, step, wallMm } = draws;
  const mouthEnd = mouthOf(draws);
  const half = { positionMm: 0.45 * lengthMm, diameterMm: boreMm * middle };
  const bore: Station[] = [
    { positionMm: startOf(mouthEnd), diameterMm: boreMm },
    half,
    ...(step === 1 ? [] : [{ ...half, diameterMm: half.diameterMm * step }]),
    { positionMm: lengthMm, diameterMm: boreMm * foot },
  ];
  const outside = bore
    .filter(({ positionMm }, i) => positionMm !== bore[i - 1]?.positionMm)
    .map(({ positionMm, diameterMm }) => ({
      positionMm,
      diameterMm: diameterMm * Math.max(step, 1) + 2 * wallMm,
    }));
  const holes = draws.holes.map((hole, i) => holeOf(draws, hole, i));
  return {
    format: 'borewright-design/1',
    name: 'Random',
    pitch: { a4Hz: 440, temperament: 'equal', tonic: 'D', centsOffsets: null },
    air: {
      temperatureC: draws.temperatureC,
      relativeHumidity: 0.5,
      co2Fraction: 0.01,
      pressurePa: 101_325,
      mouthTemperatureC: null,
      warmLengthMm: null,
      losses: draws.losses,
      fixed: moist ? null : { speedOfSound: 345, density: 1.1769 },
    },
    mouthEnd,
    bore: { stations: bore },
    outside: { stations: outside },
    foot: { kind: draws.footKind },
    holes,
    fingerings: [fingeringOf(draws)],
  };
}

function holeOf(draws: Draws, hole: HoleDraws, index: number): ToneHole {
  const { lengthMm, boreMm, middle, foot, wallMm } = draws;
  const pitchMm = (0.65 * lengthMm) / draws.holes.length;
  const positionMm = 0.33 * lengthMm + pitchMm * (index + hole.place);
  const along = (positionMm / lengthMm - 0.45) / 0.55;
  const around = along < 0 ? within(1 + along / 0.45, 1, middle) : within(along, middle, foot);
  const narrowest = boreMm * Math.min(around, middle, foot, 1) * Math.min(draws.step, 1);
  const diameterMm = Math.min(hole.width * narrowest, 0.5 * pitchMm);
  const cut =
    hole.cut > 0 && wallMm >= 2
      ? { innerDiameterMm: diameterMm * (1 + hole.cut), depthMm: 0.6 * wallMm }
      : null;
  return {
    id: `h${index + 1}`,
    name: '',
    positionMm,
    diameterMm,
    angleDeg: hole.angleDeg,
    chimneyMm: null,
    undercut: cut !== null && cut.innerDiameterMm < 0.7 * narrowest ? cut : null,
    cover: hole.cover,
    ...(hole.cover === 'pad' ? { padHeightMm: 0.3 * diameterMm } : {}),
    hand: 'left',
  };
}

function fingeringOf({ holes }: Draws): Fingering {
  const covered = holes.flatMap(({ state, cover }, i) =>
    state === 'closed' && cover !== 'vent' ? [`h${i + 1}`] : [],
  );
  const half = holes.flatMap(({ state, cover, fraction }, i) =>
    (state === 'side' || state === 'end') && cover !== 'vent' && cover !== 'pad'
      ? [{ hole: `h${i + 1}`, fraction, from: state }]
      : [],
  );
  return { id: 'f', note: 'D5', register: 1, covered, half, weight: 1, centsOffset: 0 };
}

/** The design with every length scaled. */
export function scaledDesign(document: DesignDocument, scale: number): DesignDocument {
  const grown = <T>(value: T): T => {
    if (Array.isArray(value)) return value.map(grown) as T;
    if (typeof value !== 'object' || value === null) return value;
    const entries = Object.entries(value).map(([key, inner]: [string, unknown]) => [
      key,
      key.endsWith('Mm3')
        ? (inner as number) * scale ** 3
        : key.endsWith('Mm') && typeof inner === 'number'
          ? inner * scale
          : grown(inner),
    ]);
    return Object.fromEntries(entries) as T;
  };
  return { ...grown(document), air: document.air };
}
