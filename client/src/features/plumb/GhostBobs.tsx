import { Bob } from '../../bench/Bob.tsx';
import type { BenchMeasures } from '../../bench/bench-layout.ts';
import type { HungNote } from '../../bench/hung-notes.ts';
import { bobPlace } from './plumb-scale.ts';

interface GhostBobsProps {
  placed: readonly (HungNote & { x: number; y: number })[];
  /** Cents by fingering id. */
  ghosts: ReadonlyMap<string, number>;
  measures: BenchMeasures;
}

/** Where notes hung in an earlier or another state: dashed outlines on dashed threads. The tables say the figures. */
export function GhostBobs({ placed, ghosts, measures }: GhostBobsProps) {
  return (
    <g aria-hidden="true" pointerEvents="none">
      {placed.map(({ fingering, row, x, y }) => {
        const cents = ghosts.get(fingering.id);
        if (cents === undefined) return null;
        const { dx, held } = bobPlace(cents, measures);
        return (
          <g key={fingering.id} transform={`translate(${x} 0)`}>
            {row === 'register' && <line x2={dx} y2={y} className="bench-thread is-old" />}
            <g transform={`translate(${dx} ${y})`}>
              <Bob register={fingering.register} small={row === 'cross'} hollow />
              {held !== 0 && (
                <path
                  d={`M${held * 10} -4.5l${held * 4.5} 4.5l${-held * 4.5} 4.5`}
                  className="bench-held is-old"
                />
              )}
            </g>
          </g>
        );
      })}
    </g>
  );
}
