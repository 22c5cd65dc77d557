import { formatCents } from '#shared/music/cents.ts';
import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import { classNames } from '../../ui/class-names.ts';
import { ladderPlaces, type PlacedRung } from './ladder-places.ts';

interface LadderProps {
  /** The chosen note; null before anything is worked out. */
  prediction: FingeringPrediction | null;
  height: number;
}

const LEFT = 20;
const RIGHT = 132;
const WIDTH = 232;
/** Rungs beside the inspector; the Air panel shows all of them. */
const MOST_RUNGS = 5;
/** Two lines of text need this much of the spacing, px. */
const TEXT_PX = 32;

/** The resonances of the chosen fingering against the exact multiples of the first. */
export function Ladder({ prediction, height }: LadderProps) {
  return (
    <section aria-label="Air column" className="is-predicted" style={{ width: WIDTH }}>
      <header className="flex h-8.5 items-baseline gap-2.5">
        <h2 className="text-section font-semibold">Air column</h2>
        {prediction !== null && (
          <span className="text-data text-ink3">
            <NoteName note={prediction.note} /> fingering
          </span>
        )}
      </header>
      {prediction !== null && prediction.ladder.length > 0 ? (
        <>
          <LadderDrawing prediction={prediction} height={height} />
          <LadderKey />
        </>
      ) : (
        <p className="text-data text-ink3 mt-2">
          {prediction === null
            ? 'Choose a note to see its air column.'
            : 'No resonance was found for this fingering.'}
        </p>
      )}
    </section>
  );
}

function LadderDrawing({ prediction, height }: { prediction: FingeringPrediction; height: number }) {
  const { rungs, cutoffY } = ladderPlaces(prediction, { top: 6, bottom: height, most: MOST_RUNGS });
  const textYs = spreadText(rungs);
  return (
    <div className="relative" style={{ height }}>
      <svg
        width={WIDTH}
        height={height}
        className="absolute inset-0 block overflow-visible"
        aria-hidden="true"
      >
        {cutoffY !== null && (
          <>
            <rect x={LEFT} y={6} width={RIGHT - LEFT} height={cutoffY - 6} className="bench-leak" />
            <path d={`M${LEFT} ${cutoffY}H${RIGHT}`} className="bench-cutoff" />
            <text
              x={RIGHT - 6}
              y={leakTextY(cutoffY, rungs)}
              textAnchor="end"
              className="bench-quiet-label bench-on-leak"
            >
              open holes leak
            </text>
          </>
        )}
        {rungs.map((placed) => (
          <RungDrawing key={placed.rung.mode} placed={placed} />
        ))}
        <path d={`M${LEFT} 6V${height}M${RIGHT} 6V${height}`} className="bench-stile" />
      </svg>
      <ol className="absolute inset-0">
        {rungs.map(({ rung }, index) => (
          <li
            key={rung.mode}
            className="text-small text-ink3 absolute -translate-y-1/2 leading-4 whitespace-nowrap"
            style={{ left: RIGHT + 12, top: textYs[index] }}
          >
            <RungWords mode={rung.mode} prediction={prediction} index={index} />
            <br />
            {rung.frequencyHz.toFixed(0)} Hz, {decibels(rung.strength)}
          </li>
        ))}
      </ol>
    </div>
  );
}

function RungWords({
  mode,
  prediction,
  index,
}: {
  mode: number;
  prediction: FingeringPrediction;
  index: number;
}) {
  const rung = prediction.ladder[index];
  const isSounding = prediction.mode === mode;
  if (rung === undefined) return null;
  return (
    <>
      <span className="sr-only">Resonance {mode}: </span>
      {index > 0 && (
        <>
          <b className="text-ink font-semibold">{formatCents(rung.centsFromMultiple)}</b> cents
        </>
      )}
      {index > 0 && isSounding && ', '}
      {isSounding && <b className="text-ink font-semibold">sounding</b>}
      {index === 0 && !isSounding && 'first'}
    </>
  );
}

const decibels = (strength: number) => `${strength < -0.5 ? '−' : ''}${Math.abs(strength).toFixed(0)} dB`;

function RungDrawing({ placed }: { placed: PlacedRung }) {
  const { rung, y, multipleY, share, held } = placed;
  const end = LEFT + (RIGHT - LEFT) * share;
  const look = rung.weak && 'is-weak';
  return (
    <>
      <path d={`M${LEFT} ${multipleY}H${RIGHT}`} className="bench-multiple" />
      <path d={`M${LEFT} ${y}H${end}`} className={classNames('bench-rung', look)} />
      {held !== 0 && (
        <path
          d={`M${end + 8} ${y + held * 2}l4.5 ${held * -4.5}l4.5 ${held * 4.5}`}
          className="bench-rung-held"
        />
      )}
      <circle cx={end} cy={y} r={3.2} className={classNames('bench-rung-end', look)} />
      <text x={LEFT - 8} y={y + 4.5} textAnchor="end" className="bench-label bench-label-strong">
        {rung.mode}
      </text>
    </>
  );
}

/** The words keep clear of each other where resonances crowd, in the order in which these lie. */
function spreadText(rungs: readonly PlacedRung[]): number[] {
  const ys = rungs.map(({ y }) => y);
  const upwards = [...ys.keys()].sort((a, b) => (ys[b] ?? 0) - (ys[a] ?? 0));
  let free = Infinity;
  for (const index of upwards) {
    const y = Math.min(ys[index] ?? 0, free);
    ys[index] = y;
    free = y - TEXT_PX;
  }
  return ys;
}

/** Above the line, unless a rung is there. */
function leakTextY(cutoffY: number, rungs: readonly PlacedRung[]): number {
  const isTaken = rungs.some(({ y, multipleY }) =>
    [y, multipleY].some((line) => line > cutoffY - 18 && line < cutoffY),
  );
  return isTaken ? cutoffY + 14 : cutoffY - 6;
}

function LadderKey() {
  return (
    <div className="text-small text-ink3 mt-2" aria-hidden="true">
      <p className="flex items-center gap-1.5">
        <span className="border-line w-4.5 border-t-[1.5px] border-dashed" /> exact multiple of the first
      </p>
      <p className="flex items-center gap-1.5">
        <span className="border-ink w-4.5 border-t-4" /> resonance; longer is stronger
      </p>
    </div>
  );
}
