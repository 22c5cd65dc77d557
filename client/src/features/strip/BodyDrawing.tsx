import { memo } from 'react';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import { boreEnds, diameterAt } from '#shared/document/profile.ts';
import type { BenchFrame } from '../../bench/bench-geometry.ts';
import { borePath, planPath, sectionPath, type Place } from '../../bench/body-paths.ts';
import type { BodyShape } from '../../bench/drawn-body.ts';
import { MouthPlan } from '../../bench/MouthPlan.tsx';
import { SteelRule } from '../../bench/SteelRule.tsx';
import { MouthSection } from './MouthSection.tsx';

interface BodyDrawingProps {
  frame: BenchFrame;
  shape: BodyShape;
  unit: LengthUnit;
}

/** Plan, section and rule without the holes; drawn once while holes are dragged over it. */
export const BodyDrawing = memo(function BodyDrawing({ frame, shape, unit }: BodyDrawingProps) {
  const { measures, body } = frame;
  const plan: Place = { x: frame.x, across: frame.acrossPxPerMm, axisY: measures.planY };
  const section: Place = { ...plan, axisY: measures.sectionY };
  const footX = frame.x(boreEnds(shape).footMm);
  const clip = frame.headHidden ? 'url(#bench-view)' : undefined;
  return (
    <>
      <g clipPath={clip}>
        <path d={planPath(shape, body, plan)} className="bench-wood" />
        {shape.mouthEnd.kind === 'window' && <TurnedRings frame={frame} shape={shape} place={plan} />}
        <MouthPlan shape={shape} body={body} place={plan} />
        {measures.hasSection && (
          <>
            <path d={sectionPath(shape, body, section)} className="bench-hatch" />
            <path d={borePath(shape, section)} className="bench-air" />
            <path d={borePath(shape, section)} className="bench-edge" />
            <path
              d={`M${frame.x(boreEnds(shape).mouthMm)} ${measures.sectionY}H${footX}`}
              className="bench-axis"
            />
            <MouthSection shape={shape} body={body} place={section} />
            {shape.foot.kind === 'stopped' && <StoppedFoot shape={shape} place={section} />}
          </>
        )}
      </g>
      {frame.headHidden && <BrokenHead frame={frame} />}
      {measures.hasSection && <BoreFigures frame={frame} shape={shape} unit={unit} />}
      <StretchNote frame={frame} />
      <g clipPath="url(#bench-view)">
        <SteelRule
          zeroX={footX}
          leftX={Math.max(frame.x(body.headMm), frame.headHidden ? frame.viewLeft : -Infinity)}
          y={measures.ruleY}
          height={measures.ruleHeight}
          pxPerMm={frame.pxPerMm}
          unit={unit}
          seen={[frame.viewLeft - 1, frame.viewRight + 1]}
        />
      </g>
    </>
  );
});

interface PartProps {
  frame: BenchFrame;
  shape: BodyShape;
  place: Place;
}

/** Turned lines below the window and above the foot; they carry no measure. */
function TurnedRings({ frame, shape, place }: PartProps) {
  const { footMm } = boreEnds(shape);
  const rings = [footMm * 0.06, footMm * 0.068, footMm - 7, footMm - 4.8];
  return rings.map((mm) => {
    const half = (diameterAt(shape.outside.stations, mm) * place.across) / 2 - 0.5;
    return (
      <line
        key={mm}
        x1={frame.x(mm)}
        x2={frame.x(mm)}
        y1={place.axisY - half}
        y2={place.axisY + half}
        className="bench-ring"
      />
    );
  });
}

function StoppedFoot({ shape, place }: { shape: BodyShape; place: Place }) {
  const { footMm } = boreEnds(shape);
  const half = (diameterAt(shape.bore.stations, footMm) * place.across) / 2;
  const x = place.x(footMm);
  return (
    <rect
      x={x - 5}
      y={place.axisY - half}
      width={5}
      height={half * 2}
      className="bench-block"
      stroke="var(--wood-edge)"
    />
  );
}

