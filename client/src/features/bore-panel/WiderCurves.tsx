import { line } from 'd3';
import { useMemo } from 'react';
import type { DesignDocument, Fingering } from '#shared/document/design-document.ts';
import type { WiderHere } from '../../engine/wider-here.ts';
import { useStudy } from '../../engine/use-study.ts';
import { Bob } from '../../bench/Bob.tsx';
import { NoteSpan } from '../../bench/NoteName.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';
import { ShelfCaption } from '../../bench/ShelfCaption.tsx';
import { boreEnds } from '#shared/document/profile.ts';
import { SHELF } from './shelf-scale.ts';

interface WiderCurvesProps extends PanelProps {
  isBeside: boolean;
}

/** Where a wider bore sharpens the chosen note and where it flattens it, beside the note with the same holes an octave up. */
export function WiderCurves({ document, geometry, selection, isBeside }: WiderCurvesProps) {
  const shown = useMemo(
    () => shownFingerings(document, selection.fingering),
    [document, selection.fingering],
  );
  const ask = useMemo(
    () => (shown.length === 0 ? null : { document, fingerings: shown.map(({ id }) => id) }),
    [document, shown],
  );
  const { answer, isCurrent } = useStudy('wider-here', ask);
  const curves = answer ?? [];
  const most = curves
    .flatMap(({ points }) => points)
    .reduce((size, { cents }) => Math.max(size, Math.abs(cents)), 0.1);
  const full = most > 0.5 ? Math.ceil(most) : Math.ceil(most * 10) / 10;
  const y = (cents: number) => SHELF.curveY - (cents / full) * SHELF.curveReach;
  return (
    <g role="img" aria-label={spoken(curves, shown, boreEnds(document).footMm)}>
      <ShelfCaption
        isBeside={isBeside}
        y={170}
        title="Wider here"
        lines={['up is sharper', 'cents, 0.1 mm', 'over 10 mm']}
        sentence="up is sharper, cents for 0.1 mm over 10 mm"
      />
      <line
        x1={geometry.x(boreEnds(document).mouthMm)}
        x2={geometry.x(boreEnds(document).footMm)}
        y1={SHELF.curveY}
        y2={SHELF.curveY}
        className="bore-zero"
      />
      {[full, 0, -full].map((cents) => (
        <text
          key={cents}
          x={isBeside ? 144 : geometry.viewRight - 12}
          y={y(cents) + 4}
          textAnchor="end"
          className="bench-quiet-label bore-haloed"
        >
          {cents > 0 ? `+${cents}` : String(cents).replace('-', '−')}
        </text>
      ))}
      <g opacity={isCurrent ? 1 : 0.3}>
        {curves.map((curve, index) => {
          const fingering = shown.find(({ id }) => id === curve.fingering);
          return fingering === undefined ? null : (
            <Curve
              key={curve.fingering}
              isBeside={isBeside}
              curve={curve}
              fingering={fingering}
              place={index}
              x={geometry.x}
              y={y}
            />
          );
        })}
      </g>
    </g>
  );
}

/** Names stand near the left end of their curves, above the first and below the second; or in a row at the foot of the shelf. */
const NAME_IN = 96;
const NAME_WIDTH = 64;

interface CurveProps {
  curve: WiderHere;
  fingering: Fingering;
  /** Which of the two curves this is. */
  place: number;
  isBeside: boolean;
  x: (mm: number) => number;
  y: (cents: number) => number;
}

/** Register 2 is dashed and ringed as everywhere, so that the hue is not alone. */
function Curve({ curve, fingering, place, isBeside, x, y }: CurveProps) {
  const points = curve.points.map(({ positionMm, cents }) => [x(positionMm), y(cents)] as [number, number]);
  const path = line()(points) ?? '';
  const [first, last] = [points[0], points.at(-1)];
  const look = `is-register${Math.min(fingering.register, 3)}`;
  if (first === undefined || last === undefined) return null;
  const label = isBeside
    ? { x: first[0] + NAME_IN, y: SHELF.curveY + (place === 0 ? -31 : 32) }
    : { x: 30 + place * NAME_WIDTH, y: SHELF.height - 9 };
  return (
    <>
      <path d={`${path}L${last[0]} ${y(0)}L${first[0]} ${y(0)}Z`} className={`bore-area ${look}`} />
      <path d={path} className={`bore-curve ${look}`} />
      <g transform={`translate(${label.x} ${label.y})`}>
        <Bob register={fingering.register} scale={0.6} />
        <text x={10} y={4.5} className="bench-label bench-label-strong bore-haloed">
          <NoteSpan note={fingering.note} />
        </text>
      </g>
    </>
  );
}

/** The chosen note, else the lowest; and the other register on the same holes. */
function shownFingerings(document: DesignDocument, chosen: string | null): Fingering[] {
  const { fingerings } = document;
  const main =
    fingerings.find(({ id }) => id === chosen) ??
    fingerings.reduce<Fingering | undefined>(
      (most, one) => (most === undefined || one.covered.length > most.covered.length ? one : most),
      undefined,
    );
  if (main === undefined) return [];
  const holesOf = ({ covered, half }: Fingering) => JSON.stringify([covered.toSorted(), half]);
  const other = fingerings.find((one) => one.register !== main.register && holesOf(one) === holesOf(main));
  return other === undefined ? [main] : [main, other].sort((a, b) => a.register - b.register);
}

function spoken(curves: readonly WiderHere[], shown: readonly Fingering[], footMm: number): string {
  const from = ({ positionMm }: { positionMm: number }) => (footMm - positionMm).toFixed(0);
  const sentences = curves.flatMap(({ fingering, points }) => {
    const note = shown.find(({ id }) => id === fingering)?.note;
    if (note === undefined || points.length === 0) return [];
    const sharpest = points.reduce((best, point) => (point.cents > best.cents ? point : best));
    const flattest = points.reduce((best, point) => (point.cents < best.cents ? point : best));
    return [
      `${note} is sharpened most by a wider bore ${from(sharpest)} mm from the foot, flattened most at ${from(flattest)} mm.`,
    ];
  });
  return sentences.length === 0 ? 'What a wider bore does to the chosen note' : sentences.join(' ');
}
