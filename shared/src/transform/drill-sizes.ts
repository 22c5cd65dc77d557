import type { DesignDocument, ToneHole } from '../document/design-document.ts';
import { WIDEST_HOLE_SHARE } from '../document/hole-faults.ts';
import { diameterAt } from '../document/profile.ts';
import { drillsOf, nearestDrills, type Drill } from '../lengths/drills.ts';
import { printExactLength } from '../lengths/print-length.ts';
import type { LengthUnit } from '../lengths/read-length.ts';

/** Drills as they are sold, in the sets that a workshop of this unit reaches for. */
const DRILLS: Record<LengthUnit, readonly Drill[]> = {
  mm: drillsOf(['metric-0.1', 'metric-0.5']),
  inch: drillsOf(['inch-fraction', 'number', 'letter']),
};

/** Every hole at the nearest drill that its bore allows; an undercut keeps as much wider than its hole as it was. */
export function toNearestDrills(document: DesignDocument, unit: LengthUnit): DesignDocument {
  return { ...document, holes: document.holes.map((hole) => atNearestDrill(document, hole, unit)) };
}

function atNearestDrill(document: DesignDocument, hole: ToneHole, unit: LengthUnit): ToneHole {
  const widestMm = diameterAt(document.bore.stations, hole.positionMm) * WIDEST_HOLE_SHARE;
  const fitting = DRILLS[unit].filter(({ diameterMm }) => diameterMm <= widestMm);
  const { exact, narrower, wider } = nearestDrills(hole.diameterMm, fitting);
  const distance = (drill: Drill | null) =>
    drill === null ? Infinity : Math.abs(drill.diameterMm - hole.diameterMm);
  const nearest = exact ?? (distance(wider) < distance(narrower) ? wider : narrower);
  if (nearest === null) return hole;
  const byMm = nearest.diameterMm - hole.diameterMm;
  return {
    ...hole,
    diameterMm: nearest.diameterMm,
    undercut:
      hole.undercut === null
        ? null
        : { ...hole.undercut, innerDiameterMm: hole.undercut.innerDiameterMm + byMm },
  };
}

/** Which holes no drill as it is sold would cut, in one sentence; none when every hole has its drill. */
export function drillCautions(document: DesignDocument, unit: LengthUnit): string[] {
  const without = document.holes
    .map((hole, index) => ({ hole, name: hole.name === '' ? String(index + 1) : hole.name }))
    .filter(({ hole }) => nearestDrills(hole.diameterMm, DRILLS[unit]).exact === null);
  if (without.length === 0) return [];
  const list = without
    .map(({ hole, name }) => `${name} (${printExactLength(hole.diameterMm, unit)})`)
    .join(', ');
  const unitName = unit === 'mm' ? 'mm' : 'in';
  return [
    without.length === 1
      ? `No drill is sold in the size of hole ${list} ${unitName}. Take the nearest below and open it by hand.`
      : `No drills are sold in the sizes of holes ${list} ${unitName}. Take the nearest below and open them by hand.`,
  ];
}
