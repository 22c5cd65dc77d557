import type { LabelledHole } from '#shared/document/hole-labels.ts';
import { formatCents } from '#shared/music/cents.ts';
import type { NotesLayout } from './note-lane.ts';

const HEIGHT = 44;
/** Below this the scale has no room for its words. */
const ROOM_FOR_WORDS = 200;

interface ChartHeadProps {
  layout: NotesLayout;
  holes: readonly LabelledHole[];
  chosenHole: string | null;
}

/** Headings of the chart, the scale that the bobs hang on, and the lines that come down from the holes. */
export function ChartHead({ layout, holes, chosenHole }: ChartHeadProps) {
  const { noteX, hzRight, centsRight, lane, columns, isStacked } = layout;
  const labelOf = (id: string) => holes.find(({ hole }) => hole.id === id);
  return (
    <div role="row" className="relative" style={{ height: HEIGHT }}>
      <svg width="100%" height={HEIGHT} className="absolute inset-0 overflow-visible" aria-hidden="true">
        {lane.ticks.map((cents) => (
          <g key={cents} transform={`translate(${lane.x(cents)} 0)`}>
            <line y1={HEIGHT - 4} y2={HEIGHT} className="bench-beam-tick" />
            <text y={HEIGHT - 9} textAnchor="middle" className="bench-quiet-label">
              {formatCents(cents, 0)}
            </text>
          </g>
        ))}
        {lane.right - lane.left > ROOM_FOR_WORDS && (
          <>
            <text x={lane.left} y={HEIGHT - 9} className="bench-quiet-label">
              flat
            </text>
            <text x={lane.right} y={HEIGHT - 9} textAnchor="end" className="bench-quiet-label">
              sharp
            </text>
          </>
        )}
        {!isStacked &&
          columns.map(({ key, holeX, x }) => (
            <path
              key={key}
              d={`M${holeX} 0V8L${x} ${HEIGHT - 12}V${HEIGHT}`}
              className={key === chosenHole ? 'bench-leader is-chosen' : 'notes-guide'}
            />
          ))}
      </svg>
      <HeadCell left={noteX}>Note</HeadCell>
      {hzRight !== null && <HeadCell right={hzRight}>Hz</HeadCell>}
      <HeadCell right={centsRight}>Cents</HeadCell>
      {columns.map(({ key }) => (
        <span key={key} role="columnheader" className="sr-only">
          {labelOf(key)?.title}
        </span>
      ))}
      <span role="columnheader" className="sr-only">
        Remark
      </span>
    </div>
  );
}

function HeadCell({ left, right, children }: { left?: number; right?: number; children: string }) {
  const place =
    left === undefined ? { left: (right ?? 0) - 80, width: 80, textAlign: 'right' as const } : { left };
  return (
    <span role="columnheader" className="text-small text-ink3 absolute bottom-1.5" style={place}>
      {children}
    </span>
  );
}
