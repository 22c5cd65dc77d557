import { UNUSUAL_UNDERCUT_CENTS } from '../acoustics/tone-hole/undercut.ts';
import type { HoleState } from '../acoustics/response/column.ts';
import type { DesignDocument, MouthEndKind } from '../document/design-document.ts';
import type { AccuracyPart } from './prediction.ts';
import type { DesignColumn } from './to-column.ts';

/**
 * Largest errors of bores with plain holes against three-dimensional finite elements of whole instruments, cents, in
 * registers 1 and 2, and the root of the mean square above.
 */
const BORE_AND_HOLES = [0.6, 1.3, 2];

/** Where a bore changes under a hole: what a hundredth of a millimetre to either side of a step makes. Own judgement. */
const UNEVEN_BORE_CENTS = 20;

/** Measured of a vented register, undercut (studied shapes), half-cover and pad on whole instruments or elements, cents. */
const UNDERCUT_CENTS = 1.5;
const HALF_COVERED_CENTS = 1.5;
const PAD_CENTS = 3;

/** Real walls, finger pads and edges, which nothing here was held against, cents; common practice. */
const LOSSES_CENTS = 1;

/** What a mouth end adds before it is calibrated on a measured set of notes, cents; common practice. */
const UNCALIBRATED_MOUTH_ENDS: Record<MouthEndKind, number> = {
  'ideal-open': 0,
  'ideal-closed': 0,
  window: 8,
  embouchure: 20,
  rim: 25,
  reed: 30,
};

/**
 * What is left of it afterwards. With one scale fitted, whole instruments in finite elements were met within 0.4 cents (window)
 * and 0.5 (embouchure, lips at rest); the rest is our own judgement of windways, lips and reeds that are never quite the same.
 */
const CALIBRATED_MOUTH_ENDS: Record<MouthEndKind, number> = {
  'ideal-open': 0,
  'ideal-closed': 0,
  window: 2,
  embouchure: 4,
  rim: 5,
  reed: 5,
};

export interface AccuracyQuestion {
  document: DesignDocument;
  design: DesignColumn;
  states: readonly HoleState[];
  register: number;
  unusualUndercuts: ReadonlySet<string>;
  /** A bore that changes under a hole. */
  hasUnevenHoles: boolean;
}

/** What a note's figure rests on, and how far each part may be off, ± cents. */
export function accuracyParts(question: AccuracyQuestion): AccuracyPart[] {
  const { document, design, states, register, unusualUndercuts, hasUnevenHoles } = question;
  const plain = BORE_AND_HOLES[Math.min(register, 3) - 1] ?? 2;
  // A correction scale that was typed is no calibration: only a measured set of notes would narrow this.
  const mouth = UNCALIBRATED_MOUTH_ENDS[document.mouthEnd.kind];
  const calibratedCents = CALIBRATED_MOUTH_ENDS[document.mouthEnd.kind];
  const undercuts = design.holes.filter((hole) => hole.undercut !== null);
  const undercut = undercuts.some((hole) => unusualUndercuts.has(hole.id))
    ? UNUSUAL_UNDERCUT_CENTS
    : UNDERCUT_CENTS;
  const padOpen = design.holes.some((hole, i) => hole.cover === 'pad' && states[i]?.kind === 'open');
  const parts: (AccuracyPart | null)[] = [
    { part: 'bore-and-holes', cents: hasUnevenHoles ? UNEVEN_BORE_CENTS : plain },
    document.air.losses ? { part: 'losses', cents: LOSSES_CENTS } : null,
    undercuts.length > 0 ? { part: 'undercut', cents: undercut } : null,
    states.some((state) => state.kind === 'half')
      ? { part: 'half-covered', cents: HALF_COVERED_CENTS }
      : null,
    padOpen ? { part: 'pad', cents: PAD_CENTS } : null,
    mouth > 0 ? { part: 'mouth-end', cents: mouth, calibratedCents } : null,
  ];
  return parts.filter((part) => part !== null);
}

/** The parts together, independent of one another, ± cents. */
export function expectedAccuracyCents(parts: readonly AccuracyPart[]): number {
  return Math.sqrt(parts.reduce((sum, { cents }) => sum + cents * cents, 0));
}

/** The same once the mouth end is calibrated. */
export function calibratedAccuracyCents(parts: readonly AccuracyPart[]): number {
  return expectedAccuracyCents(
    parts.map(({ part, cents, calibratedCents }) => ({ part, cents: calibratedCents ?? cents })),
  );
}
