import { memo, type KeyboardEvent } from 'react';
import { formatCents } from '#shared/music/cents.ts';
import { Bob } from '../../bench/Bob.tsx';
import { NoteSpan } from '../../bench/NoteName.tsx';
import { classNames } from '../../ui/class-names.ts';
import { bobPlace } from './plumb-scale.ts';

interface HangingNoteProps {
  note: string;
  register: number;
  cents: number | null;
  /** Spoken name of the whole: note, cents, flat or sharp, and what has to be known. */
  name: string;
  isCross: boolean;
  isOutside: boolean;
  isChosen: boolean;
  /** On the tint of a chosen column the halo takes the tint's colour. */
  isOnTint: boolean;
  /** Outline only: the last figure, while a newer one cannot be worked out. */
  isOld: boolean;
  y: number;
  pxPerCent: number;
  heldAtCents: number;
  labelBelow: number;
  twoLines: boolean;
  column: string;
  fingering: string;
  onChoose: (column: string, fingering: string) => void;
}

/** How far above a cross fingering's bob its short thread begins. */
const CROSS_THREAD = 20;

/** One bob on its thread, with the note and its cents below. Drawn from the column's pivot. */
export const HangingNote = memo(function HangingNote(props: HangingNoteProps) {
  const { note, register, cents, isCross, isOld, y } = props;
  const choose = () => props.onChoose(props.column, props.fingering);
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key !== 'Enter' && event.key !== ' ') return;
    event.preventDefault();
    choose();
  };
  return (
    <g
      role="button"
      tabIndex={0}
      aria-label={props.name}
      aria-pressed={props.isChosen}
      onClick={choose}
      onKeyDown={onKeyDown}
      className="cursor-pointer"
    >
      {cents !== null && <Pendulum {...props} cents={cents} threadFrom={isCross ? y - CROSS_THREAD : 0} />}
      <rect x={-34} y={y - 12} width={68} height={props.labelBelow + 18} fill="transparent" />
      <NoteLabel {...props} />
      {cents !== null && (
        <g
          className="bench-swing"
          style={{ transform: `translate(${bobPlace(cents, props).dx}px, ${y}px)` }}
          pointerEvents="none"
        >
          <Bob register={register} small={isCross} hollow={isOld} />
          {props.isChosen && <circle r={11.5} className="bench-chosen-note" />}
        </g>
      )}
      {cents === null && <title>{note}</title>}
    </g>
  );
});

interface PendulumProps extends HangingNoteProps {
  cents: number;
  threadFrom: number;
}

/** The thread leans by shearing, so that it moves with its bob in every frame of the swing. */
function Pendulum({ cents, register, y, threadFrom, isOld, ...scale }: PendulumProps) {
  const { dx, held } = bobPlace(cents, scale);
  const length = y - threadFrom;
  return (
    <>
      <g transform={`translate(0 ${threadFrom})`}>
        <line
          y2={length}
          className={classNames('bench-thread bench-swing', `is-register${register}`, isOld && 'is-old')}
          style={{ transform: `matrix(1, 0, ${dx / length}, 1, 0, 0)` }}
        />
      </g>
      {held !== 0 && (
        <path
          d={`M${dx + held * 10} ${y - 4.5}l${held * 4.5} 4.5l${-held * 4.5} 4.5`}
          className={`bench-held is-register${register}`}
        />
      )}
    </>
  );
}

function NoteLabel({ note, cents, isOutside, isOnTint, y, labelBelow, twoLines, ...rest }: HangingNoteProps) {
  const below = rest.isCross ? labelBelow + 15 : labelBelow;
  const figure = cents === null ? '–' : formatCents(cents);
  return (
    <text y={y + below} textAnchor="middle" className={classNames('bench-note', isOnTint && 'is-chosen')}>
      <NoteSpan note={note} className={rest.isChosen ? 'bench-label-strong' : 'bench-note-name'} />
      <tspan className={isOutside ? 'is-outside' : undefined} {...(twoLines ? { x: 0, dy: 16 } : { dx: 5 })}>
        {figure}
      </tspan>
    </text>
  );
}
