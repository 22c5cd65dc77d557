import { area, curveMonotoneX } from 'd3';
import type { KeyboardEvent } from 'react';
import type { LadderRung } from '#shared/analysis/prediction.ts';
import { boreEnds } from '#shared/document/profile.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import type { Ribbon } from '../../engine/engine-answers.ts';
import type { StudyView } from '../../engine/use-study.ts';
import { classNames } from '../../ui/class-names.ts';
import { pressureNodes } from './pressure-nodes.ts';

interface RibbonShelfProps extends PanelProps {
  ribbons: StudyView<'ribbons'>;
  resonances: readonly LadderRung[];
  mode: number;
  onMode: (mode: number) => void;
}

const TOP = 8;
const ROW = 27;
const CHOSEN_ROW = 64;
/** What the waists and bulges mean is said only where the bore leaves room beside it, px. */
const ROOM_FOR_LEGEND = 104;
export const RIBBON_SHELF = 154;

/** The standing wave of each resonance along the bore: fat where the pressure is, waist where it is not. */
export function RibbonShelf(props: RibbonShelfProps) {
  const { document, geometry, selection, ribbons, resonances, mode, onMode } = props;
  const { mouthMm, footMm } = boreEnds(document);
  const chosenX = document.holes.find(({ id }) => id === selection.hole)?.positionMm;
  const answer = ribbons.answer ?? [];
  const rows = rowsOf(resonances, mode);
  return (
    <svg
      width={geometry.widthPx}
      height={RIBBON_SHELF}
      role="group"
      aria-label="Standing waves along the bore"
      className="is-predicted border-hair block border-b"
    >
      {chosenX !== undefined && (
        <rect x={geometry.x(chosenX) - 39} width={78} height={RIBBON_SHELF} className="bench-column" />
      )}
      {document.holes.map(({ id, positionMm }) => (
        <line
          key={id}
          x1={geometry.x(positionMm)}
          x2={geometry.x(positionMm)}
          y2={RIBBON_SHELF}
          className={classNames('bench-drop', id === selection.hole && 'is-chosen')}
        />
      ))}
      {rows.map(({ rung, y, height }) => (
        <RibbonRow
          key={rung.mode}
          rung={rung}
          ribbon={answer.find((ribbon) => ribbon.mode === rung.mode)}
          isCurrent={ribbons.isCurrent}
          isChosen={rung.mode === mode}
          y={y}
          reach={height / 2 - (rung.mode === mode ? 5 : 4)}
          labelX={geometry.measures.leftZone.x}
          from={geometry.x(mouthMm)}
          to={geometry.x(footMm)}
          x={geometry.x}
          onChoose={() => onMode(rung.mode)}
        />
      ))}
    </svg>
  );
}

function rowsOf(resonances: readonly LadderRung[], mode: number) {
  let top = TOP;
  return resonances.map((rung) => {
    const height = rung.mode === mode ? CHOSEN_ROW : ROW;
    const y = top + height / 2;
    top += height;
    return { rung, y, height };
  });
}

interface RibbonRowProps {
  rung: LadderRung;
  ribbon: Ribbon | undefined;
  isCurrent: boolean;
  isChosen: boolean;
  y: number;
  reach: number;
  labelX: number;
  from: number;
  to: number;
  x: (mm: number) => number;
  onChoose: () => void;
}

function RibbonRow({
  rung,
  ribbon,
  isCurrent,
  isChosen,
  y,
  reach,
  labelX,
  from,
  to,
  x,
  onChoose,
}: RibbonRowProps) {
  const points = ribbon?.points ?? [];
  const shape = area<(typeof points)[number]>()
    .x((point) => x(point.positionMm))
    .y0((point) => y - point.pressure * reach)
    .y1((point) => y + point.pressure * reach)
    .curve(curveMonotoneX);
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key !== 'Enter' && event.key !== ' ') return;
    event.preventDefault();
    event.stopPropagation();
    onChoose();
  };
  return (
    <g
      role="button"
      tabIndex={0}
      aria-pressed={isChosen}
      aria-label={`Resonance ${rung.mode}, ${rung.frequencyHz.toFixed(0)} Hz`}
      onClick={onChoose}
      onKeyDown={onKeyDown}
      className="cursor-pointer"
    >
      <rect x={0} y={y - reach - 4} width={to + 16} height={2 * reach + 8} fill="transparent" />
      <path
        d={shape(points) ?? ''}
        className={classNames('air-ribbon', isChosen && 'is-chosen')}
        opacity={isCurrent ? undefined : 0.25}
      />
      <line x1={from} x2={to} y1={y} y2={y} className="bench-axis" />
      {isCurrent &&
        pressureNodes(points).map((positionMm) => (
          <line
            key={positionMm}
            x1={x(positionMm)}
            x2={x(positionMm)}
            y1={y - (isChosen ? 13.5 : 6)}
            y2={y + (isChosen ? 13.5 : 6)}
            className="air-node"
          />
        ))}
      <RibbonLabel rung={rung} isChosen={isChosen} x={labelX} y={y} room={from - labelX} />
    </g>
  );
}

interface RibbonLabelProps {
  rung: LadderRung;
  isChosen: boolean;
  x: number;
  y: number;
  /** Between the label and the bore, px. */
  room: number;
}

function RibbonLabel({ rung, isChosen, x, y, room }: RibbonLabelProps) {
  const hasLegend = isChosen && room > ROOM_FOR_LEGEND;
  return (
    <>
      <text x={x} y={y + (hasLegend ? -3 : 5)} className="bench-label air-haloed">
        <tspan className="bench-label-strong">{rung.mode}</tspan>
        <tspan dx={8} className={isChosen ? 'bench-label-strong' : undefined}>
          {rung.frequencyHz.toFixed(0)} Hz
        </tspan>
      </text>
      {hasLegend && (
        <text x={x} y={y + 14} className="bench-quiet-label air-haloed">
          bar: no pressure
          <tspan x={x} dy={15}>
            fat: most pressure
          </tspan>
        </text>
      )}
    </>
  );
}
