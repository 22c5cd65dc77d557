import type { MouthEnd } from '#shared/document/design-document.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';

interface WindowSectionProps {
  window: Extract<MouthEnd, { kind: 'window' }>;
  unit: LengthUnit;
}

const WIDTH = 196;
const HEIGHT = 112;
/** Eight times full size, unless the window is too long for the picture. */
const PX_PER_MM = 8;
const FACE_X = 72;
const TOP = 34;
const WALL_PX = 20;
const WINDWAY_PX = 7;

/** The window cut through along the pipe, with the one length that the pitch hangs on. */
export function WindowSection({ window, unit }: WindowSectionProps) {
  const k = Math.min(PX_PER_MM, 70 / window.lengthMm);
  const lipX = FACE_X + window.lengthMm * k;
  const ramp = WALL_PX / Math.tan((window.rampDeg * Math.PI) / 180);
  const rampX = Math.min(WIDTH, lipX + ramp);
  const inside = TOP + WALL_PX;
  return (
    <svg
      width={WIDTH}
      height={HEIGHT}
      role="img"
      aria-label={`Window in section, lip to windway ${printLength(window.lengthMm, unit)}`}
      className="mt-1 block"
    >
      <rect y={inside} width={WIDTH} height={HEIGHT - inside} className="bench-air" />
      <rect y={TOP} width={FACE_X} height={WALL_PX} className="bore-wood" />
      <rect y={inside + WINDWAY_PX} width={FACE_X} height={HEIGHT} className="bench-block" />
      <path
        d={`M${lipX} ${inside + 1}L${rampX} ${TOP}H${WIDTH}V${inside}H${lipX + 8}Z`}
        className="bore-wood"
      />
      <path
        d={`M0 ${TOP}H${FACE_X}V${inside}H0M0 ${inside + WINDWAY_PX}H${FACE_X}V${HEIGHT}M${WIDTH} ${TOP}H${rampX}L${lipX} ${inside + 1}L${lipX + 8} ${inside}H${WIDTH}`}
        className="bench-edge"
      />
      <path
        d={`M${FACE_X} ${TOP - 4}V${TOP - 14}M${lipX} ${inside}V${TOP - 14}M${FACE_X} ${TOP - 9}H${lipX}`}
        className="bench-leader"
      />
      <text
        x={(FACE_X + lipX) / 2}
        y={TOP - 18}
        textAnchor="middle"
        className="bench-label bench-label-strong"
      >
        {printLength(window.lengthMm, unit)}
      </text>
      <text x={4} y={TOP - 6} className="bench-quiet-label">
        windway
      </text>
      <text x={8} y={HEIGHT - 18} className="bench-quiet-label">
        block
      </text>
      <text x={Math.min(lipX + 24, WIDTH - 20)} y={TOP - 6} className="bench-quiet-label">
        lip
      </text>
      <text x={WIDTH - 46} y={HEIGHT - 18} className="bench-quiet-label">
        bore
      </text>
    </svg>
  );
}
