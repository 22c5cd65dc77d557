import type { KeyboardEvent } from 'react';
import type { FingeringPrediction, LadderRung } from '#shared/analysis/prediction.ts';
import { formatCents } from '#shared/music/cents.ts';
import { spreadColumns } from '../../bench/spread-columns.ts';
import { classNames } from '../../ui/class-names.ts';

interface LadderRungsProps {
  predicted: FingeringPrediction;
  ghosts: readonly { mode: number; frequencyHz: number }[];
  x: number;
  width: number;
  top: number;
  bottom: number;
  cutoffY: number | null;
  y: (hz: number) => number;
  mode: number;
  onMode: (mode: number) => void;
  /** Where the curve has this resonance, px; null while it is not drawn. */
  dotX: (hz: number) => number | null;
  widthHz: (hz: number) => number | null;
  curveRight: number;
}

/** A rung is moved from its exact multiple by this share of the spacing per 100 cents. */
const STRETCH = 0.42;
/** Rungs further from their multiple are not stretched. */
const MOST_STRETCHED_CENTS = 110;
/** Two lines of words, px. */
const WORDS_HEIGHT = 33;
/** Narrower than this, the shading speaks for itself, px. */
const ROOM_FOR_LEAK = 96;
/** No length is left at so many dB below the strongest. */
const FAINTEST_DB = 30;

/** The resonances as rungs: length is strength, height against the dashed rung is what they miss the exact multiple by. */
export function LadderRungs(props: LadderRungsProps) {
  const { predicted, x, width, top, bottom, cutoffY, ghosts, y } = props;
  const first = predicted.ladder.find(({ mode }) => mode === 1)?.frequencyHz ?? 0;
  const spacing = y(0) - y(first);
  const rungs = predicted.ladder
    .map((rung) => ({ rung, y: rungPlace(rung, spacing, y) }))
    .sort((a, b) => a.y - b.y);
  const wordsY = spreadColumns(
    rungs.map((rung) => rung.y),
    { spacing: WORDS_HEIGHT, left: top + 10, right: bottom },
  );
  return (
    <>
      <g aria-hidden="true">
        {cutoffY !== null && cutoffY > top && (
          <>
            <rect x={x} y={top} width={width} height={cutoffY - top} className="air-leak" />
            <line x1={x} x2={x + width} y1={cutoffY} y2={cutoffY} className="air-cutoff" />
            {width > ROOM_FOR_LEAK && (
              <text
                x={x + width - 6}
                y={cutoffY - 6}
                textAnchor="end"
                className="bench-quiet-label air-haloed is-on-leak"
              >
                open holes leak
              </text>
            )}
          </>
        )}
        <path d={`M${x} ${top}V${bottom - 14}M${x + width} ${top}V${bottom - 14}`} className="air-stile" />
        {ghosts.map(({ mode, frequencyHz }) => (
          <line
            key={mode}
            x1={x}
            x2={x + width}
            y1={y(frequencyHz)}
            y2={y(frequencyHz)}
            className="air-ghost"
          />
        ))}
      </g>
      {rungs.map(({ rung, y: rungY }, index) => (
        <Rung
          key={rung.mode}
          {...props}
          rung={rung}
          rungY={rungY}
          wordsY={wordsY[index] ?? rungY}
          isChosen={rung.mode === props.mode}
          isSounding={rung.mode === predicted.mode}
        />
      ))}
    </>
  );
}

/**
 * Stretched about its exact multiple, so that a few cents can be seen; a rung that is further out than the stretch can show
 * stands at its own frequency.
 */
function rungPlace(
  { frequencyHz, centsFromMultiple }: LadderRung,
  spacing: number,
  y: (hz: number) => number,
): number {
  if (Math.abs(centsFromMultiple) > MOST_STRETCHED_CENTS) return y(frequencyHz);
  const exact = y(frequencyHz / 2 ** (centsFromMultiple / 1200));
  return exact - (STRETCH * spacing * centsFromMultiple) / 100;
}

interface RungProps extends LadderRungsProps {
  rung: LadderRung;
  rungY: number;
  /** Its words stand here, clear of the neighbours'. */
  wordsY: number;
  isChosen: boolean;
  isSounding: boolean;
}

function Rung({
  rung,
  rungY,
  wordsY,
  isChosen,
  isSounding,
  x,
  width,
  y,
  onMode,
  dotX,
  widthHz,
  curveRight,
}: RungProps) {
  const { mode, frequencyHz, centsFromMultiple, strength, weak } = rung;
  const end = x + width * Math.max(0.02, 1 + strength / FAINTEST_DB);
  const curveX = dotX(frequencyHz);
  const look = classNames(weak && 'is-weak', isChosen && 'is-chosen');
  const decibels = `${strength.toFixed(0).replace('-', '−').replace('−0', '0')} dB`;
  const cents = formatCents(centsFromMultiple);
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key !== 'Enter' && event.key !== ' ') return;
    event.preventDefault();
    event.stopPropagation();
    onMode(mode);
  };
  return (
    <g
      role="button"
      tabIndex={0}
      aria-pressed={isChosen}
      aria-label={`Resonance ${mode}${isSounding ? ', sounding' : ''}, ${frequencyHz.toFixed(0)} Hz, ${cents} cents from the exact multiple, ${decibels}${weak ? ', weak' : ''}`}
      onClick={() => onMode(mode)}
      onKeyDown={onKeyDown}
      className="cursor-pointer"
    >
      <rect x={x - 24} y={rungY - 16} width={width + 180} height={32} fill="transparent" />
      {curveX !== null && (
        <>
          <path
            d={`M${curveX} ${y(frequencyHz)}H${curveRight + 10}L${x - 22} ${rungY}`}
            className={classNames('air-leader', look)}
          />
          <circle cx={curveX} cy={y(frequencyHz)} r={3.6} className={classNames('air-dot', look)} />
        </>
      )}
      <line x1={x} x2={end} y1={rungY} y2={rungY} className={classNames('air-rung', look)} />
      <circle cx={end} cy={rungY} r={3.2} className={classNames('air-rung-end', look)} />
      <text x={x - 8} y={rungY + 5} textAnchor="end" className="bench-label bench-label-strong">
        {mode}
      </text>
      <RungWords
        {...{ rung, isSounding, cents, decibels }}
        wide={widthHz(frequencyHz)}
        x={x + width + 14}
        y={wordsY - 1}
      />
    </g>
  );
}

interface RungWordsProps {
  rung: LadderRung;
  isSounding: boolean;
  cents: string;
  decibels: string;
  /** Width between the half-power points, Hz; null where it cannot be told. */
  wide: number | null;
  x: number;
  y: number;
}

/** The first rung is what the others are held against: it misses nothing. */
function RungWords({ rung, isSounding, cents, decibels, wide, x, y }: RungWordsProps) {
  const width = wide === null ? '' : `${wide.toFixed(0)} Hz wide`;
  return (
    <text x={x} y={y} className="bench-quiet-label">
      {isSounding && <tspan className="bench-label-strong">sounding </tspan>}
      {rung.mode > 1 && <tspan className="bench-label-strong">{cents}</tspan>}
      {rung.mode > 1 ? ` cents${width === '' ? '' : `, ${width}`}` : width}
      <tspan x={x} dy={16}>
        {rung.frequencyHz.toFixed(0)} Hz, {decibels}
      </tspan>
    </text>
  );
}
