import { useMemo } from 'react';
import { bandOf } from '../../bench/band-of.ts';
import { FingeringDots } from '../../bench/FingeringDots.tsx';
import { labelledHoles, type LabelledHole } from '#shared/document/hole-labels.ts';
import { hungNotes, type HungNote } from '../../bench/hung-notes.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';
import { spokenHungNote } from '../../bench/spoken-pitch.ts';
import { useRestingValue } from '../../bench/use-resting-value.ts';
import { useStable } from '../../bench/use-stable.ts';
import { FingeringRow } from './FingeringRow.tsx';
import { GhostBobs } from './GhostBobs.tsx';
import { GhostKey, GhostLine, type GhostWords } from './GhostKey.tsx';
import { HangingNote } from './HangingNote.tsx';
import { NoticeMarks } from './NoticeMarks.tsx';
import { hasTwoLines, plumbRows, type PlumbRows } from './plumb-rows.ts';
import { PlumbBackdrop, RowLabels, ScaleKey } from './PlumbBackdrop.tsx';
import { PlumbTable } from './PlumbTable.tsx';

interface PlumbChartProps extends PanelProps {
  isDragging: boolean;
  /** True while the figures belong to an earlier drawing because the present one cannot be worked out. */
  isOld: boolean;
  /** The chosen note's fingering over the beam; panels with a chart of their own leave it out. */
  showsFingering?: boolean;
  /** Cents of the same notes in an earlier or another state, by fingering id: dashed bobs behind. */
  ghosts?: ReadonlyMap<string, number>;
  /** What the dashed bobs and the full ones are called. */
  ghostWords?: GhostWords;
}

/** A note and where it hangs in the chart, px from the column's pivot. */
export interface PlacedNote extends HungNote {
  x: number;
  y: number;
}

/** Every note hung as a bob under its hole: straight down is in tune, left is flat, right is sharp. */
export function PlumbChart(props: PlumbChartProps) {
  const { document, prediction, geometry, selection, bandCents, isDragging } = props;
  const { measures } = geometry;
  const holes = useMemo(() => labelledHoles(document), [document]);
  const notes = useMemo(() => hungNotes(document, prediction), [document, prediction]);
  const rows = useMemo(
    () => plumbRows(notes, selection.register, geometry),
    [notes, selection.register, geometry],
  );
  const choose = useStable((hole: string, fingering: string) => props.onSelect({ hole, fingering }));
  const placed = placeNotes(notes, rows, geometry);
  const chosen = document.fingerings.find((fingering) => fingering.id === selection.fingering) ?? null;
  const shown = props.showsFingering === false ? null : chosen;
  const height = measures.beamY + rows.end;
  return (
    <section aria-label="Plumb lines" className={isDragging ? 'is-dragging relative' : 'relative'}>
      <svg width={geometry.widthPx} height={height} className="block">
        <FingeringRow geometry={geometry} holes={holes} fingering={shown} chosenKey={selection.hole} />
        <g transform={`translate(0 ${measures.beamY})`}>
          <PlumbBackdrop geometry={geometry} rows={rows} bandCents={bandCents} />
          {props.ghostWords === undefined ? (
            <ScaleKey geometry={geometry} bandCents={bandCents} />
          ) : (
            <GhostKey geometry={geometry} words={props.ghostWords} />
          )}
          {props.ghosts !== undefined && (
            <GhostBobs placed={placed} ghosts={props.ghosts} measures={measures} />
          )}
          {placed.map((note) => (
            <PlacedBob key={note.fingering.id} note={note} chart={props} onChoose={choose} />
          ))}
          {geometry.columns.map(({ key, x }) => (
            <circle key={key} cx={x} r={2.6} className="bench-pivot" />
          ))}
          <CrossPictures placed={placed} holes={holes} spacing={geometry.columnSpacing} />
        </g>
      </svg>
      {measures.labelGap > 0 && <RowLabels geometry={geometry} rows={rows} top={measures.beamY} />}
      {shown !== null && measures.labelGap > 0 && (
        <p
          className="text-label text-ink2 absolute -translate-y-1/2 whitespace-nowrap"
          style={{ top: measures.fingeringY, right: geometry.widthPx - geometry.labelRight }}
        >
          <b className="text-ink font-semibold">
            <NoteName note={shown.note} />
          </b>{' '}
          fingering
        </p>
      )}
      {props.ghostWords !== undefined && <GhostLine geometry={geometry} words={props.ghostWords} />}
      <NoticeMarks notes={placed} top={measures.beamY} measures={measures} />
      <PlumbTable notes={useRestingValue(notes, isDragging)} holes={useRestingValue(holes, isDragging)} />
    </section>
  );
}

function placeNotes(
  notes: readonly HungNote[],
  rows: PlumbRows,
  geometry: PanelProps['geometry'],
): PlacedNote[] {
  const crosses = new Map<string, number>();
  return notes.flatMap((note) => {
    const column = geometry.columns.find(({ key }) => key === note.column);
    const row = rows.registers.find(({ register }) => register === note.fingering.register);
    if (column === undefined || row === undefined) return [];
    if (note.row === 'register') return [{ ...note, x: column.x, y: row.y }];
    if (rows.crossY === null) return [];
    const index = crosses.get(note.column) ?? 0;
    crosses.set(note.column, index + 1);
    return [{ ...note, x: column.x, y: rows.crossY + index * rows.crossStep }];
  });
}

interface PlacedBobProps {
  note: PlacedNote;
  chart: PlumbChartProps;
  onChoose: (column: string, fingering: string) => void;
}

function PlacedBob({ note, chart, onChoose }: PlacedBobProps) {
  const { geometry, selection, bandCents, isOld } = chart;
  const { fingering, predicted, column } = note;
  const cents = predicted?.centsFromScale ?? null;
  const { pxPerCent, heldAtCents, labelBelow } = geometry.measures;
  return (
    <g transform={`translate(${note.x} 0)`}>
      <HangingNote
        note={fingering.note}
        register={fingering.register}
        cents={cents}
        name={spokenHungNote(note)}
        isCross={note.row === 'cross'}
        isOutside={cents !== null && Math.abs(cents) > bandOf(bandCents, fingering.register)}
        isChosen={fingering.id === selection.fingering}
        isOnTint={column === selection.hole}
        isOld={isOld}
        y={note.y}
        pxPerCent={pxPerCent}
        heldAtCents={heldAtCents}
        labelBelow={labelBelow}
        twoLines={hasTwoLines(geometry)}
        column={column}
        fingering={fingering.id}
        onChoose={onChoose}
      />
    </g>
  );
}

interface CrossPicturesProps {
  placed: readonly PlacedNote[];
  holes: readonly LabelledHole[];
  spacing: number;
}

function CrossPictures({ placed, holes, spacing }: CrossPicturesProps) {
  return placed
    .filter((note) => note.row === 'cross')
    .map(({ fingering, x, y }) => (
      <g key={fingering.id} transform={`translate(${x} ${y + 16})`} aria-hidden="true" pointerEvents="none">
        <FingeringDots fingering={fingering} holes={holes} width={Math.min(72, spacing - 8)} />
      </g>
    ));
}
