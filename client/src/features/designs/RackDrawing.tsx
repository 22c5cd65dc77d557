import { memo } from 'react';
import type { DesignSummary } from '#shared/contract/designs.ts';
import { spreadColumns } from '../../bench/spread-columns.ts';
import '../../bench/bench.css';
import { headMm, type RackScale } from './rack-scale.ts';

type Outline = DesignSummary['outline'];
type Plumb = DesignSummary['plumb'];

interface RackDrawingProps {
  outline: Outline;
  /** Register 1 as predicted, for the small plumb lines; empty draws none. */
  plumb: Plumb;
  scale: RackScale;
}

const AXIS_Y = 14;
/** Thin pipes stay visible at a small scale, and no pipe grows into its neighbour. */
const TUBE_PX = { least: 9, most: 26 };
const PX_PER_CENT = 0.7;
const HELD_PX = 11;
const BOB_SPACING = 13;
export const RACK_DRAWING_HEIGHT = 56;

/** An instrument in a rack: to the rack's scale, its foot at the right edge, its register 1 hanging from it. */
export const RackDrawing = memo(function RackDrawing({ outline, plumb, scale }: RackDrawingProps) {
  const { widthPx, pxPerMm } = scale;
  const x = (mm: number) => widthPx - 6 - (outline.footMm - mm) * pxPerMm;
  const widest = outline.outside.reduce((most, station) => Math.max(most, station.diameterMm), 1);
  const across = Math.min(TUBE_PX.most / widest, Math.max(pxPerMm * 1.25, TUBE_PX.least / widest));
  const tubeBottom = AXIS_Y + (widest * across) / 2;
  return (
    <svg
      width={widthPx}
      height={RACK_DRAWING_HEIGHT}
      viewBox={`0 0 ${widthPx} ${RACK_DRAWING_HEIGHT}`}
      aria-hidden="true"
      className="block"
    >
      <Head outline={outline} x={x} across={across} />
      <path d={bodyPath(outline, x, across)} className="bench-wood-flat" />
      <MouthMark outline={outline} x={x} across={across} />
      {outline.holes.map((hole) => (
        <circle
          key={hole.id}
          cx={x(hole.positionMm)}
          cy={AXIS_Y}
          r={Math.max(isBehind(hole.angleDeg) ? 3 : 1.6, (hole.diameterMm * across) / 2.3)}
          {...(isBehind(hole.angleDeg) ? BEHIND : { className: 'bench-hole' })}
        />
      ))}
      <SmallPlumbLines outline={outline} plumb={plumb} x={x} fromY={tubeBottom} />
    </svg>
  );
});

/** On the far side of the tube: dashed, fine enough for a circle of this size. */
const BEHIND = { fill: 'none', stroke: 'var(--hole)', strokeWidth: 1.2, strokeDasharray: '2 1.5' } as const;

const isBehind = (angleDeg: number) => Math.cos((angleDeg * Math.PI) / 180) < -0.3;

interface PartProps {
  outline: Outline;
  x: (mm: number) => number;
  across: number;
}

function bodyPath(outline: Outline, x: PartProps['x'], across: number): string {
  const headAt = outline.mouthEndKind === 'reed' ? outline.mouthMm : headMm(outline);
  const first = outline.outside[0];
  const last = outline.outside.at(-1);
  if (first === undefined || last === undefined) return '';
  const points = [
    { ...first, positionMm: headAt },
    ...outline.outside.filter(({ positionMm }) => positionMm > headAt && positionMm < outline.footMm),
    { ...last, positionMm: outline.footMm },
  ];
  const top = points.map((point) => `${x(point.positionMm)} ${AXIS_Y - (point.diameterMm * across) / 2}`);
  const bottom = points.map((point) => `${x(point.positionMm)} ${AXIS_Y + (point.diameterMm * across) / 2}`);
  return `M${[...top, ...bottom.reverse()].join('L')}Z`;
}

/** Reed and staple stand out of the body; every other head is part of it. */
function Head({ outline, x, across }: PartProps) {
  if (outline.mouthEndKind !== 'reed') return null;
  const body = (outline.outside[0]?.diameterMm ?? 0) * across;
  const half = Math.max(1.5, body * 0.2);
  const tip = x(headMm(outline));
  return (
    <rect
      x={tip}
      y={AXIS_Y - half}
      width={x(outline.mouthMm) - tip}
      height={half * 2}
      className="bench-steel-part"
    />
  );
}

function MouthMark({ outline, x, across }: PartProps) {
  const body = (outline.outside[0]?.diameterMm ?? 0) * across;
  const at = x(0);
  switch (outline.mouthEndKind) {
    case 'window':
      return (
        <rect x={at - 5} y={AXIS_Y - body * 0.23} width="5" height={body * 0.46} className="bench-hole" />
      );
    case 'embouchure':
      return <ellipse cx={at} cy={AXIS_Y} rx="4.6" ry="3.8" className="bench-hole" />;
    case 'rim':
      return <path d={`M${at} ${AXIS_Y - 3}l4 3-4 3z`} className="bench-hole" />;
    default:
      return null;
  }
}

interface SmallPlumbLinesProps {
  outline: Outline;
  plumb: Plumb;
  x: (mm: number) => number;
  fromY: number;
}

/** Register 1 only: in a rack it is the shape of the row that counts, the figures stand at the right. */
function SmallPlumbLines({ outline, plumb, x, fromY }: SmallPlumbLinesProps) {
  const columns = hungColumns(outline, plumb, x);
  return columns.map(({ key, holeX, columnX, cents }) => (
    <g key={key}>
      <path d={`M${holeX} ${fromY + 1}L${columnX} ${fromY + 6}`} className="bench-leader" opacity="0.6" />
      <line x1={columnX} y1={fromY + 6} x2={columnX} y2={fromY + 28} className="bench-true" />
      {cents.map((each, index) => {
        const bob = columnX + Math.max(-HELD_PX, Math.min(HELD_PX, each * PX_PER_CENT));
        return (
          <g key={index}>
            <line
              x1={columnX}
              y1={fromY + 6}
              x2={bob}
              y2={fromY + 24}
              className="bench-thread is-register1"
            />
            <circle cx={bob} cy={fromY + 24} r="3.8" className="bench-bob1" />
          </g>
        );
      })}
    </g>
  ));
}

/** One column a hole: whatever vents there hangs from it, cross-fingerings too. */
function hungColumns(outline: Outline, plumb: Plumb, x: (mm: number) => number) {
  const places = new Map(outline.holes.map((hole) => [hole.id, hole.positionMm]));
  const byHole = new Map<string, number[]>();
  for (const { ventHole, cents } of plumb) {
    const key = ventHole ?? 'foot';
    byHole.set(key, [...(byHole.get(key) ?? []), cents]);
  }
  const hung = [...byHole]
    .map(([key, cents]) => ({ key, holeX: x(places.get(key) ?? outline.footMm), cents }))
    .sort((a, b) => a.holeX - b.holeX);
  const bounds = { spacing: BOB_SPACING, left: 6, right: x(outline.footMm) };
  const spread = spreadColumns(
    hung.map(({ holeX }) => holeX),
    bounds,
  );
  return hung.map((column, index) => ({ ...column, columnX: spread[index] ?? column.holeX }));
}
