import type { MouthEnd } from '#shared/document/design-document.ts';
import { diameterAt } from '#shared/document/profile.ts';
import type { Place } from './body-paths.ts';
import type { BodyShape, DrawnBody } from './drawn-body.ts';

interface MouthPlanProps {
  shape: BodyShape;
  body: DrawnBody;
  place: Place;
}

/** The mouth end as seen from above, by its kind. */
export function MouthPlan({ shape, body, place }: MouthPlanProps) {
  const { mouthEnd } = shape;
  const outsideMm = diameterAt(shape.outside.stations, 0);
  switch (mouthEnd.kind) {
    case 'window':
      return <WindowPlan window={mouthEnd} outsideMm={outsideMm} place={place} />;
    case 'embouchure':
      return (
        <ellipse
          cx={place.x(0)}
          cy={place.axisY}
          rx={(place.x(mouthEnd.lengthMm) - place.x(0)) / 2}
          ry={(mouthEnd.widthMm * place.across) / 2}
          className="bench-hole"
        />
      );
    case 'reed':
      return <ReedPlan headMm={body.headMm} boreMm={diameterAt(shape.bore.stations, 0)} place={place} />;
    case 'rim':
      return <NotchPlan outsideMm={outsideMm} place={place} />;
    case 'ideal-open':
    case 'ideal-closed':
      return null;
  }
}

interface WindowPlanProps {
  window: Extract<MouthEnd, { kind: 'window' }>;
  outsideMm: number;
  place: Place;
}

function WindowPlan({ window, outsideMm, place }: WindowPlanProps) {
  const half = (window.widthMm * place.across) / 2;
  const lip = place.x(0);
  const rampMm = Math.min(outsideMm, window.wallMm / Math.tan((window.rampDeg * Math.PI) / 180) + 1.5);
  const end = place.x(rampMm);
  const face = place.x(-window.lengthMm);
  const y = place.axisY;
  return (
    <>
      <rect x={face} y={y - half} width={lip - face} height={half * 2} className="bench-hole" />
      <path
        d={`M${lip} ${y - half}L${end} ${y - half * 0.66}L${end} ${y + half * 0.66}L${lip} ${y + half}Z`}
        className="bench-ramp"
      />
    </>
  );
}

/** Staple and blades; the seat is at the bore's own beginning. */
function ReedPlan({ headMm, boreMm, place }: { headMm: number; boreMm: number; place: Place }) {
  const y = place.axisY;
  const staple = Math.max(1.5, boreMm * place.across * 0.28);
  const blade = staple * 1.4;
  const seat = place.x(0);
  const tip = place.x(headMm);
  const waist = tip + (seat - tip) * 0.55;
  return (
    <>
      <path
        d={`M${waist} ${y - staple * 0.7}L${seat} ${y - staple}L${seat} ${y + staple}L${waist} ${y + staple * 0.7}Z`}
        className="bench-steel-part"
      />
      <path
        d={`M${tip} ${y - blade}L${waist} ${y - staple * 0.8}L${waist} ${y + staple * 0.8}L${tip} ${y + blade}Z`}
        className="bench-reed"
      />
    </>
  );
}

/** The edge that the breath meets at an open rim. */
function NotchPlan({ outsideMm, place }: { outsideMm: number; place: Place }) {
  const width = outsideMm * place.across * 0.18;
  const depth = place.x(outsideMm * 0.22) - place.x(0);
  const x = place.x(0);
  return (
    <path
      d={`M${x} ${place.axisY - width}Q${x + depth * 1.6} ${place.axisY} ${x} ${place.axisY + width}Z`}
      className="bench-hole"
    />
  );
}
