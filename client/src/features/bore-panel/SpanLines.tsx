import type { Station } from '#shared/document/design-document.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { SHELF } from './shelf-scale.ts';
import { taperRate, taperWords } from './taper.ts';

interface SpanLinesProps extends Pick<PanelProps, 'geometry' | 'unit'> {
  stations: readonly Station[];
  isLabelled: boolean;
}

/** Least width of a span that carries its words, px: the whole sentence, then the taper alone. */
const ROOM_FOR_WORDS = 110;
const ROOM_FOR_RATE = 64;
const GAP = 3;

/** Each span between two stations with the taper that a reamer has to cut there. */
export function SpanLines({ stations, geometry, unit, isLabelled }: SpanLinesProps) {
  const y = SHELF.taperY;
  return (
    <>
      {isLabelled && (
        <text x={144} y={y + 4} textAnchor="end" className="bench-quiet-label">
          taper
        </text>
      )}
      {stations.slice(1).map((station, index) => {
        const before = stations[index] ?? station;
        const [from, to] = [geometry.x(before.positionMm) + GAP, geometry.x(station.positionMm) - GAP];
        if (to - from < 6) return null;
        return (
          <g key={index}>
            <path d={`M${from} ${y - 4}v8M${from} ${y}H${to}M${to} ${y - 4}v8`} className="bore-span" />
            {to - from > ROOM_FOR_RATE && (
              <text x={(from + to) / 2} y={y - 7} textAnchor="middle" className="bench-label bore-haloed">
                {to - from > ROOM_FOR_WORDS ? taperWords(before, station, unit) : taperRate(before, station)}
              </text>
            )}
          </g>
        );
      })}
    </>
  );
}
