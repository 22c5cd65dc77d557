import { scaleLinear } from 'd3';
import { memo } from 'react';
import type { Station } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import type { BenchGeometry } from '../../bench/bench-geometry.ts';
import type { Comparison } from './comparison.ts';
import './compare.css';

interface BoreLinesProps {
  comparison: Comparison;
  geometry: BenchGeometry;
  unit: LengthUnit;
}

/** Heights on the shelf, px from its top. */
const SHELF = { height: 188, woodY: 34, wideY: 62, narrowY: 158 } as const;
/** Bores that hardly differ are not blown up beyond this, px per mm. */
const MOST_PX_PER_MM = 228;
/** Figures stand at the left of the drawing where there is so much room, px. */
const ROOM_FOR_FIGURES = 70;

/** The walls of both bores over each other, drawn wider than true: wood above, air below; the older one dashed. */
export const BoreLines = memo(function BoreLines({ comparison, geometry, unit }: BoreLinesProps) {
  const { a, b, offsetMm } = comparison;
  const [ofA, ofB] = [a.document.bore.stations, b.document.bore.stations];
  const scale = widthScale([...ofA, ...ofB]);
  const { mouthMm, footMm } = boreEnds(b.document);
  const [left, right] = [geometry.x(mouthMm), geometry.x(footMm)];
  const line = (stations: readonly Station[], byMm = 0) =>
    stations
      .map(
        ({ positionMm, diameterMm }) =>
          `${geometry.x(positionMm + byMm).toFixed(1)} ${scale.y(diameterMm).toFixed(1)}`,
      )
      .join('L');
  const isBeside = left >= ROOM_FOR_FIGURES;
  const times = (scale.pxPerMm / geometry.pxPerMm).toFixed(scale.pxPerMm / geometry.pxPerMm < 10 ? 1 : 0);
  return (
    <svg
      width={geometry.widthPx}
      height={SHELF.height}
      role="img"
      aria-label={`Bores of ${a.label}, dashed, and ${b.label}, drawn ${times} times wider than they are long; the table below has the figures`}
      className="border-hair block border-b"
    >
      <clipPath id="compare-shelf">
        <rect
          x={geometry.viewLeft - 1}
          width={geometry.viewRight - geometry.viewLeft + 2}
          height={SHELF.height}
        />
      </clipPath>
      <g clipPath="url(#compare-shelf)">
        <path d={`M${left} ${SHELF.woodY}L${line(ofB)}L${right} ${SHELF.woodY}Z`} className="compare-wood" />
        {scale.ticks.map((mm) => (
          <line key={mm} x1={left} x2={right} y1={scale.y(mm)} y2={scale.y(mm)} className="compare-grid" />
        ))}
        <path d={`M${line(ofB)}`} className="compare-bore-line" />
        <path d={`M${line(ofA, offsetMm)}`} className="compare-old-bore" />
      </g>
      {scale.ticks.map((mm) => (
        <text
          key={mm}
          x={isBeside ? left - 10 : right - 12}
          y={scale.y(mm) + 4}
          textAnchor="end"
          className="bench-quiet-label compare-haloed"
        >
          {printLength(mm, unit, scale.digits[unit])}
        </text>
      ))}
      <Caption labels={{ a: a.label, b: b.label }} times={times} x={geometry.measures.leftZone.x} />
    </svg>
  );
});

interface CaptionProps {
  labels: { a: string; b: string };
  times: string;
  x: number;
}

function Caption({ labels, times, x }: CaptionProps) {
  return (
    <g aria-hidden="true" transform={`translate(${x} 0)`}>
      <text y={20} className="bench-quiet-label compare-haloed">
        <tspan className="bench-label-strong">Bore wall</tspan>
        <tspan dx={8}>wood above, air below, {times} times wider than it is long</tspan>
      </text>
      <path d={`M0 ${SHELF.height - 16}h26`} className="compare-old-bore" />
      <text x={32} y={SHELF.height - 12} className="bench-quiet-label">
        {labels.a}
      </text>
      <path d={`M118 ${SHELF.height - 16}h26`} className="compare-bore-line" />
      <text x={150} y={SHELF.height - 12} className="bench-quiet-label">
        {labels.b}
      </text>
    </g>
  );
}

function widthScale(stations: readonly Station[]) {
  const widths = stations.map(({ diameterMm }) => diameterMm);
  const [widest, narrowest] = [Math.max(...widths), Math.min(...widths)];
  const room = SHELF.narrowY - SHELF.wideY;
  const pxPerMm = Math.min(MOST_PX_PER_MM, room / Math.max(widest - narrowest, 1e-6));
  const scale = scaleLinear([widest, widest - room / pxPerMm], [SHELF.wideY, SHELF.narrowY]);
  const ticks = scaleLinear([widest - room / pxPerMm, widest], [0, 1]).ticks(4);
  const step = (ticks[1] ?? 1) - (ticks[0] ?? 0);
  return {
    y: (mm: number) => scale(mm),
    pxPerMm,
    ticks,
    digits: { mm: step < 0.099 ? 2 : 1, inch: 3 },
  };
}
