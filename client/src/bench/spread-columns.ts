export interface ColumnBounds {
  /** Least distance between neighbouring columns, px. */
  spacing: number;
  left: number;
  right: number;
}

interface Block {
  sum: number;
  count: number;
}

/**
 * Where columns stand so that each is as near its hole as the least spacing allows.
 *
 * `holes` run from left to right. The sum of the squared shifts is the least possible: pushing only to the
 * right would drag a whole row of columns away from their holes. Order is kept, so leaders never cross. Where
 * the bounds have no room for the spacing, columns close up evenly instead.
 */
export function spreadColumns(holes: readonly number[], bounds: ColumnBounds): number[] {
  const gaps = holes.length - 1;
  const room = Math.max(0, bounds.right - bounds.left);
  const spacing = gaps > 0 ? Math.min(bounds.spacing, room / gaps) : bounds.spacing;
  // With the spacing taken out, "at least one spacing apart" becomes "not decreasing": pool neighbours that are.
  const blocks: Block[] = [];
  holes.forEach((x, index) => {
    blocks.push({ sum: x - index * spacing, count: 1 });
    mergeFalling(blocks);
  });
  const highest = Math.max(bounds.left, bounds.right - gaps * spacing);
  return blocks
    .flatMap((block) => Array<number>(block.count).fill(block.sum / block.count))
    .map((x, index) => Math.min(highest, Math.max(bounds.left, x)) + index * spacing);
}

function mergeFalling(blocks: Block[]): void {
  for (;;) {
    const last = blocks.at(-1);
    const before = blocks.at(-2);
    if (last === undefined || before === undefined) return;
    if (before.sum / before.count <= last.sum / last.count) return;
    blocks.splice(-2, 2, { sum: before.sum + last.sum, count: before.count + last.count });
  }
}
