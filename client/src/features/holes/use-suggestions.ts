import { useEffect, useRef, useState } from 'react';
import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { startEngine, type RunningEngine } from '../../engine/start-engine.ts';
import { findSuggestions, type Suggestion } from './find-suggestion.ts';

interface SuggestionRequest {
  document: DesignDocument;
  prediction: DesignPrediction | null;
  hole: string | null;
  fingering: string | null;
  unit: LengthUnit;
  bandCents: readonly number[];
  /** Nothing is looked for while a hole is in hand, or where nothing may be changed. */
  isResting: boolean;
}

interface Answer {
  document: DesignDocument;
  fingering: string;
  hole: string;
  suggestions: Suggestion[];
}

/** Quiet time before suggestions are looked for, ms: they cost some thirty predictions. */
const LOOK_AFTER_MS = 200;

/** Suggestions for the chosen note and hole, best first; null while they are looked for. */
export function useSuggestions(request: SuggestionRequest): Suggestion[] | null {
  const { document, prediction, hole: holeId, fingering, unit, bandCents, isResting } = request;
  const engine = useRef<RunningEngine | null>(null);
  const [answer, setAnswer] = useState<Answer | null>(null);

  useEffect(
    () => () => {
      engine.current?.close();
      engine.current = null;
    },
    [],
  );

  useEffect(() => {
    const hole = document.holes.find((other) => other.id === holeId);
    if (hole === undefined || fingering === null || prediction === null || isResting) return undefined;
    let isWanted = true;
    const timer = setTimeout(() => {
      engine.current ??= startEngine('suggestions');
      const { remote } = engine.current;
      const predict = async (changed: DesignDocument) => {
        if (!isWanted) return null;
        const result = await remote.predict(changed, { coupling: true });
        return result.status === 'predicted' ? result.prediction : null;
      };
      const asked = { document, prediction, hole, fingering, unit, bandCents, predict };
      void findSuggestions(asked).then((suggestions) => {
        if (isWanted) setAnswer({ document, fingering, hole: hole.id, suggestions });
      }, reportError);
    }, LOOK_AFTER_MS);
    return () => {
      isWanted = false;
      clearTimeout(timer);
    };
  }, [document, prediction, holeId, fingering, unit, bandCents, isResting]);

  const isCurrent =
    answer !== null &&
    answer.document === document &&
    answer.hole === holeId &&
    answer.fingering === fingering;
  return isCurrent ? answer.suggestions : null;
}
