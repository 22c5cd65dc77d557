import { useMemo } from 'react';
import { fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { BodyShape } from '../../bench/drawn-body.ts';
import { labelledHoles, type LabelledHole } from '#shared/document/hole-labels.ts';
import { hungNotes, notesOfColumn } from '../../bench/hung-notes.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { spokenHungNote } from '../../bench/spoken-pitch.ts';
import { useRestingValue } from '../../bench/use-resting-value.ts';
import { useStable } from '../../bench/use-stable.ts';
import { HoleButton } from './HoleButton.tsx';
import { useHoleDrag } from './use-hole-drag.ts';

interface HoleButtonsProps extends PanelProps {
  shape: BodyShape;
  holes: readonly LabelledHole[];
  isDragging: boolean;
  onDragging: (isDragging: boolean) => void;
}

/** Notes named with a hole; more would be a speech. */
const NAMED_NOTES = 3;

/** A button over every hole in view. Their spoken names rest during a drag; the change is said when it is done. */
export function HoleButtons(props: HoleButtonsProps) {
  const { geometry, selection, readOnly, shape, holes, isDragging } = props;
  const choose = useStable((hole: string) => props.onSelect({ hole }));
  const handlers = useHoleDrag({
    ...props,
    frame: geometry.frame,
    canEdit: readOnly === null,
    onChoose: choose,
  });
  const resting = useRestingValue(props.document, isDragging);
  const predicted = useRestingValue(props.prediction, isDragging);
  const { unit } = props;
  const names = useMemo(() => spokenHoles(resting, predicted, unit), [resting, predicted, unit]);
  return holes
    .filter(({ hole }) => geometry.columns.some((column) => column.key === hole.id))
    .map(({ hole, title }) => (
      <HoleButton
        key={hole.id}
        frame={geometry.frame}
        shape={shape}
        hole={hole}
        name={names.get(hole.id) ?? title}
        isChosen={hole.id === selection.hole}
        canEdit={readOnly === null}
        handlers={handlers}
        onChoose={choose}
      />
    ));
}

/** "Hole 4, 78.2 mm from foot, 6.5 mm, G 5 6.1 cents flat", by hole. */
function spokenHoles(
  document: PanelProps['document'],
  prediction: PanelProps['prediction'],
  unit: PanelProps['unit'],
): Map<string, string> {
  const notes = hungNotes(document, prediction);
  const length = (mm: number) => `${printLength(mm, unit)} ${unit}`;
  return new Map(
    labelledHoles(document).map(({ hole, title }) => {
      const hung = notesOfColumn(notes, hole.id).slice(0, NAMED_NOTES).map(spokenHungNote);
      const place = `${length(fromFootMm(document, hole.positionMm))} from foot`;
      return [hole.id, [title, place, length(hole.diameterMm), ...hung].join(', ')];
    }),
  );
}
