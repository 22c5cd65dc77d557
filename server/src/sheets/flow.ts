/** A part of the sheet that stays together: a row of a table, a step, a picture. Heights in mm. */
export interface FlowBlock {
  heightMm: number;
  draw: (topMm: number) => void;
}

/** Blocks under one head, which is repeated where they run on to the next page. */
export interface FlowSection {
  /** White above, not at the top of a page. */
  gapMm: number;
  head: { heightMm: number; draw: (topMm: number, isContinued: boolean) => void };
  blocks: readonly FlowBlock[];
}

export interface PlacedBlock {
  topMm: number;
  heightMm: number;
  draw: () => void;
}

export type FlowPage = PlacedBlock[];

/** Lays sections one under another over as many pages as they take; a head never stands alone at the foot of one. */
export function flowOverPages(
  sections: readonly FlowSection[],
  { topMm, bottomMm }: { topMm: number; bottomMm: number },
): FlowPage[] {
  const pages: FlowPage[] = [[]];
  let at = topMm;
  const place = (heightMm: number, draw: (top: number) => void) => {
    const top = at;
    pages.at(-1)?.push({ topMm: top, heightMm, draw: () => draw(top) });
    at += heightMm;
  };
  const turnPage = () => {
    pages.push([]);
    at = topMm;
  };
  for (const { gapMm, head, blocks } of sections) {
    const firstMm = head.heightMm + (blocks[0]?.heightMm ?? 0);
    if (at > topMm && at + gapMm + firstMm > bottomMm) turnPage();
    else if (at > topMm) at += gapMm;
    place(head.heightMm, (top) => head.draw(top, false));
    blocks.forEach((block, index) => {
      if (index > 0 && at + block.heightMm > bottomMm) {
        turnPage();
        place(head.heightMm, (top) => head.draw(top, true));
      }
      place(block.heightMm, block.draw);
    });
  }
  return pages;
}
