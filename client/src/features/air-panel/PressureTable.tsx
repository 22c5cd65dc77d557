import type { ReactNode } from 'react';
import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import { boreEnds } from '#shared/document/profile.ts';
import { formatCents } from '#shared/music/cents.ts';
import { FingeringCircle } from '../../bench/FingeringCircle.tsx';
import { holeMark, spokenMark } from '../../bench/fingering-marks.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';
import type { StudyView } from '../../engine/use-study.ts';
import { classNames } from '../../ui/class-names.ts';
import { pressureAt } from './pressure-nodes.ts';

interface PressureTableProps extends PanelProps {
  predicted: FingeringPrediction | null;
  ribbons: StudyView<'ribbons'>;
  mode: number;
}

const BEAM = 32;
const BAR = 52;

/** Under each hole: how it is fingered, the pressure of each resonance there, and what its sizes do to the note. */
export function PressureTable(props: PressureTableProps) {
  const { document, geometry, predicted, ribbons, mode, sensitivities } = props;
  const holes = labelledHoles(document);
  const fingering = document.fingerings.find(({ id }) => id === predicted?.id);
  const centsOf = sensitivities?.fingerings.find(({ id }) => id === predicted?.id)?.centsPerUnit;
  const placeOf = (key: string) =>
    document.holes.find(({ id }) => id === key)?.positionMm ?? boreEnds(document).footMm;
  const holeOf = (key: string) => holes.find(({ hole }) => hole.id === key);
  const perTenth = (cents: number | undefined) => (cents === undefined ? '' : formatCents(cents / 10));
  const dimension = (key: string, name: 'diameterMm' | 'positionMm') => {
    const labelled = holeOf(key);
    if (labelled !== undefined) return centsOf?.[`holes.${labelled.index}.${name}`];
    return name === 'positionMm' ? centsOf?.['foot.positionMm'] : undefined;
  };
  return (
    <div
      role="table"
      aria-label="Pressure at the holes, percent of the most in the bore"
      className="is-predicted relative"
    >
      <Leaders {...props} />
      <div role="row" className="sr-only">
        <span role="columnheader">At</span>
        {geometry.columns.map(({ key }) => (
          <span key={key} role="columnheader">
            {holeOf(key)?.title ?? 'Foot'}
          </span>
        ))}
      </div>
      {fingering !== undefined && (
        <Row
          {...props}
          height={40}
          name={
            <>
              <b className="text-ink font-semibold">
                <NoteName note={fingering.note} />
              </b>{' '}
              fingering
            </>
          }
          cell={(key) => {
            const hole = holeOf(key)?.hole;
            if (hole === undefined)
              return (
                <span className="text-ink3">{document.foot.kind === 'stopped' ? 'stopped' : 'open'}</span>
              );
            const mark = holeMark(fingering, hole);
            return (
              <>
                <svg width="20" height="40" aria-hidden="true" className="inline-block overflow-visible">
                  <FingeringCircle x={10} y={20} radius={8.4} mark={mark} />
                </svg>
                <span className="sr-only">{spokenMark(mark)}</span>
              </>
            );
          }}
        />
      )}
      {ribbons.answer !== null && (
        <PressureHeading left={lineLeft(geometry)} right={geometry.widthPx - geometry.hangRight} />
      )}
      {(ribbons.answer ?? []).map((ribbon) => (
        <Row
          key={ribbon.mode}
          {...props}
          height={38}
          isStrong={ribbon.mode === mode}
          name={`Resonance ${ribbon.mode}`}
          cell={(key) => (
            <PressureBar
              share={ribbons.isCurrent ? pressureAt(ribbon.points, placeOf(key)) : null}
              isChosen={ribbon.mode === mode}
            />
          )}
        />
      ))}
      {centsOf !== undefined && (
        <>
          <Row
            {...props}
            height={geometry.measures.rowHeight}
            name="Wider 0.1"
            unitName="cents"
            cell={(key) => perTenth(dimension(key, 'diameterMm'))}
          />
          <Row
            {...props}
            height={geometry.measures.rowHeight}
            name="Footward 0.1"
            unitName="cents"
            cell={(key) => perTenth(dimension(key, 'positionMm'))}
          />
        </>
      )}
    </div>
  );
}

