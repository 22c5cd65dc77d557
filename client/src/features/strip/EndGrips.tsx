import { useState, type KeyboardEvent } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { boreEnds, fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import { moveMouthEnd, moveStopper, trimFoot } from '../../bench/end-edits.ts';
import { MOUTH_WORDS } from '../../bench/mouth-words.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { useRestingValue } from '../../bench/use-resting-value.ts';
import { useEndDrag, type EndDragOptions } from './use-end-drag.ts';

interface EndGripsProps extends PanelProps {
  desk: EndDragOptions['desk'];
  isDragging: boolean;
  onDragging: (isDragging: boolean) => void;
}

interface End {
  key: 'mouth' | 'foot' | 'stopper';
  title: string;
  positionMm: number;
  /** What the figure of its spoken name counts from. */
  figure: string;
  moved: (start: DesignDocument, byMm: number) => DesignDocument;
}

/** Grips for mouth end, stopper and foot, on the bore's axis in the section. */
export function EndGrips(props: EndGripsProps) {
  const { frame } = props.geometry;
  // What is in the hand stays, wherever it has been pulled: a grip that went away would never be let go.
  const [held, setHeld] = useState<End['key'] | null>(null);
  return endsOf(props.document, props)
    .filter(({ key, positionMm }) => {
      if (key === held) return true;
      const x = frame.x(positionMm);
      return x >= frame.viewLeft - 1 && x <= frame.viewRight + 1;
    })
    .map((end) => (
      <EndGrip key={end.key} end={end} {...props} onHold={(isHeld) => setHeld(isHeld ? end.key : null)} />
    ));
}

function endsOf(document: DesignDocument, { unit }: Pick<PanelProps, 'unit'>): End[] {
  const { mouthEnd } = document;
  const { footMm } = boreEnds(document);
  const length = (mm: number) => `${printLength(mm, unit)} ${unit}`;
  const ends: End[] = [
    {
      key: 'mouth',
      title: MOUTH_WORDS[mouthEnd.kind],
      positionMm: 0,
      figure: `${length(fromFootMm(document, 0))} from foot`,
      moved: moveMouthEnd,
    },
    {
      key: 'foot',
      title: 'foot',
      positionMm: footMm,
      figure: `${length(footMm)} from the mouth end`,
      moved: trimFoot,
    },
  ];
  if (mouthEnd.kind !== 'embouchure') return ends;
  const { stopperMm } = mouthEnd;
  return [
    ...ends,
    {
      key: 'stopper',
      title: 'stopper',
      positionMm: -stopperMm,
      figure: `${length(stopperMm)} from the embouchure hole`,
      moved: (start, byMm) => moveStopper(start, stopperOf(start) - byMm),
    },
  ];
}

const stopperOf = ({ mouthEnd }: DesignDocument) => (mouthEnd.kind === 'embouchure' ? mouthEnd.stopperMm : 0);

/** One press of Alt and an arrow, mm; with Shift five times as much. */
const STEP_MM = 0.1;

interface EndGripProps extends EndGripsProps {
  end: End;
  onHold: (isHeld: boolean) => void;
}

function EndGrip({ end, ...props }: EndGripProps) {
  const { geometry, selection, readOnly, onSelect, onEdit } = props;
  const { frame } = geometry;
  const { measures, x } = frame;
  const canEdit = readOnly === null;
  const label = `Move the ${end.title}`;
  const handlers = useEndDrag({
    ...props,
    frame,
    canEdit,
    label,
    moved: end.moved,
    isOrigin: end.key === 'mouth',
    onDragging: (isDragging) => {
      props.onHold(isDragging);
      props.onDragging(isDragging);
    },
  });
  const figure = useRestingValue(end.figure, props.isDragging);
  const isChosen = selection.hole === end.key;
  const choose = () => end.key !== 'stopper' && onSelect({ hole: end.key });
  const onKeyDown = (event: KeyboardEvent) => {
    const along = { ArrowLeft: -1, ArrowRight: 1 }[event.key];
    if (along === undefined || !event.altKey || !canEdit) return;
    event.preventDefault();
    event.stopPropagation();
    const byMm = along * STEP_MM * (event.shiftKey ? 5 : 1);
    onEdit({ label, change: (before) => end.moved(before, byMm), mergeKey: `keys-${end.key}` });
  };
  const y = measures.hasSection ? measures.sectionY : measures.planY;
  return (
    <button
      type="button"
      aria-label={`${end.title.charAt(0).toUpperCase()}${end.title.slice(1)}, ${figure}`}
      aria-pressed={end.key === 'stopper' ? undefined : isChosen}
      onClick={choose}
      onKeyDown={onKeyDown}
      {...handlers}
      className="absolute top-0 left-0 flex h-11 w-5.5 touch-none items-center justify-center select-none pointer-coarse:w-11"
      style={{
        transform: `translate(calc(${x(end.positionMm)}px - 50%), calc(${y}px - 50%))`,
        cursor: canEdit ? 'ew-resize' : 'pointer',
      }}
    >
      <span className={isChosen ? 'bench-end-knot is-chosen' : 'bench-end-knot'} />
    </button>
  );
}
