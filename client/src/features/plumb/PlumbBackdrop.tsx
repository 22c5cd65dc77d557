import { memo } from 'react';
import type { BenchGeometry } from '../../bench/bench-geometry.ts';
import { BobMark } from '../../bench/Bob.tsx';
import type { PlumbRow, PlumbRows } from './plumb-rows.ts';
import { bandOf } from '../../bench/band-of.ts';
import { roomyGap } from './roomy-gap.ts';

interface PlumbBackdropProps {
  geometry: BenchGeometry;
  rows: PlumbRows;
  bandCents: readonly number[];
}

/** What stands still behind the bobs: beam, bands and verticals. Drawn from the beam down. */
export function PlumbBackdrop({ geometry, rows, bandCents }: PlumbBackdropProps) {
  const { measures, columns, hangLeft, hangRight } = geometry;
  const tenCents = 10 * measures.pxPerCent;
  return (
    <>
      {rows.registers.map(({ register, y }) => (
        <line key={register} x1={hangLeft} x2={hangRight} y1={y} y2={y} className="bench-row" />
      ))}
      {columns.map(({ key, x }) => (
        <g key={key} transform={`translate(${x} 0)`}>
          <Bands rows={rows} bandCents={bandCents} pxPerCent={measures.pxPerCent} />
          <path d={`M${-tenCents} 0v5M${tenCents} 0v5`} className="bench-beam-tick" />
        </g>
      ))}
      <line x1={hangLeft} x2={hangRight} y1={0} y2={0} className="bench-beam" />
    </>
  );
}

interface BandsProps {
  rows: PlumbRows;
  bandCents: readonly number[];
  pxPerCent: number;
}

/** The band round true: as wide in each row as its register is allowed. */
const Bands = memo(function Bands({ rows, bandCents, pxPerCent }: BandsProps) {
  return (
    <>
      {stretches(rows, bandCents).map(({ from, to, cents }) => {
        const half = cents * pxPerCent;
        return (
          <g key={from}>
            <rect x={-half} y={from} width={2 * half} height={to - from} className="bench-band" />
            <path d={`M${-half} ${from}V${to}M${half} ${from}V${to}`} className="bench-band-edge" />
          </g>
        );
      })}
      <line y1={0} y2={rows.bandEnd} className="bench-true" />
    </>
  );
});

interface Stretch {
  from: number;
  to: number;
  cents: number;
}

/** Neighbouring rows with one width make one band. */
function stretches(rows: PlumbRows, bandCents: readonly number[]): Stretch[] {
  const between = (row: PlumbRow, next: PlumbRow | undefined) =>
    next === undefined ? rows.bandEnd : (row.y + next.y) / 2 + 4;
  return rows.registers.reduce<Stretch[]>((made, row, index) => {
    const cents = bandOf(bandCents, row.register);
    const to = between(row, rows.registers[index + 1]);
    const last = made.at(-1);
    if (last?.cents === cents) return [...made.slice(0, -1), { ...last, to }];
    return [...made, { from: last?.to ?? 0, to, cents }];
  }, []);
}

interface RowLabelsProps {
  geometry: BenchGeometry;
  rows: PlumbRows;
  top: number;
}

/** Names of the rows, right before the first column. */
export function RowLabels({ geometry, rows, top }: RowLabelsProps) {
  const labels = [
    ...rows.registers.map(({ register, y }) => ({ text: `Register ${register}`, register, y, small: false })),
    ...(rows.crossY === null ? [] : [{ text: 'Cross and half', register: 1, y: rows.crossY, small: true }]),
  ];
  return labels.map(({ text, register, y, small }) => (
    <div
      key={text}
      className="text-label text-ink2 absolute flex -translate-y-1/2 items-center justify-end gap-1.5 whitespace-nowrap"
      style={{ top: top + y, right: geometry.widthPx - geometry.labelRight - 22 }}
    >
      {text} <BobMark register={register} small={small} />
    </div>
  ));
}

/** The scale of the bobs, written once where two columns leave room for it. */
export function ScaleKey({ geometry, bandCents }: { geometry: BenchGeometry; bandCents: readonly number[] }) {
  const { measures } = geometry;
  const gap = roomyGap(geometry, KEY_ROOM_PX);
  if (gap === null) return null;
  const band = bandOf(bandCents, 1);
  const at = (cents: number) => cents * measures.pxPerCent;
  const end = measures.heldAtCents - 1;
  return (
    <g transform={`translate(${(gap.left + gap.right) / 2} 83)`} aria-hidden="true">
      <rect x={-at(band)} y={-7} width={2 * at(band)} height={14} className="bench-band" />
      <path
        d={`M${-at(end)} 0H${at(end)}M${-at(end)} -4v8M${at(end)} -4v8M${-at(band)} -4v8M${at(band)} -4v8M0 -4v8`}
        stroke="var(--ink3)"
      />
      {[-end, -band, band, end].map((cents) => (
        <text
          key={cents}
          x={at(cents) + (Math.abs(cents) === end ? Math.sign(cents) * 4 : Math.sign(cents) * 2)}
          y={20}
          textAnchor="middle"
          className="bench-quiet-label"
        >
          {cents < 0 ? '−' : '+'}
          {Math.abs(cents)}
        </text>
      ))}
      <text x={-at(end)} y={-9} textAnchor="start" className="bench-quiet-label">
        flat
      </text>
      <text x={at(end)} y={-9} textAnchor="end" className="bench-quiet-label">
        sharp
      </text>
    </g>
  );
}

const KEY_ROOM_PX = 165;
