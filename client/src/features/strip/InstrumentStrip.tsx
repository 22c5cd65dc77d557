import { useMemo, useRef } from 'react';
import { boreEnds, fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import { columnOf } from '../../bench/bench-geometry.ts';
import type { BenchView } from '../../bench/bench-view.ts';
import { snapToDrill } from '../../bench/drill-choice.ts';
import { addHole, snapPosition, widestHoleMm } from '../../bench/hole-edits.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { DrawnInstrument } from './DrawnInstrument.tsx';
import { EndGrips } from './EndGrips.tsx';
import { HoleButtons } from './HoleButtons.tsx';
import { PlaceSpot } from './PlaceSpot.tsx';
import { StripLabels } from './StripLabels.tsx';
import { useViewGestures } from './use-view-gestures.ts';

interface InstrumentStripProps extends PanelProps {
  desk: { view: BenchView; setView: (view: BenchView) => void };
  placing: {
    /** Where a new hole is offered, mm from the mouth end; null for nowhere. */
    spotMm: number | null;
    /** The next touch of the bare instrument places a hole. */
    isPlacing: boolean;
    moveSpot: (positionMm: number | null) => void;
  };
  isDragging: boolean;
  onDragging: (isDragging: boolean) => void;
}

/** The instrument across the top of the bench, to scale: plan, section and rule, its holes in hand. */
export function InstrumentStrip(props: InstrumentStripProps) {
  const { document, geometry, unit, selection, readOnly, onSelect, onEdit, desk, placing } = props;
  const { frame } = geometry;
  const strip = useRef<HTMLDivElement>(null);
  const { bore, outside, mouthEnd, foot } = document;
  const shape = useMemo(() => ({ bore, outside, mouthEnd, foot }), [bore, outside, mouthEnd, foot]);
  const holes = useMemo(() => labelledHoles(document), [document]);
  const canEdit = readOnly === null;
  const placeHole = (positionMm: number) => {
    const place = (before: PanelProps['document']) => addHole(before, positionMm, usualDiameter(props));
    const added = place(document).holes.find(({ id }) => !document.holes.some((hole) => hole.id === id));
    onEdit({ label: 'Add a hole', change: place });
    placing.moveSpot(null);
    if (added !== undefined) onSelect({ hole: added.id, fingering: selection.fingering });
  };
  const touchAt = (x: number) => {
    const positionMm = snapPosition(document, frame.mm(x));
    const isOnBore = frame.mm(x) > 0 && frame.mm(x) < boreEnds(document).footMm;
    if (!canEdit || !isOnBore) placing.moveSpot(null);
    else if (placing.isPlacing) placeHole(positionMm);
    else placing.moveSpot(positionMm);
  };
  const gestures = useViewGestures({ strip, frame, view: desk.view, onView: desk.setView, onTap: touchAt });
  const chosen = columnOf(geometry, selection.hole);
  return (
    <div
      ref={strip}
      role="group"
      aria-label="Instrument"
      className="relative touch-pan-y overflow-x-clip"
      style={{ height: frame.measures.stripHeight }}
    >
      <svg
        width={frame.widthPx}
        height={frame.measures.stripHeight + 3}
        className="block overflow-visible"
        aria-hidden="true"
        {...gestures}
        onDoubleClick={(event) => {
          const left = strip.current?.getBoundingClientRect().left ?? 0;
          if (canEdit) placeHole(snapPosition(document, frame.mm(event.clientX - left)));
        }}
      >
        <DrawnInstrument frame={frame} shape={shape} holes={holes} unit={unit} chosen={chosen} />
        <StripLabels geometry={geometry} document={document} chosenKey={selection.hole} unit={unit} />
        {placing.spotMm !== null && (
          <circle
            cx={frame.x(placing.spotMm)}
            cy={frame.measures.planY}
            r={(usualDiameter(props) * frame.pxPerMm) / 2}
            className="bench-ghost-ring"
          />
        )}
      </svg>
      <EndGrips {...props} />
      <HoleButtons {...props} shape={shape} holes={holes} />
      {placing.spotMm !== null && (
        <PlaceSpot
          frame={frame}
          positionMm={placing.spotMm}
          figure={printLength(fromFootMm(document, placing.spotMm), unit)}
          takesFocus={placing.isPlacing}
          onPlace={() => placing.spotMm !== null && placeHole(placing.spotMm)}
          onMove={(byMm) =>
            placing.spotMm !== null && placing.moveSpot(snapPosition(document, placing.spotMm + byMm))
          }
          onLeave={() => placing.moveSpot(null)}
        />
      )}
    </div>
  );
}

/** A new hole is drilled like the others: their middle size, or half the bore. */
function usualDiameter({ document, unit }: Pick<PanelProps, 'document' | 'unit'>): number {
  const sizes = document.holes.map((hole) => hole.diameterMm).sort((a, b) => a - b);
  const widest = widestHoleMm(document, boreEnds(document).footMm / 2);
  return snapToDrill(sizes[Math.floor(sizes.length / 2)] ?? widest / 2, unit, widest);
}
