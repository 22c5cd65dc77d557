/** Drills as they are sold, before a workshop tells which it owns. */

export const MM_PER_INCH = 25.4;

export const DRILL_SET_NAMES = ['metric-0.5', 'metric-0.1', 'inch-fraction', 'number', 'letter'] as const;
export type DrillSetName = (typeof DRILL_SET_NAMES)[number];

export interface Drill {
  /** As the shank says: `6.5`, `17/64"`, `#7`, `F`. */
  name: string;
  diameterMm: number;
  set: DrillSetName;
}

/** Number drills 1 to 80, inch. ASME B94.11M. */
// prettier-ignore
const NUMBER_INCHES = [
  0.228, 0.221, 0.213, 0.209, 0.2055, 0.204, 0.201, 0.199, 0.196, 0.1935, 0.191, 0.189, 0.185, 0.182, 0.18, 0.177,
  0.173, 0.1695, 0.166, 0.161, 0.159, 0.157, 0.154, 0.152, 0.1495, 0.147, 0.144, 0.1405, 0.136, 0.1285, 0.12, 0.116,
  0.113, 0.111, 0.11, 0.1065, 0.104, 0.1015, 0.0995, 0.098, 0.096, 0.0935, 0.089, 0.086, 0.082, 0.081, 0.0785, 0.076,
  0.073, 0.07, 0.067, 0.0635, 0.0595, 0.055, 0.052, 0.0465, 0.043, 0.042, 0.041, 0.04, 0.039, 0.038, 0.037, 0.036,
  0.035, 0.033, 0.032, 0.031, 0.0292, 0.028, 0.026, 0.025, 0.024, 0.0225, 0.021, 0.02, 0.018, 0.016, 0.0145, 0.0135,
];

/** Letter drills A to Z, inch. ASME B94.11M. */
// prettier-ignore
const LETTER_INCHES = [
  0.234, 0.238, 0.242, 0.246, 0.25, 0.257, 0.261, 0.266, 0.272, 0.277, 0.281, 0.29, 0.295, 0.302, 0.316, 0.323, 0.332,
  0.339, 0.348, 0.358, 0.368, 0.377, 0.386, 0.397, 0.404, 0.413,
];

const steps = (first: number, last: number) => Array.from({ length: last - first + 1 }, (_, i) => first + i);
const fromInches = (inches: number) => Math.round(inches * MM_PER_INCH * 1e6) / 1e6;

function fractionName(sixtyFourths: number): string {
  let [top, bottom] = [sixtyFourths, 64];
  while (top % 2 === 0 && bottom > 1) [top, bottom] = [top / 2, bottom / 2];
  if (bottom === 1) return `${top}"`;
  const whole = Math.floor(top / bottom);
  const rest = `${top - whole * bottom}/${bottom}"`;
  return whole === 0 ? rest : `${whole} ${rest}`;
}

const metric = (set: DrillSetName, tenths: number[]): Drill[] =>
  tenths.map((tenth) => ({ name: (tenth / 10).toFixed(1), diameterMm: tenth / 10, set }));

/** Each set, narrowest first. Metric sizes are of the preferred series of ISO 235, inch fractions to 1 inch. */
export const DRILL_SETS: Record<DrillSetName, readonly Drill[]> = {
  'metric-0.5': metric(
    'metric-0.5',
    steps(2, 50).map((half) => half * 5),
  ),
  'metric-0.1': metric('metric-0.1', steps(5, 140)),
  'inch-fraction': steps(1, 64).map((n) => ({
    name: fractionName(n),
    diameterMm: fromInches(n / 64),
    set: 'inch-fraction',
  })),
  number: NUMBER_INCHES.map((inches, index) => ({
    name: `#${index + 1}`,
    diameterMm: fromInches(inches),
    set: 'number' as const,
  }))
    .slice()
    .reverse(),
  letter: LETTER_INCHES.map((inches, index) => ({
    name: String.fromCharCode(65 + index),
    diameterMm: fromInches(inches),
    set: 'letter' as const,
  })),
};

/** All drills of some sets in one row, narrowest first; of two with one diameter the earlier set's stays. */
export function drillsOf(sets: readonly DrillSetName[]): Drill[] {
  const byDiameter = new Map<number, Drill>();
  for (const drill of sets.flatMap((set) => DRILL_SETS[set])) {
    if (!byDiameter.has(drill.diameterMm)) byDiameter.set(drill.diameterMm, drill);
  }
  return [...byDiameter.values()].sort((a, b) => a.diameterMm - b.diameterMm);
}

/** A drill of exactly this diameter (within a micrometre), or the nearest narrower and wider ones. */
export function nearestDrills(
  diameterMm: number,
  drills: readonly Drill[],
): { exact: Drill | null; narrower: Drill | null; wider: Drill | null } {
  const exact = drills.find((drill) => Math.abs(drill.diameterMm - diameterMm) < 1e-3) ?? null;
  const narrower = drills.filter((drill) => drill.diameterMm < diameterMm - 1e-3).at(-1) ?? null;
  const wider = drills.find((drill) => drill.diameterMm > diameterMm + 1e-3) ?? null;
  return { exact, narrower, wider };
}

/** Diameter of a number drill (`7`) or a letter drill (`F`), mm; null when there is none of that name. */
export function drillByName(name: string): Drill | null {
  const wanted = name.trim().toUpperCase();
  return (
    [...DRILL_SETS.number, ...DRILL_SETS.letter].find((drill) => drill.name.replace('#', '') === wanted) ??
    null
  );
}
