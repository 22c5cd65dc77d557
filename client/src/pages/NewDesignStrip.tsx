import { useMemo } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { BenchDefs } from '../bench/BenchDefs.tsx';
import { benchFrame } from '../bench/bench-geometry.ts';
import { WHOLE } from '../bench/bench-view.ts';
import { drawnBody } from '../bench/drawn-body.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import { DrawnInstrument } from '../features/strip/DrawnInstrument.tsx';
import { useElementWidth } from '../ui/use-element-width.ts';

interface NewDesignStripProps {
  document: DesignDocument;
  unit: LengthUnit;
}

/** The instrument as it will lie on the bench, to look at. */
export function NewDesignStrip({ document, unit }: NewDesignStripProps) {
  const [ref, widthPx] = useElementWidth();
  return (
    <div ref={ref} className="border-hair bg-bench overflow-hidden border-y">
      {widthPx !== null && <Strip document={document} unit={unit} widthPx={widthPx} />}
    </div>
  );
}

function Strip({ document, unit, widthPx }: NewDesignStripProps & { widthPx: number }) {
  const frame = useMemo(() => benchFrame(drawnBody(document), widthPx, WHOLE), [document, widthPx]);
  // The rule stands out of the strip by a little, as at the workbench.
  const height = frame.measures.stripHeight + 3;
  return (
    <>
      <BenchDefs />
      <svg
        width={widthPx}
        height={height}
        viewBox={`0 0 ${widthPx} ${height}`}
        role="img"
        aria-label={`${document.name}, ${document.holes.length} holes, drawn to scale`}
        className="block"
      >
        <DrawnInstrument frame={frame} shape={document} holes={labelledHoles(document)} unit={unit} />
      </svg>
    </>
  );
}
