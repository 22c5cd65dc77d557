import type { ReactNode } from 'react';
import type { Station } from '#shared/document/design-document.ts';
import { nameOf } from '#shared/measured-bore/bore-readings.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { MEASURED_SHELF } from './measured-scale.ts';
import { printWidth } from './measured-words.ts';
import { LeftOutMark, ReadingDot, shapeOfColumn } from './ReadingMarks.tsx';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

interface ShelfKeyProps extends Pick<PanelProps, 'geometry' | 'unit'> {
  desk: Pick<MeasuredBoreDesk, 'measured' | 'fitted'>;
  drawn: readonly Station[];
  /** Left edge, px. */
  from: number;
}

interface KeyItem {
  words: string;
  mark: (x: number) => ReactNode;
  /** Room for the mark, px. */
  markPx: number;
}

/** About how wide a letter of the key stands, px: SVG text knows its width only once it is drawn. */
const LETTER_PX = 6.4;
const BETWEEN_PX = 30;
const LONGEST_NAME = 22;
/** The shelf has its own unit. */
const UNIT_IN_NAME = /\s*[[(](mm|cm|in|inch|inches)\.?[\])]\s*$/i;

/** Two lines where one has no room. */
const LINE_PX = 20;

/** What each mark of the shelf means. */
export function ShelfKey(props: ShelfKeyProps) {
  const { geometry, from } = props;
  const room = geometry.widthPx - 8;
  const places = keyItems(props).reduce<{ item: KeyItem; x: number; line: number; end: number }[]>(
    (made, item) => {
      const width = item.markPx + 8 + item.words.length * LETTER_PX;
      const last = made.at(-1) ?? { end: from - BETWEEN_PX, line: 0 };
      const isOnLine = last.end + BETWEEN_PX + width <= room;
      const x = isOnLine ? last.end + BETWEEN_PX : from;
      return [...made, { item, x, line: isOnLine ? last.line : last.line + 1, end: x + width }];
    },
    [],
  );
  const top = MEASURED_SHELF.keyY - ((places.at(-1)?.line ?? 0) * LINE_PX) / 2;
  return places.map(({ item, x, line }) => (
    <g key={item.words} transform={`translate(${x} ${top + line * LINE_PX})`}>
      {item.mark(item.markPx / 2)}
      <text x={item.markPx + 8} y={4.5} className="bench-label">
        {item.words}
      </text>
    </g>
  ));
}

function keyItems({ desk, drawn, unit }: ShelfKeyProps): KeyItem[] {
  const { measured, fitted } = desk;
  const drawnItem: KeyItem = {
    words: drawnWords(drawn, unit),
    markPx: 22,
    mark: (x) => <path d={`M${x - 11} 0h22`} className="measured-drawn" />,
  };
  if (measured?.status !== 'read' || fitted === null) return [];
  const shapes = shapeOfColumn(measured.readings);
  const gauges = [...shapes].map(([column, shape]): KeyItem => {
    const name = nameOf(measured.columns[column] ?? { title: null, index: column }).replace(UNIT_IN_NAME, '');
    return {
      words: name.length > LONGEST_NAME ? `${name.slice(0, LONGEST_NAME - 1)}…` : name,
      markPx: 8,
      mark: (x) => <ReadingDot x={x} y={0} shape={shape} size={2.6} />,
    };
  });
  return [
    ...gauges,
    ...(fitted.leftOut.length > 0
      ? [{ words: 'left out', markPx: 16, mark: (x: number) => <LeftOutMark x={x} y={0} /> }]
      : []),
    {
      words: 'station kept',
      markPx: 11,
      mark: (x) => <rect x={x - 5.5} y={-5.5} width={11} height={11} rx={2} className="bore-knot" />,
    },
    drawnItem,
  ];
}

function drawnWords(drawn: readonly Station[], unit: PanelProps['unit']): string {
  const widths = drawn.map(({ diameterMm }) => diameterMm);
  const [least, most] = [Math.min(...widths), Math.max(...widths)];
  const range =
    most - least < 0.005 ? printWidth(most, unit) : `${printWidth(least, unit)} to ${printWidth(most, unit)}`;
  return `drawn, ${range}`;
}
