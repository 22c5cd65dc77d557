import './bench.css';

/** Gradients and hatching that the drawing's styles point to; once on a page that draws an instrument large. */
export function BenchDefs() {
  return (
    <svg width="0" height="0" aria-hidden="true" className="absolute">
      <defs>
        <linearGradient id="bench-wood" x1="0" y1="0" x2="0" y2="1">
          <stop offset="0" stopColor="var(--w1)" />
          <stop offset="0.3" stopColor="var(--w2)" />
          <stop offset="0.62" stopColor="var(--w3)" />
          <stop offset="1" stopColor="var(--w4)" />
        </linearGradient>
        <linearGradient id="bench-steel" x1="0" y1="0" x2="0" y2="1">
          <stop offset="0" stopColor="var(--s1)" />
          <stop offset="0.5" stopColor="var(--s2)" />
          <stop offset="1" stopColor="var(--s3)" />
        </linearGradient>
        <pattern
          id="bench-hatch"
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(52)"
        >
          <rect width="6" height="6" fill="var(--wood-bg)" />
          <line y2="6" stroke="var(--wood-hatch)" strokeWidth="1.3" />
        </pattern>
      </defs>
    </svg>
  );
}
