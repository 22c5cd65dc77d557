import { drillsOf, type Drill } from '#shared/lengths/drills.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';

/** Drills that a hole may be made with, by the person's unit. */
const CHOICE: Record<LengthUnit, readonly Drill[]> = {
  mm: drillsOf(['metric-0.1', 'metric-0.5']),
  inch: drillsOf(['inch-fraction', 'number', 'letter']),
};

export const drillsFor = (unit: LengthUnit): readonly Drill[] => CHOICE[unit];

/** The drill nearest to a diameter, no wider than the widest the bore allows. */
export function snapToDrill(diameterMm: number, unit: LengthUnit, widestMm: number): number {
  const fitting = CHOICE[unit].filter((drill) => drill.diameterMm <= widestMm + 1e-9);
  const nearest = fitting.reduce<Drill | null>(
    (best, drill) =>
      best === null || Math.abs(drill.diameterMm - diameterMm) < Math.abs(best.diameterMm - diameterMm)
        ? drill
        : best,
    null,
  );
  return nearest?.diameterMm ?? Math.min(diameterMm, widestMm);
}
