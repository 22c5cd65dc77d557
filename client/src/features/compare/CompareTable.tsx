import { memo, useMemo } from 'react';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import type { BenchGeometry } from '../../bench/bench-geometry.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import { tablePlaces, type CellPlace, type TablePlaces } from '../../bench/table-places.ts';
import { classNames } from '../../ui/class-names.ts';
import type { Comparison } from './comparison.ts';
import { comparedRows, type ComparedFigure, type ComparedRow } from './table-cells.ts';

interface CompareTableProps {
  comparison: Comparison;
  geometry: BenchGeometry;
  unit: LengthUnit;
  chosen: string | null;
}

/** A label narrower than this stands over its figures, px. */
const LEAST_LABEL_PX = 70;
const STACKED_LABEL_PX = 20;
/** Below this two figures have no room side by side and stand one over the other, px. */
const SIDE_BY_SIDE_PX = 78;

/** Under each hole its sizes, and struck before them what they were. */
export const CompareTable = memo(function CompareTable(props: CompareTableProps) {
  const { comparison, geometry, unit, chosen } = props;
  const rows = useMemo(() => comparedRows(comparison, unit), [comparison, unit]);
  const titles = useMemo(
    () => new Map(labelledHoles(comparison.b.document).map(({ hole, title }) => [hole.id, title])),
    [comparison.b.document],
  );
  const places = tablePlaces(geometry);
  return (
    <div
      role="table"
      aria-label="Sizes of the holes, and what they were"
      className="text-data overflow-hidden max-[1279px]:text-[15px]"
      style={{ width: geometry.widthPx }}
    >
      <div role="row" className="sr-only">
        <span role="columnheader">Size</span>
        {places.cells.map(({ key }) => (
          <span key={key} role="columnheader">
            {titles.get(key) ?? 'Foot'}
          </span>
        ))}
      </div>
      {rows.map((row) => (
        <CompareRow key={row.key} row={row} places={places} chosen={chosen} />
      ))}
    </div>
  );
});

interface CompareRowProps {
  row: ComparedRow;
  places: TablePlaces;
  chosen: string | null;
}

function CompareRow({ row, places, chosen }: CompareRowProps) {
  const isStacked = places.labelWidth < LEAST_LABEL_PX;
  const narrowest = Math.min(...places.cells.map(({ room }) => room));
  const isTall = narrowest < SIDE_BY_SIDE_PX && [...row.figures.values()].some(({ was }) => was !== null);
  const height = (isTall ? 42 : 28) + (isStacked ? STACKED_LABEL_PX : 0);
  return (
    <div role="row" className="relative" style={{ height }}>
      <span
        aria-hidden="true"
        className="border-hair absolute inset-y-0 border-b"
        style={{ left: places.left, width: places.right - places.left }}
      />
      <span
        role="rowheader"
        className={classNames(
          'text-label absolute whitespace-nowrap',
          isStacked ? 'top-0.5 left-2' : 'inset-y-0 flex items-center justify-end gap-1 pr-3',
        )}
        style={isStacked ? undefined : { left: places.left, width: places.labelWidth }}
      >
        {row.label} <span className="text-ink3 text-small">{row.unit}</span>
      </span>
      {places.cells.map((place) => (
        <CompareCell
          key={place.key}
          place={place}
          middle={row.isBetween ? place.between : place.middle}
          figure={row.figures.get(place.key)}
          isChosen={place.key === chosen && !row.isBetween}
          isTall={isTall}
          top={isStacked ? STACKED_LABEL_PX : 0}
        />
      ))}
    </div>
  );
}

interface CompareCellProps {
  place: CellPlace;
  middle: number | null;
  figure: ComparedFigure | undefined;
  isChosen: boolean;
  isTall: boolean;
  top: number;
}

function CompareCell({ place, middle, figure, isChosen, isTall, top }: CompareCellProps) {
  return (
    <span
      role="cell"
      className="absolute bottom-0 flex -translate-x-1/2 items-center justify-center whitespace-nowrap"
      style={{ left: middle ?? place.middle, top }}
    >
      {figure !== undefined && middle !== null && <Figure {...figure} isChosen={isChosen} isTall={isTall} />}
    </span>
  );
}

function Figure({
  was,
  now,
  isStrong,
  isChosen,
  isTall,
}: ComparedFigure & { isChosen: boolean; isTall: boolean }) {
  if (was === null) {
    return (
      <span
        className={isStrong === true || isChosen ? 'font-bold' : isStrong === false ? 'text-ink2' : undefined}
      >
        {now}
      </span>
    );
  }
  return (
    <span
      className={classNames(
        'bg-wait rounded-chip text-ink flex items-center px-1.5 py-0.5',
        isTall ? 'flex-col leading-4' : 'gap-1.5',
      )}
    >
      <del className="text-ink2 text-[12.5px]">
        <span className="sr-only">was </span>
        {was}
      </del>
      <ins className="font-bold no-underline">
        <span className="sr-only">now </span>
        {now}
      </ins>
    </span>
  );
}
