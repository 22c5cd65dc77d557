import { MOUTH_WORDS } from '../../bench/mouth-words.ts';
import type { HoleFieldsProps } from './hole-fields-props.ts';
import { SuggestionWords } from './SuggestionWords.tsx';

/** The suggestion for the note that stands beside the hole's sizes. */
export function HoleSuggestion(props: HoleFieldsProps) {
  const { document, prediction, bandCents, readOnly, chosen, leading, suggestion, unit } = props;
  const predicted = prediction?.fingerings.find(({ id }) => id === leading);
  if (predicted === undefined) return null;
  const band = bandCents[predicted.register - 1] ?? bandCents.at(-1) ?? 0;
  // What hangs inside the band is left alone.
  const isMendable = readOnly === null && Math.abs(predicted.centsFromScale ?? Infinity) > band;
  return (
    <SuggestionWords
      note={predicted.note}
      cents={predicted.centsFromScale}
      bandCents={band}
      holeTitle={chosen.title}
      presentMm={chosen.hole.diameterMm}
      mouthWord={MOUTH_WORDS[document.mouthEnd.kind]}
      suggestions={isMendable ? suggestion.suggestions : []}
      unit={unit}
      disabled={readOnly !== null}
      canPutBack={suggestion.canPutBack}
      onTry={suggestion.tryOut}
      onPutBack={suggestion.putBack}
    />
  );
}
