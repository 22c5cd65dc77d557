/** Where the words of one hole stand, by their base lines, mm down the page. */
export interface HoleLabel {
  numberY: number;
  positionY: number;
  finalY: number;
}

export interface LabelledHole {
  x: number;
  y: number;
  /** From the centre to the end of the cross lines. */
  reachMm: number;
}

/** Lines of words: the number, the position, the final size. Heights in mm. */
const NUMBER_ABOVE_MM = 1.4;
const NUMBER_HEIGHT_MM = 3.4;
const FIRST_BELOW_MM = 3.4;
const LINE_MM = 3.4;
const LEVEL_MM = 2 * LINE_MM + 0.4;

/** Two figures side by side need this much from centre to centre. */
const FIGURES_APART_MM = 13;

/** Holes whose labels are this far from each other down the page do not meet. */
const ROWS_APART_MM = 16;

/**
 * Places the words of every hole: the number above it, the figures below it, deeper where a neighbour's figures stand.
 *
 * Near the edges of the template all of them go to the inner side.
 *
 * @param inside - between which heights of the page words may stand
 */
export function placeLabels(
  holes: readonly LabelledHole[],
  inside: { topMm: number; bottomMm: number },
): HoleLabel[] {
  const taken: { x: number; y: number; level: number }[] = [];
  const order = holes.map((hole, index) => ({ hole, index })).sort((a, b) => a.hole.x - b.hole.x);
  const labels: HoleLabel[] = [];
  for (const { hole, index } of order) {
    const level = freeLevel(hole, taken);
    taken.push({ x: hole.x, y: hole.y, level });
    labels[index] = labelAt(hole, level, inside);
  }
  return labels;
}

function freeLevel(hole: LabelledHole, taken: readonly { x: number; y: number; level: number }[]): number {
  const near = taken.filter(
    (other) => hole.x - other.x < FIGURES_APART_MM && Math.abs(hole.y - other.y) < ROWS_APART_MM,
  );
  const levels = [0, 1, 2];
  return levels.find((level) => near.every((other) => other.level !== level)) ?? 0;
}

function labelAt(hole: LabelledHole, level: number, inside: { topMm: number; bottomMm: number }): HoleLabel {
  const above = hole.y - hole.reachMm - NUMBER_ABOVE_MM;
  const below = hole.y + hole.reachMm + FIRST_BELOW_MM + level * LEVEL_MM;
  const hasRoomAbove = above - NUMBER_HEIGHT_MM >= inside.topMm;
  const hasRoomBelow = below + LINE_MM <= inside.bottomMm;
  if (hasRoomAbove && hasRoomBelow) {
    return { numberY: above, positionY: below, finalY: below + LINE_MM };
  }
  if (hasRoomAbove) {
    const shift = level * LEVEL_MM;
    const finalY = above - shift;
    const positionY = finalY - LINE_MM;
    // The number stands outermost, or keeps its place at the hole when the figures had to move away.
    return { numberY: shift > 0 ? above : positionY - LINE_MM, positionY, finalY };
  }
  const numberY = hole.y + hole.reachMm + NUMBER_HEIGHT_MM + 0.8;
  return { numberY, positionY: below + LINE_MM + 0.6, finalY: below + 2 * LINE_MM + 0.6 };
}
