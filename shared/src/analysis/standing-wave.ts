import { boreRadiusAt, type Column } from '../acoustics/response/column.ts';
import { prepareColumn } from '../acoustics/response/prepared-column.ts';
import { pressureAlongBore } from '../acoustics/response/standing-wave.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { requireFingering } from './require-fingering.ts';
import { toColumn } from './to-column.ts';

export interface StandingWavePoint {
  positionMm: number;
  /** Magnitude of the pressure, 1 at its largest. */
  pressure: number;
}

export interface StandingWaveQuestion {
  frequencyHz: number;
  points: number;
  /** False: openings do not hear each other; for comparison only. */
  coupling?: boolean;
}

/**
 * Pressure along the bore for a fingering at a frequency, mouth side first, at about as many points as asked for.
 *
 * Throws `EngineInputError` for a fingering that the document has not.
 */
export function standingWave(
  document: DesignDocument,
  fingeringId: string,
  { frequencyHz, points, coupling = true }: StandingWaveQuestion,
): StandingWavePoint[] {
  const index = requireFingering(document, fingeringId);
  const { column, states } = toColumn(document);
  const { prepared, fingerings } = prepareColumn(withPoints(column, points), [states[index] ?? []]);
  const foot = column.bore.at(-1)?.position ?? 0;
  const wave = pressureAlongBore(prepared, fingerings[0] ?? new Int32Array(0), {
    frequency: frequencyHz,
    foot,
    coupling,
  });
  const largest = Math.max(...wave.map((point) => point.pressure));
  return wave
    .map(({ position, pressure }) => ({ positionMm: position * 1000, pressure: pressure / largest }))
    .reverse();
}

/** The same column with more points in its bore, evenly spread. */
function withPoints(column: Column, points: number): Column {
  const foot = column.bore.at(-1)?.position ?? column.input;
  const extra = Array.from({ length: Math.max(points - 2, 0) }, (_, i) => {
    const position = column.input + ((i + 1) / (points - 1)) * (foot - column.input);
    return { position, radius: boreRadiusAt(column.bore, position) };
  }).filter(({ position }) => !column.bore.some((point) => Math.abs(point.position - position) < 1e-9));
  const bore = [...column.bore, ...extra].sort((a, b) => a.position - b.position);
  return { ...column, bore };
}
