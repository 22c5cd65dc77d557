import { useMemo } from 'react';
import { fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { BodyShape } from '../../bench/drawn-body.ts';
import type { LabelledHole } from '../../bench/hole-labels.ts';
import { hungNotes, notesOfColumn, type HungNote } from '../../bench/hung-notes.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { spokenHungNote } from '../../bench/spoken-pitch.ts';
import { HoleButton } from './HoleButton.tsx';
import { useHoleDrag } from './use-hole-drag.ts';

interface HoleButtonsProps extends PanelProps {
  shape: BodyShape;
  holes: readonly LabelledHole[];
  onDragging: (isDragging: boolean) => void;
}

/** Notes named with a hole; more would be a speech. */
const NAMED_NOTES = 3;

/** A button over every hole in view. */
export function HoleButtons(props: HoleButtonsProps) {
  const { document, prediction, geometry, selection, readOnly, shape, holes, onSelect } = props;
  const notes = useMemo(() => hungNotes(document, prediction), [document, prediction]);
  const canEdit = readOnly === null;
  const drag = useHoleDrag({
    document,
    holes,
    frame: geometry.frame,
    unit: props.unit,
    canEdit,
    onEdit: props.onEdit,
    onChoose: (hole) => onSelect({ hole }),
    onDragging: props.onDragging,
  });
  return holes
    .filter(({ hole }) => geometry.columns.some((column) => column.key === hole.id))
    .map((labelled) => (
      <HoleButton
        key={labelled.hole.id}
        frame={geometry.frame}
        shape={shape}
        labelled={labelled}
        name={spokenHole(props, labelled, notes)}
        isChosen={labelled.hole.id === selection.hole}
        canEdit={canEdit}
        drag={drag}
        onChoose={() => onSelect({ hole: labelled.hole.id })}
      />
    ));
}

/** "Hole 4, 78.2 mm from foot, 6.5 mm, G 5 6.1 cents flat". */
function spokenHole(
  { document, unit }: PanelProps,
  { hole, title }: LabelledHole,
  notes: readonly HungNote[],
): string {
  const length = (mm: number) => `${printLength(mm, unit)} ${unit}`;
  const hung = notesOfColumn(notes, hole.id).slice(0, NAMED_NOTES).map(spokenHungNote);
  const place = `${length(fromFootMm(document, hole.positionMm))} from foot`;
  return [title, place, length(hole.diameterMm), ...hung].join(', ');
}
