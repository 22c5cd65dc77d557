import { memo } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { planHole, planPath, type Place } from './body-paths.ts';
import { drawnBody } from './drawn-body.ts';
import { MouthPlan } from './MouthPlan.tsx';
import './bench.css';

interface InstrumentOutlineProps {
  document: DesignDocument;
  /** The rack's one scale; lengths and widths alike. */
  pxPerMm: number;
  /** Least thickness of the drawing, px: thin pipes at a small scale stay visible. */
  leastTubePx?: number;
  /** Spoken name; left out where the row beside it says the same. */
  label?: string;
}

/** An instrument seen from above, flat, at a rack's scale; the foot is the drawing's right edge. */
export const InstrumentOutline = memo(function InstrumentOutline({
  document,
  pxPerMm,
  leastTubePx = 9,
  label,
}: InstrumentOutlineProps) {
  const body = drawnBody(document);
  const across = Math.max(pxPerMm, leastTubePx / body.widestMm);
  const width = (body.footMm - body.headMm) * pxPerMm;
  const height = body.widestMm * across;
  const place: Place = { x: (mm) => (mm - body.headMm) * pxPerMm, across, axisY: height / 2 };
  return (
    <svg
      width={width + 2}
      height={height + 2}
      viewBox={`-1 -1 ${width + 2} ${height + 2}`}
      {...(label === undefined ? { 'aria-hidden': true } : { role: 'img', 'aria-label': label })}
    >
      <path d={planPath(document, body, place)} className="bench-wood-flat" />
      <MouthPlan shape={document} body={body} place={place} />
      {document.holes.map((hole) => {
        const { behind, ...ellipse } = planHole(document, hole, place);
        return <ellipse key={hole.id} {...ellipse} className={behind ? 'bench-hole-behind' : 'bench-hole'} />;
      })}
    </svg>
  );
});
