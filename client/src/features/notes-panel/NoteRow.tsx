import { titleInSentence } from '#shared/document/title-in-sentence.ts';
import { memo, useEffect, useRef, type KeyboardEvent, type ReactNode } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { formatCents } from '#shared/music/cents.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';
import { classNames } from '../../ui/class-names.ts';
import type { ChartRow } from './chart-rows.ts';
import { changeFingering, tapped } from './fingering-edits.ts';
import { fingeringRemark } from './fingering-remark.ts';
import type { NotesLayout } from './note-lane.ts';
import { NoteLaneDrawing } from './NoteLaneDrawing.tsx';
import { TapCircle } from './TapCircle.tsx';

interface NoteRowProps extends Pick<PanelProps, 'onSelect' | 'onEdit'> {
  row: ChartRow;
  holes: readonly LabelledHole[];
  layout: NotesLayout;
  kind: DesignDocument['mouthEnd']['kind'];
  bandCents: number;
  isChosen: boolean;
  /** The Tab key comes here; arrows lead on. */
  isReached: boolean;
  readOnly: boolean;
  onStep: (from: ChartRow, by: number) => void;
  /** What the chosen row opens below itself. */
  children: ReactNode;
}

/** One fingering: note, pitch, bob, circles, remark. */
export const NoteRow = memo(function NoteRow(props: NoteRowProps) {
  const { row, holes, layout, isChosen, isReached, onSelect, onStep, onEdit, bandCents } = props;
  const { fingering } = row;
  const { noteX, columns, rowHeight, isStacked } = layout;
  const height = isStacked ? rowHeight * 2 : rowHeight;
  const choose = () => onSelect({ fingering: fingering.id });
  const tap = (labelled: LabelledHole) => {
    choose();
    onEdit({
      label: `${fingering.note}: ${titleInSentence(labelled.title)}`,
      change: (document) =>
        changeFingering(document, fingering.id, (before) => tapped(before, labelled.hole)),
    });
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const by = { ArrowDown: 1, ArrowUp: -1 }[event.key];
    if (by === undefined || event.altKey) return;
    event.preventDefault();
    event.stopPropagation();
    onStep(row, by);
  };
  return (
    <div className={classNames('notes-row relative', isChosen && 'is-chosen')}>
      <div role="row" aria-current={isChosen ? 'true' : undefined} className="relative" style={{ height }}>
        <RowLine isChosen={isChosen} />
        <div role="rowheader" className="absolute" style={{ left: noteX - 8 }}>
          <NoteButton
            isChosen={isChosen}
            isReached={isReached}
            height={rowHeight}
            onChoose={choose}
            onKeyDown={onKeyDown}
          >
            <NoteName note={fingering.note} />
          </NoteButton>
        </div>
        <PitchCells row={row} layout={layout} bandCents={bandCents} />
        {columns.map(({ key, x }) => (
          <TapCircle
            key={key}
            labelled={holes.find(({ hole }) => hole.id === key)}
            fingering={fingering}
            x={x}
            y={isStacked ? rowHeight * 1.5 : rowHeight / 2}
            size={layout.tapSize}
            isReached={isReached}
            readOnly={props.readOnly}
            onTap={tap}
          />
        ))}
        <RemarkCell
          remark={fingeringRemark(fingering, holes, props.kind)}
          notice={row.predicted?.notices[0]?.message}
          layout={layout}
        />
      </div>
      {props.children}
    </div>
  );
});

function RowLine({ isChosen }: { isChosen: boolean }) {
  return (
    <div
      aria-hidden="true"
      className={classNames(
        'absolute inset-x-4 top-0 h-full min-[1100px]:inset-x-7',
        isChosen && 'bg-mark-soft',
      )}
    >
      <div className="border-hair absolute inset-x-0 top-0 border-t min-[1100px]:inset-x-3" />
    </div>
  );
}

interface PitchCellsProps {
  row: ChartRow;
  layout: NotesLayout;
  bandCents: number;
}

/** What the scale asks for, how far off the note hangs, and the bob that shows it. */
function PitchCells({ row, layout, bandCents }: PitchCellsProps) {
  const { hzRight, centsRight, rowHeight, lane } = layout;
  const cents = row.predicted?.centsFromScale ?? null;
  return (
    <>
      {hzRight !== null && (
        <Figure right={hzRight} height={rowHeight}>
          {row.targetHz.toFixed(1)}
        </Figure>
      )}
      <Figure right={centsRight} height={rowHeight} isStrong={cents !== null && Math.abs(cents) > bandCents}>
        {cents === null ? '–' : formatCents(cents)}
      </Figure>
      <NoteLaneDrawing
        lane={lane}
        height={rowHeight}
        bandCents={bandCents}
        register={row.fingering.register}
        cents={cents}
      />
    </>
  );
}

interface RemarkCellProps {
  remark: string;
  notice: string | undefined;
  layout: NotesLayout;
}

/** One line; the whole notice stands in the chosen row's fields. */
function RemarkCell({ remark, notice, layout: { remarkX, rowHeight } }: RemarkCellProps) {
  const words = notice === undefined || remark === '' ? (notice ?? remark) : `${remark}. ${notice}`;
  return (
    <div
      role="cell"
      className={remarkX === null ? 'sr-only' : 'is-predicted text-label text-ink2 absolute truncate'}
      style={remarkX === null ? undefined : { left: remarkX, right: 40, lineHeight: `${rowHeight}px` }}
    >
      {notice !== undefined && (
        <svg width="13" height="12" viewBox="0 0 13 12" className="mr-1 inline-block" aria-hidden="true">
          <path d="M6.5 1L12.2 11H.8Z" className="notes-notice" />
        </svg>
      )}
      {words}
    </div>
  );
}

interface NoteButtonProps {
  isChosen: boolean;
  isReached: boolean;
  height: number;
  onChoose: () => void;
  onKeyDown: (event: KeyboardEvent) => void;
  children: ReactNode;
}

/** Takes the focus along when the arrows choose another row, so that the next arrow goes on from there. */
function NoteButton({ isChosen, isReached, height, onChoose, onKeyDown, children }: NoteButtonProps) {
  const button = useRef<HTMLButtonElement>(null);
  useEffect(() => {
    const isMovedFrom = document.activeElement?.classList.contains('notes-name') === true;
    if (isChosen && isMovedFrom) button.current?.focus();
  }, [isChosen]);
  return (
    <button
      ref={button}
      type="button"
      aria-pressed={isChosen}
      tabIndex={isReached ? 0 : -1}
      onClick={onChoose}
      onKeyDown={onKeyDown}
      className="notes-name text-body min-w-14 px-2 text-left font-semibold"
      style={{ height }}
    >
      {children}
    </button>
  );
}

interface FigureProps {
  right: number;
  height: number;
  isStrong?: boolean;
  children: string;
}

function Figure({ right, height, isStrong = false, children }: FigureProps) {
  return (
    <div
      role="cell"
      className={classNames('is-predicted text-data absolute w-20 text-right', isStrong && 'font-bold')}
      style={{ left: right - 80, lineHeight: `${height}px` }}
    >
      {children}
    </div>
  );
}
