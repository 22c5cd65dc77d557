import { line, scaleLinear } from 'd3';
import { useMemo } from 'react';
import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { useStudy } from '../../engine/use-study.ts';
import { LadderRungs } from './LadderRungs.tsx';
import {
  curveInDecibels,
  decibelsAt,
  ghostsOf,
  resonanceWidthHz,
  type CurvePoint,
} from './resonance-curve.ts';

interface ResonanceDrawingProps {
  document: DesignDocument;
  predicted: FingeringPrediction;
  /** False where openings are drawn as if they did not hear each other. */
  coupling: boolean;
  maxima: boolean;
  hasGhosts: boolean;
  mode: number;
  onMode: (mode: number) => void;
  width: number;
}

const TOP = 12;
const BOTTOM = 296;
const HEIGHT = 336;
const AXIS_X = 46;
/** On a narrow page the curve gives way, and the widths are left out of the words. */
const NARROW = 440;
const ROOMY = { curveWidth: 132, gap: 54, words: 150 };
const TIGHT = { curveWidth: 56, gap: 44, words: 112 };
/** Room beyond the last rung or ghost, as a share of the axis. */
const HEADROOM = 1.06;

/** The input impedance lying on its side, and the ladder standing on the same frequencies. */
export function ResonanceDrawing(props: ResonanceDrawingProps) {
  const { document, predicted, coupling, maxima, width } = props;
  const ghosts = useMemo(() => ghostsOf(predicted, maxima), [predicted, maxima]);
  const highest = [...predicted.ladder, ...ghosts].reduce(
    (most, { frequencyHz }) => Math.max(most, frequencyHz),
    500,
  );
  // Whole hundreds, so that a drag does not move the axis with every frame.
  const toHz = Math.ceil((highest * HEADROOM) / 100) * 100;
  const curve = useStudy(
    'impedance',
    useMemo(
      () => ({ document, fingering: predicted.id, toHz, coupling }),
      [document, predicted.id, toHz, coupling],
    ),
  );
  const points = useMemo(() => (curve.answer === null ? [] : curveInDecibels(curve.answer)), [curve.answer]);
  const y = scaleLinear([0, toHz], [BOTTOM, TOP]);
  const room = width > NARROW ? ROOMY : TIGHT;
  const { curveWidth } = room;
  const x = impedanceScale(points, maxima, curveWidth);
  const ladderX = AXIS_X + curveWidth + room.gap;
  const cutoffY = predicted.cutoffHz === null ? null : y(Math.min(toHz, predicted.cutoffHz));
  return (
    <svg
      width={width}
      height={HEIGHT}
      role="group"
      aria-label={`Resonances of ${predicted.note}`}
      className="is-predicted mt-2 block"
    >
      {cutoffY !== null && cutoffY > TOP && (
        <g aria-hidden="true">
          <rect x={AXIS_X} y={TOP} width={curveWidth} height={cutoffY - TOP} className="air-leak" />
          <line x1={AXIS_X} x2={AXIS_X + curveWidth} y1={cutoffY} y2={cutoffY} className="air-cutoff" />
        </g>
      )}
      <FrequencyAxis y={y} toHz={toHz} curveWidth={curveWidth} />
      <g aria-hidden="true" opacity={curve.isCurrent ? 1 : 0.3}>
        <path
          d={
            line<CurvePoint>()
              .x(({ decibels }) => x(decibels))
              .y(({ frequencyHz }) => y(frequencyHz))(points) ?? ''
          }
          className="air-curve"
        />
      </g>
      <LadderRungs
        predicted={predicted}
        ghosts={props.hasGhosts ? ghosts : []}
        x={ladderX}
        width={Math.min(120, width - ladderX - room.words)}
        top={TOP}
        bottom={BOTTOM}
        cutoffY={cutoffY}
        y={y}
        mode={props.mode}
        onMode={props.onMode}
        dotX={(frequencyHz) => {
          const decibels = curve.isCurrent ? decibelsAt(points, frequencyHz) : null;
          return decibels === null ? null : x(decibels);
        }}
        widthHz={(frequencyHz) =>
          curve.isCurrent && room === ROOMY ? resonanceWidthHz(points, frequencyHz, maxima) : null
        }
        curveRight={AXIS_X + curveWidth}
      />
    </svg>
  );
}

/** What plays is at the left, whichever way the mouth end plays. */
function impedanceScale(points: readonly CurvePoint[], maxima: boolean, width: number) {
  const levels = points.map(({ decibels }) => decibels);
  const [least, most] = [Math.min(0, ...levels), Math.max(1, ...levels)];
  return scaleLinear(maxima ? [most, least] : [least, most], [AXIS_X, AXIS_X + width]);
}

interface FrequencyAxisProps {
  y: (hz: number) => number;
  toHz: number;
  curveWidth: number;
}

function FrequencyAxis({ y, toHz, curveWidth }: FrequencyAxisProps) {
  const inKilo = toHz > 1500;
  // The unit stands at the top of the axis, in place of a figure.
  const ticks = scaleLinear([0, toHz], [0, 1])
    .ticks(5)
    .filter((hz) => y(hz) > TOP + 14);
  return (
    <g aria-hidden="true">
      <line x1={AXIS_X} x2={AXIS_X} y1={TOP} y2={BOTTOM} className="air-axis" />
      {ticks.map((hz) => (
        <text key={hz} x={AXIS_X - 8} y={y(hz) + 4} textAnchor="end" className="bench-quiet-label">
          {inKilo ? hz / 1000 : hz}
        </text>
      ))}
      <text x={AXIS_X - 8} y={TOP + 1} textAnchor="end" className="bench-quiet-label air-haloed">
        {inKilo ? 'kHz' : 'Hz'}
      </text>
      <text x={AXIS_X} y={BOTTOM + 20} className="bench-quiet-label">
        plays
      </text>
      {curveWidth > 90 && (
        <text x={AXIS_X + curveWidth} y={BOTTOM + 20} textAnchor="end" className="bench-quiet-label">
          resists
        </text>
      )}
      <text x={AXIS_X + curveWidth / 2} y={BOTTOM + 36} textAnchor="middle" className="bench-quiet-label">
        input impedance, dB
      </text>
    </g>
  );
}
