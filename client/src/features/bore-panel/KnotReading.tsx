interface KnotReadingProps {
  x: number;
  y: number;
  /** The width there, printed. */
  figure: string;
}

const WIDTH = 76;
const GAP = 16;

/** The line up to the rule and the width on a chip, for the chosen knot; beside it, and so outside its focus ring. */
export function KnotReading({ x, y, figure }: KnotReadingProps) {
  const left = x - GAP - WIDTH >= 4 ? x - GAP - WIDTH : x + GAP;
  return (
    <g aria-hidden="true" pointerEvents="none">
      <line x1={x} x2={x} y1={0} y2={y - 6} className="bench-drop is-chosen" />
      <rect x={left} y={y - 10} width={WIDTH} height={20} rx={3} className="bench-chip" />
      <text x={left + WIDTH / 2} y={y + 4.5} textAnchor="middle" className="bench-chip-figure">
        Ø {figure}
      </text>
    </g>
  );
}
