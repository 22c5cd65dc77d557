import { useMemo } from 'react';
import { fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import { leadingNote } from '../../bench/hole-sensitivity.ts';
import { hungNotes } from '../../bench/hung-notes.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { spokenHungNote } from '../../bench/spoken-pitch.ts';
import { useRestingValue } from '../../bench/use-resting-value.ts';
import { useSpokenChange } from './use-spoken-change.ts';

/** Says politely what became of the chosen hole: "Hole 4, 78.2 from foot, 7.0 mm. G 5 0.1 cents flat." */
export function SpokenChange({ selection, unit, ...props }: PanelProps & { isDragging: boolean }) {
  const document = useRestingValue(props.document, props.isDragging);
  const prediction = useRestingValue(props.prediction, props.isDragging);
  const sentence = useMemo(() => {
    const chosen = labelledHoles(document).find(({ hole }) => hole.id === selection.hole);
    if (chosen === undefined) return '';
    const { hole, title } = chosen;
    const note = leadingNote(hungNotes(document, prediction), hole.id, selection);
    const sizes = `${printLength(fromFootMm(document, hole.positionMm), unit)} from foot, ${printLength(hole.diameterMm, unit)} ${unit}`;
    return `${title}, ${sizes}. ${note === undefined ? '' : spokenHungNote(note)}`;
  }, [document, prediction, selection, unit]);
  const spoken = useSpokenChange(sentence);
  return (
    <p role="status" aria-live="polite" className="sr-only">
      {spoken}
    </p>
  );
}
