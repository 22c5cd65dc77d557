import { Bob } from '../../bench/Bob.tsx';
import type { BenchGeometry } from '../../bench/bench-geometry.ts';
import { roomyGap } from './roomy-gap.ts';

export interface GhostWords {
  /** What the dashed bobs are, and what the full ones are. */
  ghost: string;
  now: string;
}

/** Least room between two columns for the key, px. */
const ROOM_PX = 150;

/** Which bobs are which, where two columns leave room for it. */
export function GhostKey({ geometry, words }: { geometry: BenchGeometry; words: GhostWords }) {
  const gap = roomyGap(geometry, ROOM_PX);
  if (gap === null) return null;
  return (
    <g transform={`translate(${gap.left + 52} 40)`} aria-hidden="true">
      <Bob register={1} scale={0.85} hollow />
      <text x={14} y={4.5} className="bench-label">
        {words.ghost}
      </text>
      <g transform="translate(0 24)">
        <Bob register={1} scale={0.85} />
        <text x={14} y={4.5} className="bench-label">
          {words.now}
        </text>
      </g>
    </g>
  );
}

/** The same in a line below the chart, where no two columns leave room for it. */
export function GhostLine({ geometry, words }: { geometry: BenchGeometry; words: GhostWords }) {
  if (roomyGap(geometry, ROOM_PX) !== null) return null;
  return (
    <p className="text-label text-ink2 px-4 text-center">
      Dashed: {words.ghost}. Full: {words.now}.
    </p>
  );
}
