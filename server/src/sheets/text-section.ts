import { leadingMm, wrapText } from './fitted-text.ts';
import type { FlowBlock, FlowSection } from './flow.ts';
import { MARGIN_MM } from './paper.ts';
import { contentWidthMm, type SheetContext } from './sheet-context.ts';
import { drawCaption } from './table.ts';
import { tagged } from './tagging.ts';

const CAPTION_MM = 5.6;

/** Paragraphs under a heading, or under none; they may run on to the next page. */
export function textSection(
  context: SheetContext,
  { caption, paragraphs, gapMm }: { caption?: string; paragraphs: readonly string[]; gapMm: number },
): FlowSection {
  const { pen, root } = context;
  const style = { size: 9 };
  const blocks = paragraphs.map((paragraph): FlowBlock => {
    const lines = wrapText(pen, paragraph, contentWidthMm(context), style);
    return {
      heightMm: lines.length * leadingMm(style.size) + 0.8,
      draw: (topMm) =>
        tagged(pen, root, 'P', () =>
          lines.forEach((line, at) =>
            pen.text(line, [MARGIN_MM, topMm + 3 + at * leadingMm(style.size)], style),
          ),
        ),
    };
  });
  return {
    gapMm,
    head: {
      heightMm: caption === undefined ? 0 : CAPTION_MM,
      draw: (topMm, isContinued) => {
        if (caption === undefined) return;
        const words = isContinued ? `${caption} (continued)` : caption;
        tagged(pen, root, 'H3', () => drawCaption(context, topMm, { caption: words }));
      },
    },
    blocks,
  };
}
