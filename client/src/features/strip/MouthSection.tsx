import type { MouthEnd } from '#shared/document/design-document.ts';
import { boreEnds, diameterAt } from '#shared/document/profile.ts';
import type { Place } from '../../bench/body-paths.ts';
import type { BodyShape, DrawnBody } from '../../bench/drawn-body.ts';

interface MouthSectionProps {
  shape: BodyShape;
  body: DrawnBody;
  place: Place;
}

/** The mouth end in the section, over the hatched wood and the air of the bore. */
export function MouthSection({ shape, body, place }: MouthSectionProps) {
  const { mouthEnd } = shape;
  switch (mouthEnd.kind) {
    case 'window':
      return <WindowSection window={mouthEnd} shape={shape} body={body} place={place} />;
    case 'embouchure':
      return <EmbouchureSection embouchure={mouthEnd} shape={shape} place={place} />;
    case 'reed':
      return <ReedSection shape={shape} body={body} place={place} />;
    case 'rim':
    case 'ideal-open':
    case 'ideal-closed':
      return null;
  }
}

interface WindowSectionProps extends MouthSectionProps {
  window: Extract<MouthEnd, { kind: 'window' }>;
}

function WindowSection({ window, shape, body, place }: WindowSectionProps) {
  const half = (positionMm: number) => (diameterAt(shape.bore.stations, positionMm) * place.across) / 2;
  const outer = (diameterAt(shape.outside.stations, 0) * place.across) / 2;
  const face = place.x(-window.lengthMm);
  const lip = place.x(0);
  const head = place.x(body.headMm);
  const boreTop = place.axisY - half(-window.lengthMm);
  const boreBottom = place.axisY + half(-window.lengthMm);
  const outside = place.axisY - outer;
  const ramp = lip + (boreTop - outside) / Math.tan((window.rampDeg * Math.PI) / 180);
  const windway = Math.max(1.5, (boreBottom - boreTop) * 0.075);
  return (
    <>
      <rect x={head} y={boreTop} width={face - head} height={boreBottom - boreTop} className="bench-block" />
      <path
        d={`M${head} ${boreTop}L${face} ${boreTop}L${face} ${boreTop + windway}L${head} ${boreTop + windway * 1.5}Z`}
        className="bench-air"
      />
      <rect
        x={face}
        y={outside - 1}
        width={lip - face}
        height={boreTop - outside + 1.5}
        className="bench-air"
      />
      <path
        d={`M${lip} ${outside - 1}L${lip} ${boreTop + 1.5}L${ramp} ${outside - 1}Z`}
        className="bench-cut-away"
      />
      <path d={`M${lip} ${boreTop + 1.5}L${ramp} ${outside}`} className="bench-edge" />
      <path d={`M${face} ${boreTop + windway}V${boreBottom}`} className="bench-edge" />
    </>
  );
}

interface EmbouchureSectionProps {
  embouchure: Extract<MouthEnd, { kind: 'embouchure' }>;
  shape: BodyShape;
  place: Place;
}

/** Length of a stopper as it is drawn, in bore diameters. */
const STOPPER_IN_BORES = 1.1;

function EmbouchureSection({ embouchure, shape, place }: EmbouchureSectionProps) {
  const boreHalf = (diameterAt(shape.bore.stations, 0) * place.across) / 2;
  const outerY = place.axisY - (diameterAt(shape.outside.stations, 0) * place.across) / 2;
  const boreY = place.axisY - boreHalf;
  const topY = Math.min(outerY, boreY - embouchure.chimneyMm * place.across);
  const halfMm = embouchure.lengthMm / 2;
  const innerMm = (embouchure.undercut?.innerDiameterMm ?? embouchure.lengthMm) / 2;
  const { mouthMm } = boreEnds(shape);
  const stopper = place.x(-embouchure.stopperMm);
  const stopperLeft = place.x(
    -embouchure.stopperMm - STOPPER_IN_BORES * diameterAt(shape.bore.stations, mouthMm),
  );
  const side = (sign: number) => `${place.x(sign * halfMm)} ${topY}L${place.x(sign * innerMm)} ${boreY}`;
  return (
    <>
      {topY < outerY - 0.5 && (
        <rect
          x={place.x(-halfMm - 4)}
          y={topY}
          width={place.x(halfMm + 4) - place.x(-halfMm - 4)}
          height={outerY - topY}
          className="bench-hatch"
        />
      )}
      <path
        d={`M${place.x(-halfMm)} ${topY - 1.2}L${side(-1)}V${boreY + 0.9}H${place.x(innerMm)}L${place.x(innerMm)} ${boreY}L${place.x(halfMm)} ${topY}V${topY - 1.2}Z`}
        className="bench-air"
      />
      <path d={`M${side(-1)}M${side(1)}`} className="bench-edge" />
      <rect
        x={stopperLeft}
        y={place.axisY - boreHalf}
        width={stopper - stopperLeft}
        height={boreHalf * 2}
        className="bench-block"
      />
      <rect
        x={stopperLeft}
        y={place.axisY - boreHalf}
        width={stopper - stopperLeft}
        height={boreHalf * 2}
        className="bench-edge"
      />
    </>
  );
}

function ReedSection({ shape, body, place }: MouthSectionProps) {
  const half = Math.max(1.5, diameterAt(shape.bore.stations, 0) * place.across * 0.28);
  const seat = place.x(0);
  const tip = place.x(body.headMm);
  const waist = tip + (seat - tip) * 0.55;
  const { axisY } = place;
  return (
    <>
      <path
        d={`M${waist} ${axisY - half * 0.7}L${seat} ${axisY - half}V${axisY + half}L${waist} ${axisY + half * 0.7}Z`}
        className="bench-steel-part"
      />
      <path
        d={`M${tip} ${axisY - 1}L${waist} ${axisY - half * 0.8}V${axisY + half * 0.8}L${tip} ${axisY + 1}Z`}
        className="bench-reed"
      />
    </>
  );
}
