import { useMemo } from 'react';
import { columnOf } from '../bench/bench-geometry.ts';
import { drawnBody } from '../bench/drawn-body.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import type { PanelProps } from '../bench/panel-props.ts';
import type { Comparison } from '../features/compare/comparison.ts';
import { OldOutline } from '../features/compare/OldOutline.tsx';
import { DrawnInstrument } from '../features/strip/DrawnInstrument.tsx';
import { HoleButtons } from '../features/strip/HoleButtons.tsx';
import { StripLabels } from '../features/strip/StripLabels.tsx';

interface CompareStripProps {
  bench: PanelProps;
  /** null where one of the two is looked at alone. */
  comparison: Comparison | null;
}

const ignore = () => undefined;

/** The instrument in hand, drawn solid, and over it what the older one has elsewhere, dashed. Both to one scale. */
export function CompareStrip({ bench, comparison }: CompareStripProps) {
  const { document, geometry, selection, unit } = bench;
  const { bore, outside, mouthEnd, foot } = document;
  const shape = useMemo(() => ({ bore, outside, mouthEnd, foot }), [bore, outside, mouthEnd, foot]);
  const holes = useMemo(() => labelledHoles(document), [document]);
  // The scale is that of both; the body drawn is that of one.
  const frame = useMemo(() => ({ ...geometry.frame, body: drawnBody(shape) }), [geometry.frame, shape]);
  const chosen = columnOf(geometry, selection.hole);
  return (
    <div
      role="group"
      aria-label="Instrument"
      className="relative"
      style={{ height: frame.measures.stripHeight }}
    >
      <svg
        width={frame.widthPx}
        height={frame.measures.stripHeight + 3}
        className="block overflow-visible"
        aria-hidden="true"
      >
        <DrawnInstrument frame={frame} shape={shape} holes={holes} unit={unit} chosen={chosen} />
        {comparison !== null && (
          <OldOutline
            frame={frame}
            old={comparison.a.document}
            document={document}
            match={comparison.match}
            offsetMm={comparison.offsetMm}
            label={comparison.a.label}
          />
        )}
        <StripLabels
          geometry={{ ...geometry, body: frame.body }}
          document={document}
          chosenKey={selection.hole}
          unit={unit}
        />
      </svg>
      <HoleButtons {...bench} shape={shape} holes={holes} isDragging={false} onDragging={ignore} />
    </div>
  );
}
