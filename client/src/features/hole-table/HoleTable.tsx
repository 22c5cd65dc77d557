import { titleInSentence } from '#shared/document/title-in-sentence.ts';
import { memo, useMemo, useState } from 'react';
import { isBeyondReach } from '#shared/document/hand-reach.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import { labelledHoles, type LabelledHole } from '#shared/document/hole-labels.ts';
import { hungNotes } from '../../bench/hung-notes.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { useStable } from '../../bench/use-stable.ts';
import { handPreference } from '../../lib/preferences.ts';
import { Button } from '../../ui/Button.tsx';
import { classNames } from '../../ui/class-names.ts';
import { tablePlaces, type CellPlace } from '../../bench/table-places.ts';
import { FigureCell } from './FigureCell.tsx';
import { tableRows, type TableRow } from './table-rows.ts';

/** With less room than this at the left, labels stand over their figures, px. */
const LEAST_LABEL_PX = 70;
const STACKED_LABEL_PX = 16;

type HoleTableProps = Omit<PanelProps, 'prediction' | 'bandCents'>;

/**
 * Every size of every hole, each figure under its hole.
 *
 * The cells share the width evenly and their figures are shifted under the columns: a drag then moves figures about
 * without the table being laid out again.
 */
export const HoleTable = memo(function HoleTable(props: HoleTableProps) {
  const { document, geometry, unit, selection, sensitivities, readOnly, onSelect, onEdit } = props;
  const [chosenAll, setShowsAll] = useState<boolean | null>(null);
  const showsAll = chosenAll ?? geometry.layout === 'wide';
  const holes = useMemo(() => labelledHoles(document), [document]);
  const notes = useMemo(() => hungNotes(document, null), [document]);
  const places = tablePlaces(geometry);
  const source = { document, sensitivities, unit, selection, holes, notes };
  const rows = tableRows({ ...source, printLength: (mm) => printLength(mm, unit) });
  const shown = showsAll ? rows : rows.filter((row) => row.isMain);
  const isStacked = places.labelWidth < LEAST_LABEL_PX;
  const cellWidth = (geometry.widthPx - places.labelWidth) / Math.max(1, places.cells.length);
  const choose = useStable((hole: string) => onSelect({ hole }));
  const commit = useStable((rowKey: string, holeId: string, value: number) => {
    const labelled = holes.find(({ hole }) => hole.id === holeId);
    const row = rows.find(({ key }) => key === rowKey);
    if (labelled === undefined || row?.editable === undefined) return;
    const { edit } = row.editable(labelled);
    onEdit({
      label: `${row.label} of ${titleInSentence(labelled.title)}`,
      change: (before) => edit(before, value),
    });
  });
  return (
    <div>
      <table
        className="text-data table-fixed border-collapse overflow-hidden max-[1279px]:text-[16px]"
        style={{ width: geometry.widthPx }}
      >
        <caption className="sr-only">Sizes of the holes</caption>
        <colgroup>
          <col style={{ width: places.labelWidth }} />
        </colgroup>
        <thead className="sr-only">
          <tr>
            <th scope="col">Size</th>
            {places.cells.map(({ key }) => (
              <th key={key} scope="col">
                {holes.find(({ hole }) => hole.id === key)?.title ?? 'Foot'}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {shown.map((row, rowIndex) => (
            <tr
              key={row.key}
              style={{ height: geometry.measures.rowHeight + (isStacked ? STACKED_LABEL_PX : 0) }}
            >
              <RowLabel
                row={row}
                left={places.left}
                labelWidth={places.labelWidth}
                right={places.right}
                isFirst={rowIndex === 0}
                isStacked={isStacked}
              />
              {places.cells.map((place, index) => (
                <TableCell
                  key={place.key}
                  row={row}
                  place={place}
                  shift={place.middle - places.labelWidth - (index + 0.5) * cellWidth}
                  labelled={holes.find(({ hole }) => hole.id === place.key)}
                  next={holes.find(({ hole }) => hole.id === places.cells[index + 1]?.key)}
                  unit={unit}
                  isChosen={place.key === selection.hole}
                  canEdit={readOnly === null}
                  top={isStacked ? STACKED_LABEL_PX : 0}
                  onFocus={choose}
                  onCommit={commit}
                />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {geometry.layout !== 'wide' && (
        <div style={{ paddingLeft: places.left }}>
          <Button look="bare" size="small" className="mt-1" onClick={() => setShowsAll(!showsAll)}>
            {showsAll ? 'Fewer rows' : 'More rows'}
          </Button>
        </div>
      )}
    </div>
  );
});

interface RowLabelProps {
  row: TableRow;
  left: number;
  labelWidth: number;
  right: number;
  isFirst: boolean;
  /** No room at the left: the label stands over its figures. */
  isStacked: boolean;
}

function RowLabel({ row, left, labelWidth, right, isFirst, isStacked }: RowLabelProps) {
  return (
    <th scope="row" className="text-label relative p-0 font-normal">
      <span
        className={
          isFirst
            ? 'border-hair absolute inset-y-0 left-0 border-y'
            : 'border-hair absolute inset-y-0 left-0 border-b'
        }
        style={{ transform: `translateX(${left}px)`, width: right - left }}
      />
      <span
        className={classNames(
          'whitespace-nowrap',
          isStacked ? 'absolute top-0.5 left-2 text-left' : 'relative block pr-3 text-right',
        )}
        style={isStacked ? undefined : { transform: `translateX(${left}px)`, width: labelWidth }}
      >
        {row.label} <span className="text-ink3 text-small">{row.unit}</span>
      </span>
    </th>
  );
}

interface TableCellProps {
  row: TableRow;
  place: CellPlace;
  /** From the middle of the cell to where its figure stands, px. */
  shift: number;
  labelled: LabelledHole | undefined;
  next: LabelledHole | undefined;
  unit: PanelProps['unit'];
  isChosen: boolean;
  canEdit: boolean;
  /** Room for a label over the figure, px. */
  top: number;
  onFocus: (hole: string) => void;
  onCommit: (row: string, hole: string, value: number) => void;
}

/** Widest that a figure's field gets, px. */
const FIELD_PX = 74;

function TableCell({ row, place, shift, labelled, next, top, ...props }: TableCellProps) {
  if (row.between !== undefined) {
    if (labelled === undefined || next === undefined) return <td />;
    return (
      <BetweenCell
        place={place}
        shift={shift}
        top={top}
        text={printLength(row.between(labelled, next), props.unit)}
        isFar={isBeyondReach(labelled.hole, next.hole, handPreference.read())}
      />
    );
  }
  const width = Math.min(FIELD_PX, place.room - 4);
  return (
    <td className="relative p-0">
      <div
        className="absolute bottom-0 left-1/2 flex items-center justify-center has-[[aria-invalid]]:z-20"
        style={{ top, width, transform: `translateX(${shift - width / 2}px)` }}
      >
        {labelled !== undefined && row.editable !== undefined ? (
          <FigureCell
            {...row.editable(labelled)}
            row={row.key}
            hole={labelled.hole.id}
            label={`${row.label}, ${labelled.title}`}
            {...props}
          />
        ) : (
          <PlainFigure
            text={row.figure?.(place.key) ?? (labelled === undefined ? row.foot : undefined)}
            isChosen={props.isChosen}
          />
        )}
      </div>
    </td>
  );
}

function PlainFigure({ text, isChosen }: { text: string | undefined; isChosen: boolean }) {
  return <span className={isChosen ? 'font-bold' : undefined}>{text}</span>;
}

/** Lines beside a figure are drawn only where this much of each would show, px. */
const LEAST_LINE_PX = 12;

interface BetweenCellProps {
  place: CellPlace;
  shift: number;
  top: number;
  text: string;
  /** Longer than the fingers of this hand reach. */
  isFar: boolean;
}

function BetweenCell({ place, shift, top, text, isFar }: BetweenCellProps) {
  if (place.between === null) return <td />;
  const line = Math.min(24, ((place.gap ?? 0) - 40) / 2 - 6);
  const rule = line >= LEAST_LINE_PX ? <span className="bg-ink3 h-px" style={{ width: line }} /> : null;
  const at = shift + place.between - place.middle;
  return (
    <td className="relative p-0">
      <span
        className="absolute bottom-0 left-1/2 flex items-center gap-2 whitespace-nowrap"
        style={{ top, transform: `translateX(calc(${at}px - 50%))` }}
      >
        {rule}
        {isFar ? (
          <b className="bg-wait text-wait-ink rounded-chip px-1">
            {text}
            <span className="sr-only"> longer than your hand reaches</span>
          </b>
        ) : (
          text
        )}
        {rule}
      </span>
    </td>
  );
}
