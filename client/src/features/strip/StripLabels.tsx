import type { DesignDocument } from '#shared/document/design-document.ts';
import { boreEnds, fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import type { BenchGeometry } from '../../bench/bench-geometry.ts';
import { MOUTH_WORDS } from '../../bench/mouth-words.ts';

interface StripLabelsProps {
  geometry: BenchGeometry;
  document: DesignDocument;
  chosenKey: string | null;
  unit: LengthUnit;
}

/** Words at both ends of the instrument, and the chosen hole's figure on the rule. */
export function StripLabels({ geometry, document, chosenKey, unit }: StripLabelsProps) {
  const { frame } = geometry;
  const { measures } = frame;
  const mouthX = frame.x(0);
  const footX = frame.x(geometry.body.footMm);
  const chosenMm = placeOf(document, chosenKey);
  const chipX = chosenMm === null ? null : frame.x(chosenMm);
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
      {chosenMm !== null && chipX !== null && chipX >= frame.viewLeft - 1 && chipX <= frame.viewRight + 1 && (
        <g transform={`translate(${chipX} 0)`}>
          <rect x={-25} y={chipY} width={50} height={measures.ruleHeight - 4} rx={3} className="bench-chip" />
          <text
            y={chipY + (measures.ruleHeight - 4) / 2 + 4.8}
            textAnchor="middle"
            className="bench-chip-figure"
          >
            {printLength(fromFootMm(document, chosenMm), unit)}
          </text>
        </g>
      )}
    </>
  );
}

/** Where the chosen hole or end is; null with nothing chosen. */
function placeOf(document: DesignDocument, key: string | null): number | null {
  if (key === 'mouth') return 0;
  if (key === 'foot') return boreEnds(document).footMm;
  return document.holes.find(({ id }) => id === key)?.positionMm ?? null;
}
