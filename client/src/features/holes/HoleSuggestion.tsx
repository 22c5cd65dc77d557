import { MOUTH_WORDS } from '../../bench/mouth-words.ts';
import type { HoleFieldsProps } from './HoleFields.tsx';
import { SuggestionWords } from './SuggestionWords.tsx';

/** The suggestion for the note that stands beside the hole's sizes. */
export function HoleSuggestion(props: HoleFieldsProps) {
  const { document, prediction, bandCents, readOnly, chosen, leading, suggestion, unit } = props;
  const predicted = prediction?.fingerings.find(({ id }) => id === leading);
  if (predicted === undefined) return null;
  return (
    <SuggestionWords
      note={predicted.note}
      cents={predicted.centsFromScale}
      bandCents={bandCents[predicted.register - 1] ?? bandCents.at(-1) ?? 0}
      holeTitle={chosen.title}
      presentMm={chosen.hole.diameterMm}
      mouthWord={MOUTH_WORDS[document.mouthEnd.kind]}
      suggestions={readOnly === null ? suggestion.suggestions : []}
      unit={unit}
      disabled={readOnly !== null}
      canPutBack={suggestion.canPutBack}
      onTry={suggestion.tryOut}
      onPutBack={suggestion.putBack}
    />
  );
}