/** Where the head lies outside the view, the drawing is broken off in a zigzag. */
function BrokenHead({ frame }: { frame: BenchFrame }) {
  const { measures, viewLeft } = frame;
  const half = (frame.body.widestMm * frame.acrossPxPerMm) / 2 + 2;
  const bottom = measures.hasSection ? measures.sectionY + half : measures.planY + half;
  const top = measures.planY - half;
  const teeth = Math.max(2, Math.round((bottom - top) / 14));
  const step = (bottom - top) / teeth;
  const edge = Array.from({ length: teeth }, (_, index) => {
    const y = top + index * step;
    return `L${viewLeft + 5} ${y + step / 2}L${viewLeft} ${y + step}`;
  }).join('');
  return (
    <>
      <path
        d={`M${viewLeft - 2} ${top}L${viewLeft} ${top}${edge}L${viewLeft - 2} ${bottom}Z`}
        className="bench-cut-away"
      />
      <path d={`M${viewLeft} ${top}${edge}`} className="bench-edge" />
    </>
  );
}

/** Zoomed in, the strip is too low for the tube's full width at the scale of its length: the drawing says by how much. */
function StretchNote({ frame }: { frame: BenchFrame }) {
  const times = frame.pxPerMm / frame.acrossPxPerMm;
  if (times < 1.05) return null;
  const { hasSection, sectionY, planY } = frame.measures;
  // Over the bore's axis where it is drawn; else along the edge of the tube, clear of the holes.
  const half = (frame.body.widestMm * frame.acrossPxPerMm) / 2;
  const y = hasSection ? sectionY + 4.5 : planY + half - 3;
  return (
    <text x={frame.viewLeft + 14} y={y} className="bench-quiet-label bench-haloed">
      drawn {times.toFixed(1)} times longer than wide
    </text>
  );
}

/** The bore's diameter where it is written: once for a straight bore, at chosen stations for others. */
function BoreFigures({ frame, shape, unit }: BodyDrawingProps) {
  const { stations } = shape.bore;
  const first = stations[0];
  const isStraight = stations.every((station) => station.diameterMm === first?.diameterMm);
  const half = (mm: number) => (diameterAt(stations, mm) * frame.acrossPxPerMm) / 2;
  if (first === undefined) return null;
  if (isStraight) {
    const x = frame.x(boreEnds(shape).footMm * 0.24);
    return (
      <text
        x={x}
        y={frame.measures.sectionY + half(0) - 8}
        textAnchor="middle"
        className="bench-label bench-haloed"
      >
        bore Ø {printLength(first.diameterMm, unit)}
      </text>
    );
  }
  return apart(stations, frame).map(({ positionMm, diameterMm }) => {
    const x = frame.x(positionMm);
    const wallY = frame.measures.sectionY + half(positionMm);
    const anchorX = Math.min(Math.max(x, frame.viewLeft + 26), frame.viewRight - 26);
    return (
      <g key={positionMm}>
        <circle cx={x} cy={wallY} r={2.6} fill="var(--sheet)" stroke="var(--wood-edge)" strokeWidth={1.4} />
        <text x={anchorX} y={wallY - 7} textAnchor="middle" className="bench-label bench-haloed">
          Ø {printLength(diameterMm, unit)}
        </text>
      </g>
    );
  });
}

/** Figures nearer than this would run together, px. */
const FIGURE_PX = 90;

function apart(stations: BodyShape['bore']['stations'], frame: BenchFrame) {
  const chosen: typeof stations = [];
  for (const station of stations) {
    const x = frame.x(station.positionMm);
    const last = chosen.at(-1);
    const isSeen = x >= frame.viewLeft - 1 && x <= frame.viewRight + 1 && station.positionMm > 0;
    if (isSeen && (last === undefined || x - frame.x(last.positionMm) >= FIGURE_PX)) chosen.push(station);
  }
  return chosen;
}
