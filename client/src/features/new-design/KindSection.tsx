import type { StarterKind } from '#shared/document/starter-documents.ts';

/** Walls of the head as it is cut: each pair of numbers is where wood begins and ends along the top, of 132. */
interface Head {
  top: readonly (readonly [number, number])[];
  /** Inner height at the right end, of 34: less for a bore that narrows toward the foot. */
  narrows: boolean;
  startX: number;
}

const HEADS: Record<StarterKind, Head> = {
  flute: {
    top: [
      [0, 30],
      [44, 132],
    ],
    narrows: true,
    startX: 0,
  },
  whistle: {
    top: [
      [0, 22],
      [34, 132],
    ],
    narrows: false,
    startX: 0,
  },
  'end-blown': { top: [[6, 132]], narrows: false, startX: 6 },
  recorder: {
    top: [
      [0, 22],
      [34, 132],
    ],
    narrows: true,
    startX: 0,
  },
  'reed-pipe': { top: [[34, 132]], narrows: false, startX: 34 },
};

const WALL = { fill: 'var(--wood-bg)', stroke: 'var(--wood-edge)', strokeWidth: 1 } as const;

/** A small section through the head of an instrument of one kind. */
export function KindSection({ kind }: { kind: StarterKind }) {
  const { top, narrows, startX } = HEADS[kind];
  const inner = narrows ? 4 : 0;
  return (
    <svg width="132" height="34" viewBox="0 0 132 34" aria-hidden="true" className="shrink-0">
      <path d={`M${startX} 8H132V26H${startX}Z`} fill="var(--air)" />
      {top.map(([from, to]) => (
        <path key={from} d={topWall(from, to, inner)} {...WALL} />
      ))}
      <path d={`M${startX} 31H132V${26 - inner}L${startX} 26Z`} {...WALL} />
      <Mouth kind={kind} />
    </svg>
  );
}

function topWall(from: number, to: number, inner: number): string {
  const depth = (x: number) => 8 + (inner * x) / 132;
  return `M${from} 3H${to}V${depth(to)}L${from} ${depth(from)}Z`;
}

function Mouth({ kind }: { kind: StarterKind }) {
  switch (kind) {
    case 'flute':
      return <rect x="10" y="8.5" width="6" height="17" fill="var(--block)" stroke="var(--wood-edge)" />;
    case 'whistle':
    case 'recorder':
      return (
        <>
          <path d="M0 11H22V25.5H0Z" fill="var(--block)" stroke="var(--wood-edge)" />
          <path d="M34 9.5L50 3H34Z" fill="var(--air)" />
          <path d="M34 9L50 3" stroke="var(--wood-edge)" fill="none" />
          {kind === 'recorder' && <rect x="92" y="22" width="7" height="10" fill="var(--air)" />}
        </>
      );
    case 'end-blown':
      return <path d="M6 3V8.5L14 3Z" fill="var(--air)" stroke="var(--wood-edge)" />;
    case 'reed-pipe':
      return (
        <>
          <path d="M16 14.5H46V19.5H16Z" fill="var(--s2)" stroke="var(--steel-edge)" />
          <path d="M2 13L18 15.2V18.8L2 21Z" fill="var(--block)" stroke="var(--wood-edge)" />
          <path d="M34 8V14.5M34 19.5V26" stroke="var(--wood-edge)" strokeWidth="3" />
        </>
      );
  }
}
