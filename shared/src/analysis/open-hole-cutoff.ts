import type { Column, HoleState } from '../acoustics/response/column.ts';

/** What an open hole's two ends add to its chimney, in hole radii. A. H. Benade (1960). */
const END_RADII = 1.5;

/**
 * Frequency above which a row of open holes lets sound through instead of ending the column, Hz; null with no open hole.
 *
 * c/(2π) · (b/a)/√(d·te) with mean hole radius b, bore radius a, spacing d (axis to axis; a lone hole: to the foot) and te =
 * chimney + 1.5·b, from A. H. Benade, J. Acoust. Soc. Am. 32 (1960) 1591. A rule of thumb: within some 10 % for even rows.
 */
export function openHoleCutoffHz(column: Column, states: readonly HoleState[]): number | null {
  const open = column.holes.filter((_, i) => states[i]?.kind === 'open');
  const first = open[0];
  const foot = column.bore.at(-1);
  if (first === undefined || foot === undefined) return null;
  const end = open.length > 1 ? (open.at(-1)?.position ?? foot.position) : foot.position;
  const spacing = (end - first.position) / Math.max(open.length - 1, 1);
  if (!(spacing > 0)) return null;
  const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
  const ratio = mean(open.map((hole) => hole.radius / hole.boreRadius));
  const height = mean(open.map((hole) => hole.chimney + END_RADII * hole.radius));
  return (column.outside.speedOfSound / (2 * Math.PI)) * (ratio / Math.sqrt(spacing * height));
}