const lineLeft = ({ labelRight }: PanelProps['geometry']) => Math.max(8, labelRight - 122);

/** What the bars below are; the rows themselves carry their resonance. */
function PressureHeading({ left, right }: { left: number; right: number }) {
  return (
    <p
      aria-hidden="true"
      className="text-label border-hair relative border-t pt-0.5"
      style={{ marginLeft: left, marginRight: right }}
    >
      <b className="font-semibold">Pressure at the hole</b>{' '}
      <span className="text-small text-ink3">percent of the most in the bore</span>
    </p>
  );
}

interface RowProps extends PanelProps {
  height: number;
  name: ReactNode;
  unitName?: string;
  isStrong?: boolean;
  cell: (column: string) => ReactNode;
}

function Row({ geometry, selection, height, name, unitName = '', isStrong = false, cell }: RowProps) {
  const { columns, labelRight, hangRight } = geometry;
  const left = lineLeft(geometry);
  const width = Math.min(80, geometry.columnSpacing);
  return (
    <div role="row" className="relative" style={{ height }}>
      <div
        aria-hidden="true"
        className="border-hair absolute top-0 border-t"
        style={{ left, right: geometry.widthPx - hangRight }}
      />
      <div
        role="rowheader"
        className={classNames(
          'text-label absolute w-40 text-right',
          isStrong ? 'text-ink font-semibold' : 'text-ink2',
          labelRight < 60 && 'sr-only',
        )}
        style={{ left: labelRight - 160, lineHeight: `${height}px` }}
      >
        {name} {unitName !== '' && <span className="text-small text-ink3">{unitName}</span>}
      </div>
      {columns.map(({ key, x }) => (
        <div
          key={key}
          role="cell"
          className={classNames(
            'text-data absolute text-center',
            (isStrong || key === selection.hole) && 'font-bold',
          )}
          style={{ left: x - width / 2, width, lineHeight: `${height}px` }}
        >
          {cell(key)}
        </div>
      ))}
    </div>
  );
}

function PressureBar({ share, isChosen }: { share: number | null; isChosen: boolean }) {
  if (share === null) return null;
  const width = share * BAR;
  return (
    <span className={classNames('block leading-none', !isChosen && 'text-ink3')}>
      <svg
        viewBox={`0 0 ${BAR} 8`}
        height={8}
        preserveAspectRatio="none"
        aria-hidden="true"
        className="mx-auto mt-1.5 mb-1 block w-full max-w-13"
      >
        <rect width={BAR} height={8} className="air-bar-room" />
        <rect
          x={(BAR - width) / 2}
          width={width}
          height={8}
          className={classNames('air-bar', isChosen && 'is-chosen')}
        />
      </svg>
      {(share * 100).toFixed(0)}
    </span>
  );
}

/** From the holes to the columns, over the tint of the chosen one. */
function Leaders({ geometry, selection }: PanelProps) {
  const { columns, hangLeft, hangRight } = geometry;
  const chosen = columns.find(({ key }) => key === selection.hole);
  return (
    <>
      {chosen !== undefined && (
        <div
          aria-hidden="true"
          className="bg-mark-soft absolute"
          style={{ left: chosen.x - 39, width: 78, top: BEAM, bottom: 0 }}
        />
      )}
      <svg width={geometry.widthPx} height={BEAM} aria-hidden="true" className="block overflow-visible">
        {chosen !== undefined && (
          <path
            d={`M${chosen.holeX - 39} 0V8L${chosen.x - 39} ${BEAM - 3}V${BEAM}H${chosen.x + 39}V${BEAM - 3}L${chosen.holeX + 39} 8V0Z`}
            className="bench-column"
          />
        )}
        <line x1={hangLeft} x2={hangRight} y1={BEAM} y2={BEAM} className="bench-beam" />
        {columns.map(({ key, holeX, x }) => (
          <g key={key}>
            <path
              d={`M${holeX} 4V9L${x} ${BEAM - 3}V${BEAM}`}
              className={classNames('bench-leader', key === selection.hole && 'is-chosen')}
            />
            <circle cx={x} cy={BEAM} r={2.6} className="bench-pivot" />
          </g>
        ))}
      </svg>
    </>
  );
}
