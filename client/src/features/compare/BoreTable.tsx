import { memo, useMemo } from 'react';
import { fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { borePlaces, furthestPlace, type BorePlace } from './bore-difference.ts';
import type { Comparison } from './comparison.ts';

interface BoreTableProps {
  comparison: Comparison;
  unit: LengthUnit;
}

/** A measured bore has hundreds of stations; so many rows are read, the others lie between them. */
const MOST_ROWS = 40;

/** Widths of both bores at every station of either. */
export const BoreTable = memo(function BoreTable({ comparison, unit }: BoreTableProps) {
  const { a, b, offsetMm } = comparison;
  const places = useMemo(
    () => borePlaces(a.document, b.document, offsetMm),
    [a.document, b.document, offsetMm],
  );
  const furthest = furthestPlace(places);
  const rows = thinned(places, furthest?.positionMm);
  const width = (mm: number | null) => (mm === null ? '–' : printLength(mm, unit, unit === 'mm' ? 2 : 4));
  const head = 'pb-1 px-2 text-right font-normal';
  const cell = 'px-2 text-right whitespace-nowrap';
  return (
    <section aria-labelledby="bores-heading">
      <h2 id="bores-heading" className="text-section font-semibold">
        {furthest === null ? 'The bores are as wide as each other' : 'The bores differ'}
        <span className="text-data text-ink3 ml-2 font-normal">{unit}</span>
      </h2>
      {furthest !== null && (
        <p className="text-data text-ink2 mt-0.5">
          Most at {printLength(fromFootMm(b.document, furthest.positionMm), unit)} from the foot of {b.label}:{' '}
          {width(Math.abs(furthest.widerMm))} {furthest.widerMm > 0 ? 'wider' : 'narrower'} than {a.label}.
        </p>
      )}
      <table className="text-data mt-1 w-full border-collapse max-[1100px]:text-[15px]">
        <caption className="sr-only">Widths of both bores, from the mouth end to the foot</caption>
        <thead>
          <tr className="text-label text-ink3">
            <th scope="col" className="px-2 pb-1 text-left font-normal">
              from foot
            </th>
            <th scope="col" className={head}>
              {a.label}
            </th>
            <th scope="col" className={head}>
              {b.label}
            </th>
            <th scope="col" className={head}>
              wider
            </th>
          </tr>
        </thead>
        <tbody className="border-hair border-b">
          {rows.map((place) => (
            <tr key={place.positionMm} className="border-hair h-7 border-t">
              <th scope="row" className="px-2 text-left font-normal">
                {printLength(fromFootMm(b.document, place.positionMm), unit)}
              </th>
              <td className={cell}>{width(place.a)}</td>
              <td className={cell}>{width(place.b)}</td>
              <td className={`${cell} ${isDifferent(place) ? 'font-bold' : 'text-ink2'}`}>
                {place.widerMm === null ? '–' : signed(place.widerMm, width)}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {rows.length < places.length && (
        <p className="text-data text-ink3 mt-1">
          {rows.length} of {places.length} stations; the drawing above has them all.
        </p>
      )}
    </section>
  );
});

const isDifferent = ({ widerMm }: BorePlace) => widerMm !== null && Math.abs(widerMm) >= 0.005;

function signed(mm: number, print: (mm: number) => string): string {
  const text = print(mm);
  return mm > 0 && isDifferent({ positionMm: 0, a: null, b: null, widerMm: mm }) ? `+${text}` : text;
}

/** Evenly, and the place where the two differ most among them. */
function thinned(places: readonly BorePlace[], furthestMm: number | undefined): readonly BorePlace[] {
  if (places.length <= MOST_ROWS) return places;
  const step = (places.length - 1) / (MOST_ROWS - 1);
  const kept = new Set(Array.from({ length: MOST_ROWS }, (_, index) => Math.round(index * step)));
  return places.filter(({ positionMm }, index) => kept.has(index) || positionMm === furthestMm);
}
