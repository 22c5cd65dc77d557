import type { DesignDocument } from '#shared/document/design-document.ts';
import { fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import type { BenchColumn, BenchGeometry } from '../../bench/bench-geometry.ts';
import { MOUTH_WORDS } from '../../bench/mouth-words.ts';

interface StripLabelsProps {
  geometry: BenchGeometry;
  document: DesignDocument;
  chosen: BenchColumn | undefined;
  unit: LengthUnit;
}

/** Words at both ends of the instrument, and the chosen hole's figure on the rule. */
export function StripLabels({ geometry, document, chosen, unit }: StripLabelsProps) {
  const { frame } = geometry;
  const { measures } = frame;
  const chosenHole = document.holes.find((hole) => hole.id === chosen?.key);
  const mouthX = frame.x(0);
  const footX = frame.x(geometry.body.footMm);
  const figure =
    chosen === undefined
      ? ''
      : printLength(fromFootMm(document, chosenHole?.positionMm ?? geometry.body.footMm), unit);
  const chipY = measures.ruleY + 2.5;
  return (
    <>
      {mouthX >= frame.viewLeft - 1 && (
        <text
          x={Math.max(mouthX, frame.viewLeft)}
          y={17}
          textAnchor={mouthX - frame.viewLeft < 50 ? 'start' : 'middle'}
          className="bench-quiet-label"
        >
          {MOUTH_WORDS[document.mouthEnd.kind]}
        </text>
      )}
      {footX <= frame.viewRight + 1 && (
        <text x={footX - 4} y={17} textAnchor="end" className="bench-quiet-label">
          foot
        </text>
      )}
      {chosen !== undefined && (
        <g transform={`translate(${chosen.holeX} 0)`}>
          <rect x={-25} y={chipY} width={50} height={measures.ruleHeight - 4} rx={3} className="bench-chip" />
          <text
            y={chipY + (measures.ruleHeight - 4) / 2 + 4.8}
            textAnchor="middle"
            className="bench-chip-figure"
          >
            {figure}
          </text>
        </g>
      )}
    </>
  );
}
