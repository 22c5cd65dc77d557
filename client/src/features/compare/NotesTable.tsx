import { memo } from 'react';
import { formatCents } from '#shared/music/cents.ts';
import { bandOf } from '../../bench/band-of.ts';
import { Bob, BobMark } from '../../bench/Bob.tsx';
import { NoteName } from '../../bench/NoteName.tsx';
import type { ComparedNote, NoteRow } from './note-rows.ts';

interface NotesTableProps {
  rows: readonly NoteRow[];
  labels: { a: string; b: string };
  bandCents: readonly number[];
  /** Hertz and the lane of bobs, where there is room for them. */
  isWide: boolean;
}

/** Cents of every note of both, and how far each moved. */
export const NotesTable = memo(function NotesTable({ rows, labels, bandCents, isWide }: NotesTableProps) {
  const head = 'px-2 pb-1 text-right font-normal';
  return (
    <table className="text-data w-full border-collapse max-[1100px]:text-[15px]">
      <caption className="sr-only">
        Cents of every note of {labels.a} and of {labels.b}
      </caption>
      <thead>
        <tr className="text-label text-ink3">
          <th scope="col" className="px-2 pb-1 text-left font-normal">
            Note
          </th>
          {isWide && (
            <th scope="col" className={head}>
              {labels.a}, Hz
            </th>
          )}
          <th scope="col" className={head}>
            {labels.a}, cents
          </th>
          {isWide && (
            <th scope="col" className={head}>
              {labels.b}, Hz
            </th>
          )}
          <th scope="col" className={head}>
            {labels.b}, cents
          </th>
          <th scope="col" className={head}>
            Moved
          </th>
          {isWide && (
            <th scope="col" className="w-88 pb-1 pl-6 text-left font-normal">
              flat <span className="sr-only">to sharp; {labels.a} dashed</span>
              <span aria-hidden="true" className="float-right">
                sharp
              </span>
            </th>
          )}
        </tr>
      </thead>
      <tbody className="border-hair border-b">
        {rows.map((row) => (
          <NoteLine key={row.key} row={row} bandCents={bandOf(bandCents, row.register)} isWide={isWide} />
        ))}
      </tbody>
    </table>
  );
});

interface NoteLineProps {
  row: NoteRow;
  bandCents: number;
  isWide: boolean;
}

function NoteLine({ row, bandCents, isWide }: NoteLineProps) {
  const { a, b, register, movedCents } = row;
  const cell = 'px-2 text-right whitespace-nowrap';
  return (
    <tr className="border-hair h-7 border-t">
      <th scope="row" className="px-2 py-0 text-left align-middle font-normal">
        <span className="flex items-center gap-1.5 whitespace-nowrap">
          <BobMark register={register} />
          <span>
            <NotePair a={a} b={b} />
            <span className="sr-only">, register {register}</span>
          </span>
        </span>
      </th>
      {isWide && <td className={`${cell} text-ink2`}>{hertz(a)}</td>}
      <td className={cell}>
        <Cents note={a} bandCents={bandCents} />
      </td>
      {isWide && <td className={`${cell} text-ink2`}>{hertz(b)}</td>}
      <td className={cell}>
        <Cents note={b} bandCents={bandCents} />
      </td>
      <td
        className={`${cell} ${movedCents !== null && Math.abs(movedCents) >= 1 ? 'font-bold' : 'text-ink2'}`}
      >
        {movedCents === null ? '–' : formatCents(movedCents)}
      </td>
      {isWide && (
        <td className="pl-6">
          <Lane row={row} bandCents={bandCents} />
        </td>
      )}
    </tr>
  );
}

const hertz = (note: ComparedNote | null) =>
  note?.frequencyHz === undefined || note.frequencyHz === null ? '–' : note.frequencyHz.toFixed(1);

/** One name where both have it, else what it was and what it is. */
function NotePair({ a, b }: Pick<NoteRow, 'a' | 'b'>) {
  if (a === null || b === null) return <NoteName note={(a ?? b)?.note ?? ''} />;
  if (a.note === b.note) return <NoteName note={b.note} />;
  return (
    <>
      <NoteName note={a.note} /> <span className="text-ink3">to</span> <NoteName note={b.note} />
    </>
  );
}

function Cents({ note, bandCents }: { note: ComparedNote | null; bandCents: number }) {
  if (note === null) return <span className="text-ink3">not there</span>;
  if (note.cents === null) return <span className="text-ink3">–</span>;
  const isOutside = Math.abs(note.cents) > bandCents;
  return <span className={isOutside ? 'font-bold' : undefined}>{formatCents(note.cents)}</span>;
}

const LANE = { width: 326, height: 28, pxPerCent: 5.2, heldAt: 30 } as const;

function Lane({ row, bandCents }: { row: NoteRow; bandCents: number }) {
  const middle = LANE.width / 2;
  const y = LANE.height / 2;
  const x = (cents: number) => middle + Math.max(-LANE.heldAt, Math.min(LANE.heldAt, cents)) * LANE.pxPerCent;
  const [from, to] = [row.a?.cents ?? null, row.b?.cents ?? null];
  return (
    <svg width={LANE.width} height={LANE.height} aria-hidden="true" className="block">
      <rect
        x={x(-bandCents)}
        width={x(bandCents) - x(-bandCents)}
        height={LANE.height}
        className="bench-band"
      />
      <path
        d={`M${x(-bandCents)} 0v${LANE.height}M${x(bandCents)} 0v${LANE.height}`}
        className="bench-band-edge"
      />
      <line x1={middle} x2={middle} y2={LANE.height} className="bench-true" />
      {from !== null && (
        <>
          <line x1={middle} x2={x(from)} y1={y} y2={y} className="bench-thread is-old" />
          <g transform={`translate(${x(from)} ${y})`}>
            <Bob register={row.register} scale={0.85} hollow />
            <Held cents={from} className="bench-held is-old" />
          </g>
        </>
      )}
      {to !== null && (
        <>
          <line
            x1={middle}
            x2={x(to)}
            y1={y}
            y2={y}
            className={`bench-thread is-register${Math.min(row.register, 4)}`}
          />
          <g transform={`translate(${x(to)} ${y})`}>
            <Bob register={row.register} scale={0.85} />
            <Held cents={to} className={`bench-held is-register${Math.min(row.register, 4)}`} />
          </g>
        </>
      )}
    </svg>
  );
}

/** Past the end of the lane a chevron shows that the bob is held. */
function Held({ cents, className }: { cents: number; className: string }) {
  if (Math.abs(cents) <= LANE.heldAt) return null;
  const side = Math.sign(cents);
  return <path d={`M${side * 9} -4.5l${side * 4.5} 4.5l${-side * 4.5} 4.5`} className={className} />;
}
