import { useMemo, useState } from 'react';
import { printLength } from '#shared/lengths/print-length.ts';
import { labelledHoles, type LabelledHole } from '../../bench/hole-labels.ts';
import { hungNotes } from '../../bench/hung-notes.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { Button } from '../../ui/Button.tsx';
import { tablePlaces, type CellPlace } from './cell-offsets.ts';
import { FigureCell } from './FigureCell.tsx';
import { tableRows, type EditableFigure, type TableRow } from './table-rows.ts';

/** Every size of every hole, each column under its hole. */
export function HoleTable(props: PanelProps) {
  const { document, prediction, geometry, unit, selection, sensitivities } = props;
  const [chosenAll, setShowsAll] = useState<boolean | null>(null);
  const showsAll = chosenAll ?? geometry.layout === 'wide';
  const holes = useMemo(() => labelledHoles(document), [document]);
  const notes = useMemo(() => hungNotes(document, prediction), [document, prediction]);
  const places = tablePlaces(geometry);
  const source = { document, sensitivities, unit, selection, holes, notes };
  const rows = tableRows({ ...source, printLength: (mm) => printLength(mm, unit) });
  const shown = showsAll ? rows : rows.filter((row) => row.isMain);
  const width = places.right - places.left;
  return (
    <div style={{ paddingLeft: places.left }}>
      <table
        className="text-data max-[1279px]:text-[16px]"
        style={{ width, tableLayout: 'fixed', borderCollapse: 'collapse' }}
      >
        <caption className="sr-only">Sizes of the holes</caption>
        <colgroup>
          <col style={{ width: places.labelWidth }} />
          {places.cells.map(({ key, width: cellWidth }) => (
            <col key={key} style={{ width: cellWidth }} />
          ))}
        </colgroup>
        <thead>
          <tr>
            <th scope="col" className="sr-only">
              Size
            </th>
            {places.cells.map(({ key }) => (
              <th key={key} scope="col" className="sr-only">
                {holes.find(({ hole }) => hole.id === key)?.title ?? 'Foot'}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {shown.map((row) => (
            <tr
              key={row.key}
              className="border-hair border-y"
              style={{ height: geometry.measures.rowHeight }}
            >
              <th scope="row" className="text-label pr-3 text-right font-normal whitespace-nowrap">
                {row.label} <span className="text-ink3 text-small">{row.unit}</span>
              </th>
              {places.cells.map((place, index) => (
                <TableCell
                  key={place.key}
                  {...props}
                  row={row}
                  place={place}
                  labelled={holes.find(({ hole }) => hole.id === place.key)}
                  next={holes.find(({ hole }) => hole.id === places.cells[index + 1]?.key)}
                />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {geometry.layout !== 'wide' && (
        <Button look="bare" size="small" className="mt-1" onClick={() => setShowsAll(!showsAll)}>
          {showsAll ? 'Fewer rows' : 'More rows'}
        </Button>
      )}
    </div>
  );
}

interface TableCellProps extends PanelProps {
  row: TableRow;
  place: CellPlace;
  labelled: LabelledHole | undefined;
  next: LabelledHole | undefined;
}

/** Widest that a figure's field gets, px. */
const FIELD_PX = 74;

function TableCell({ row, place, labelled, next, ...props }: TableCellProps) {
  if (row.between !== undefined) {
    const reach = labelled !== undefined && next !== undefined ? row.between(labelled, next) : null;
    return <BetweenCell place={place} text={reach === null ? null : printLength(reach, props.unit)} />;
  }
  const width = Math.min(FIELD_PX, place.width - 4);
  const isFoot = labelled === undefined;
  return (
    <td className="relative p-0">
      <div
        className="absolute inset-y-0 flex items-center justify-center"
        style={{ left: place.middle - width / 2, width }}
      >
        {!isFoot && row.editable !== undefined ? (
          <EditableCell {...props} row={row} labelled={labelled} figure={row.editable(labelled)} />
        ) : (
          <PlainFigure
            text={row.figure?.(place.key) ?? (isFoot ? row.foot : undefined)}
            isChosen={place.key === props.selection.hole}
          />
        )}
      </div>
    </td>
  );
}

function PlainFigure({ text, isChosen }: { text: string | undefined; isChosen: boolean }) {
  return <span className={isChosen ? 'font-bold' : undefined}>{text}</span>;
}

interface EditableCellProps extends PanelProps {
  row: TableRow;
  labelled: LabelledHole;
  figure: EditableFigure;
}

function EditableCell({ row, labelled, figure, ...props }: EditableCellProps) {
  const { hole, title } = labelled;
  return (
    <FigureCell
      label={`${row.label}, ${title}`}
      {...figure}
      unit={props.unit}
      isChosen={hole.id === props.selection.hole}
      canEdit={props.readOnly === null}
      onFocus={() => props.onSelect({ hole: hole.id })}
      onChange={(value) =>
        props.onEdit({
          label: `${row.label} of ${title.toLowerCase()}`,
          change: (before) => figure.edit(before, value),
        })
      }
    />
  );
}

/** Lines beside a figure are drawn only where this much of each would show, px. */
const LEAST_LINE_PX = 12;

function BetweenCell({ place, text }: { place: CellPlace; text: string | null }) {
  if (text === null || place.between === null) return <td />;
  const line = Math.min(24, ((place.gap ?? 0) - 40) / 2 - 6);
  const rule = line >= LEAST_LINE_PX ? <span className="bg-ink3 h-px" style={{ width: line }} /> : null;
  return (
    <td className="relative">
      <span
        className="absolute inset-y-0 flex -translate-x-1/2 items-center gap-2 whitespace-nowrap"
        style={{ left: place.between }}
      >
        {rule}
        {text}
        {rule}
      </span>
    </td>
  );
}
