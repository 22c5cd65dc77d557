import { memo } from 'react';
import type { Fingering } from '#shared/document/design-document.ts';
import { FingeringCircle } from '../../bench/FingeringCircle.tsx';
import { holeMark, spokenMark } from '../../bench/fingering-marks.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';

interface TapCircleProps {
  /** undefined: a column of no hole, which has no circle. */
  labelled: LabelledHole | undefined;
  fingering: Fingering;
  x: number;
  y: number;
  /** Side of the square that may be hit, px. */
  size: number;
  isReached: boolean;
  readOnly: boolean;
  onTap: (labelled: LabelledHole) => void;
}

const RADIUS = 7.4;

/** One hole of one fingering: a tap covers, half covers, opens. */
export const TapCircle = memo(function TapCircle(props: TapCircleProps) {
  const { labelled, fingering, x, y, size, isReached, readOnly, onTap } = props;
  if (labelled === undefined) return null;
  const mark = holeMark(fingering, labelled.hole);
  const half = size / 2;
  const name = `${labelled.title} ${spokenMark(mark)}`;
  const circle = (
    <svg width={size} height={size} className="block overflow-visible" aria-hidden="true">
      <FingeringCircle x={half} y={half} radius={Math.min(RADIUS, half - 2)} mark={mark} />
    </svg>
  );
  return (
    <div role="cell" className="absolute" style={{ left: x - half, top: y - half }}>
      {readOnly || mark === 'never' ? (
        <>
          {circle}
          <span className="sr-only">{name}</span>
        </>
      ) : (
        <button
          type="button"
          aria-label={`${fingering.note}: ${name}`}
          tabIndex={isReached ? 0 : -1}
          onClick={() => onTap(labelled)}
          className="rounded-disc block"
        >
          {circle}
        </button>
      )}
    </div>
  );
});
