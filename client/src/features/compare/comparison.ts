import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';
import { matchDocuments, type DocumentMatch } from '#shared/document/match-documents.ts';

export interface ComparedSide {
  /** Short enough for a switch or a column head: `A`, `22 °C`, `F5`. */
  label: string;
  document: DesignDocument;
  /** null until it is worked out, and where it cannot be. */
  prediction: DesignPrediction | null;
  /** True where the engine has answered that there is no answer. */
  hasFailed: boolean;
}

/** Two instruments over each other: `a` is the older, drawn as dashed outlines; `b` is the one in hand. */
export interface Comparison {
  a: ComparedSide;
  b: ComparedSide;
  match: DocumentMatch;
  /** How far the first is shifted along the second, mm: 0 where both are laid with their mouth ends together. */
  offsetMm: number;
}

export type LaidAt = 'mouth' | 'foot';

export type ShownSide = 'a' | 'both' | 'b';

/** Up to this share of the length the two are one instrument with its foot trimmed, not two lengths. */
const TRIMMED_SHARE = 0.03;

/** Where two are laid together when nobody says: at the mouth end, but instruments of two lengths at the foot, where the rule begins. */
export function usuallyLaidAt(a: DesignDocument, b: DesignDocument): LaidAt {
  const [footA, footB] = [boreEnds(a).footMm, boreEnds(b).footMm];
  return Math.abs(footA - footB) > TRIMMED_SHARE * Math.max(footA, footB) ? 'foot' : 'mouth';
}

export function compare(a: ComparedSide, b: ComparedSide, laidAt: LaidAt): Comparison {
  const apart = boreEnds(b.document).footMm - boreEnds(a.document).footMm;
  return {
    a,
    b,
    match: matchDocuments(a.document, b.document),
    offsetMm: laidAt === 'foot' ? apart : 0,
  };
}

/** The other way round: what was the ghost lies on the bench. */
export const turned = ({ a, b, match, offsetMm }: Comparison): Comparison => ({
  a: b,
  b: a,
  offsetMm: -offsetMm,
  match: {
    ...match,
    holes: match.holes.map((pair) => ({ a: pair.b, b: pair.a })),
    fingerings: match.fingerings.map((pair) => ({ a: pair.b, b: pair.a })),
  },
});
