import { BenchDefs } from '../bench/BenchDefs.tsx';
import { Bob } from '../bench/Bob.tsx';
import { SteelRule } from '../bench/SteelRule.tsx';
import { useElementWidth } from '../ui/use-element-width.ts';

/** A whistle in D of nobody's, mm from the foot; what hangs from it is what it might play. */
const LENGTH_MM = 296;
const WINDOW_MM = 265;
const HALF_MM = 8.6;
const HOLES = [
  { fromFootMm: 142.4, diameterMm: 7, cents: -0.4 },
  { fromFootMm: 122.5, diameterMm: 7.5, cents: 0.5 },
  { fromFootMm: 102.8, diameterMm: 7.5, cents: 1.7 },
  { fromFootMm: 78.2, diameterMm: 7, cents: -1.6 },
  { fromFootMm: 64.2, diameterMm: 8.5, cents: -0.8 },
  { fromFootMm: 45.4, diameterMm: 6, cents: 0 },
] as const;
const FOOT_CENTS = -2.4;

const HEIGHT = 326;
const AXIS_Y = 92;
const RULE_Y = 163;
const BEAM_Y = 227;
const LEAST_PX_PER_MM = 2.6;
const BAND_PX = 11;
const PX_PER_CENT = 2.4;

/** The first thing anybody sees of the place: an instrument across the top of the page, and everything hanging from it. */
export function BenchAcross() {
  const [ref, widthPx] = useElementWidth();
  return (
    <div ref={ref} aria-hidden="true" className="h-81.5 overflow-hidden">
      <BenchDefs />
      {widthPx !== null && <Across widthPx={widthPx} />}
    </div>
  );
}

function Across({ widthPx }: { widthPx: number }) {
  const margin = widthPx < 700 ? 16 : widthPx < 1025 ? 24 : 40;
  const footX = widthPx - margin - 16;
  const k = Math.max(LEAST_PX_PER_MM, (footX - margin) / LENGTH_MM);
  const x = (fromFootMm: number) => footX - fromFootMm * k;
  const across = Math.min(k, 40 / HALF_MM);
  const hung = [...HOLES, { fromFootMm: 0, diameterMm: 0, cents: FOOT_CENTS }];
  return (
    <svg width={widthPx} height={HEIGHT} viewBox={`0 0 ${widthPx} ${HEIGHT}`} className="block">
      <rect width={widthPx} height={BEAM_Y} fill="var(--bench)" />
      <line x2={widthPx} y1={BEAM_Y} y2={BEAM_Y} className="bench-row" />
      <Whistle x={x} across={across} />
      <SteelRule
        zeroX={footX}
        leftX={x(LENGTH_MM)}
        y={RULE_Y}
        height={24}
        pxPerMm={k}
        unit="mm"
        seen={[0, widthPx]}
      />
      <line x1={x(151)} x2={footX + margin} y1={BEAM_Y} y2={BEAM_Y} className="bench-beam" />
      {hung.map(({ fromFootMm, diameterMm, cents }) => {
        const at = x(fromFootMm);
        const bob = at + cents * PX_PER_CENT;
        return (
          <g key={fromFootMm}>
            <rect
              x={at - BAND_PX}
              y={BEAM_Y + 1}
              width={BAND_PX * 2}
              height={HEIGHT}
              className="bench-band"
            />
            <path
              d={`M${at - BAND_PX} ${BEAM_Y}V${HEIGHT}M${at + BAND_PX} ${BEAM_Y}V${HEIGHT}`}
              className="bench-band-edge"
            />
            {diameterMm > 0 && (
              <line
                x1={at}
                x2={at}
                y1={AXIS_Y + (diameterMm * across) / 2}
                y2={BEAM_Y}
                className="bench-drop"
              />
            )}
            <line x1={at} x2={at} y1={BEAM_Y} y2={HEIGHT} className="bench-true" />
            <line x1={at} y1={BEAM_Y} x2={bob} y2={BEAM_Y + 74} className="bench-thread is-register1" />
            <circle cx={at} cy={BEAM_Y} r="2.4" className="bench-pivot" />
            <g transform={`translate(${bob} ${BEAM_Y + 74})`}>
              <Bob register={1} />
            </g>
          </g>
        );
      })}
    </svg>
  );
}

interface WhistleProps {
  x: (fromFootMm: number) => number;
  across: number;
}

function Whistle({ x, across }: WhistleProps) {
  const half = HALF_MM * across;
  const neck = half * 0.62;
  const [tip, bend, shoulder, foot] = [x(LENGTH_MM), x(290), x(279), x(0)];
  const [top, bottom] = [AXIS_Y - half, AXIS_Y + half];
  const body = [
    `M${foot} ${top}V${bottom}H${shoulder}`,
    `C${bend} ${bottom} ${bend} ${AXIS_Y + neck} ${tip + 4} ${AXIS_Y + neck}Q${tip} ${AXIS_Y + neck} ${tip} ${AXIS_Y + neck - 4}`,
    `V${AXIS_Y - neck + 4}Q${tip} ${AXIS_Y - neck} ${tip + 4} ${AXIS_Y - neck}`,
    `C${bend} ${AXIS_Y - neck} ${bend} ${top} ${shoulder} ${top}Z`,
  ].join('');
  const lip = x(WINDOW_MM);
  const [windowHalf, face, ramp] = [4.5 * across, x(WINDOW_MM + 4.6), x(WINDOW_MM - 7.4)];
  return (
    <>
      <path d={body} className="bench-wood" />
      {[249, 246.8, 7, 4.8].map((ring) => (
        <line key={ring} x1={x(ring)} x2={x(ring)} y1={top} y2={bottom} className="bench-ring" />
      ))}
      <rect
        x={face}
        y={AXIS_Y - windowHalf}
        width={lip - face}
        height={windowHalf * 2}
        className="bench-hole"
      />
      <path
        d={`M${lip} ${AXIS_Y - windowHalf}L${ramp} ${AXIS_Y - windowHalf * 0.66}V${AXIS_Y + windowHalf * 0.66}L${lip} ${AXIS_Y + windowHalf}Z`}
        className="bench-ramp"
      />
      {HOLES.map(({ fromFootMm, diameterMm }) => (
        <g key={fromFootMm}>
          <circle cx={x(fromFootMm)} cy={AXIS_Y} r={(diameterMm * across) / 2 + 1} className="bench-eased" />
          <circle cx={x(fromFootMm)} cy={AXIS_Y} r={(diameterMm * across) / 2} className="bench-hole" />
        </g>
      ))}
    </>
  );
}
