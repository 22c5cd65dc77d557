import { boxOf, type ReadBox, type ReadPage, type ReadPath, type ReadPoint } from './read-sheet.ts';

/** A circle or the curve that a circle becomes, by the lines that a person would measure. */
export interface ReadHole {
  centre: ReadPoint;
  /** Along the body and across it, mm. */
  alongMm: number;
  acrossMm: number;
}

/** One template on a page: the cut-out outline and what lies in it. */
export interface ReadTemplate {
  outline: ReadBox;
  holes: ReadHole[];
  /** Places of the dashed join lines across the template. */
  joinXs: number[];
  /** Places of the heavy reference lines. */
  barXs: number[];
}

const near = (a: number, b: number) => Math.abs(a - b) < 0.005;
const isWide = (path: ReadPath, widthMm: number) => path.isStroked && near(path.lineWidthMm, widthMm);
const isUpright = ({ box }: ReadPath) => box.right - box.left < 0.01 && box.bottom - box.top > 5;
const middleY = ({ box }: ReadPath) => (box.top + box.bottom) / 2;

/** Finds the templates of a page by the thickness of their lines alone, as a person with a loupe would. */
export function readTemplates(page: ReadPage): ReadTemplate[] {
  const outlines = page.paths.filter(
    (path) => isWide(path, 0.18) && path.points.length >= 4 && path.box.bottom - path.box.top > 15,
  );
  return outlines.map(({ box: outline }) => {
    // A hole on the seam reaches a little out of its template.
    const isOf = (y: number) => y > outline.top - 1 && y < outline.bottom + 1;
    const isJoin = (path: ReadPath) => isWide(path, 0.25) && path.isDashed && isUpright(path);
    return {
      outline,
      holes: page.paths
        .filter((path) => isWide(path, 0.35) && path.isCurved && isOf(middleY(path)))
        .map(({ points }) => readHole(points)),
      joinXs: page.paths.filter((path) => isJoin(path) && isOf(middleY(path))).map(({ box }) => box.left),
      barXs: page.paths
        .filter((path) => isWide(path, 0.7) && isUpright(path) && isOf(middleY(path)))
        .map(({ box }) => box.left),
    };
  });
}

function readHole(points: readonly ReadPoint[]): ReadHole {
  const box = boxOf(points);
  return {
    centre: { x: (box.left + box.right) / 2, y: (box.top + box.bottom) / 2 },
    alongMm: box.right - box.left,
    acrossMm: box.bottom - box.top,
  };
}

/** A hole as somebody finds it who lays the pages on each other at their joins and measures from the reference. */
export interface MeasuredHole extends ReadHole {
  page: number;
  /** From the reference line, positive towards the mouth end. */
  fromReferenceMm: number;
  /** Above the middle of the template, mm. */
  aboveMiddleMm: number;
  isWhole: boolean;
}

/** Measures one kind of template (the first of each page, or the second) over all pages, starting from its bar. */
export function measureHoles(pages: readonly ReadPage[], which: 'wrap' | 'strip'): MeasuredHole[] {
  const found: MeasuredHole[] = [];
  let joinMm: number | null = null;
  pages.forEach((page, index) => {
    const template = readTemplates(page)[which === 'wrap' ? 0 : 1];
    if (template === undefined) return;
    const { outline, holes, joinXs, barXs } = template;
    const rightJoin = Math.max(...joinXs);
    const zeroX = joinMm === null ? barXs[0] : rightJoin + joinMm;
    if (zeroX === undefined) throw new Error(`Page ${index + 1} has neither a bar nor a join to start from.`);
    for (const hole of holes) {
      found.push({
        ...hole,
        page: index,
        fromReferenceMm: zeroX - hole.centre.x,
        aboveMiddleMm: (outline.top + outline.bottom) / 2 - hole.centre.y,
        isWhole:
          hole.centre.x - hole.alongMm / 2 >= outline.left - 1e-4 &&
          hole.centre.x + hole.alongMm / 2 <= outline.right + 1e-4,
      });
    }
    if (joinXs.length > 0) joinMm = zeroX - Math.min(...joinXs);
  });
  return found;
}
