import { useMemo } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { atTemperature } from '#shared/transform/other-temperature.ts';
import { referenceNote } from '#shared/transform/reference-note.ts';
import type { TransformOutcome } from '#shared/transform/transform-design.ts';
import { useStudy } from '../engine/use-study.ts';
import type { CompareTerms } from '../features/compare/compare-address.ts';
import {
  compare,
  usuallyLaidAt,
  type ComparedSide,
  type Comparison,
} from '../features/compare/comparison.ts';

interface Compared {
  a: DesignDocument;
  b: DesignDocument;
  /** One design beside itself: then only the second is at another pitch or temperature. */
  isSelf: boolean;
}

export interface ComparisonDesk {
  comparison: Comparison;
  /** Another key or pitch standard: what came of it; null while nothing is asked or nothing has come. */
  outcome: TransformOutcome | null;
  isAsked: boolean;
  /** False while a newer question is being worked out. */
  isSettled: boolean;
}

/** Two instruments as the terms want them looked at, with what the engine says of both. */
export function useComparison(
  { a, b, isSelf }: Compared,
  terms: CompareTerms,
  unit: LengthUnit,
): ComparisonDesk {
  const { key, a4Hz, bore, holeSizes, airA, airB, laidAt } = terms;
  const isAsked = isSelf && (key !== null || a4Hz !== null);
  const question = useMemo(
    () =>
      isAsked
        ? {
            document: a,
            order: { lowestNote: key ?? referenceNote(a), a4Hz: a4Hz ?? a.pitch.a4Hz, bore, holeSizes, unit },
          }
        : null,
    [isAsked, a, key, a4Hz, bore, holeSizes, unit],
  );
  const { answer: outcome, isCurrent } = useStudy('transform', question);
  const other = outcome?.status === 'transformed' ? outcome.document : isSelf ? a : b;
  const documentA = useMemo(() => (airA === null ? a : atTemperature(a, airA)), [a, airA]);
  const documentB = useMemo(() => (airB === null ? other : atTemperature(other, airB)), [other, airB]);
  const sideA = useSide(documentA, labelOf(documentA, documentB, isSelf, 'A'));
  const sideB = useSide(documentB, labelOf(documentB, documentA, isSelf, 'B'));
  const comparison = useMemo(
    () => compare(sideA, sideB, laidAt ?? usuallyLaidAt(sideA.document, sideB.document)),
    [sideA, sideB, laidAt],
  );
  return { comparison, outcome, isAsked, isSettled: !isAsked || isCurrent };
}

function useSide(document: DesignDocument, label: string): ComparedSide {
  const question = useMemo(() => ({ document }), [document]);
  const { answer, isCurrent } = useStudy('prediction', question);
  return useMemo(
    () => ({
      label,
      document,
      // Figures of another state are never hung on this drawing.
      prediction: isCurrent ? answer : null,
      hasFailed: isCurrent && answer === null,
    }),
    [label, document, answer, isCurrent],
  );
}

/** What tells the two apart in a word: their letters, or what was changed. */
function labelOf(
  document: DesignDocument,
  other: DesignDocument,
  isSelf: boolean,
  letter: 'A' | 'B',
): string {
  if (!isSelf) return letter;
  const [note, otherNote] = [referenceNote(document), referenceNote(other)];
  if (note !== otherNote) return note;
  if (document.pitch.a4Hz !== other.pitch.a4Hz) return `A ${document.pitch.a4Hz}`;
  if (document.air.temperatureC !== other.air.temperatureC) return `${document.air.temperatureC} °C`;
  return letter === 'A' ? 'stored' : 'shown';
}
