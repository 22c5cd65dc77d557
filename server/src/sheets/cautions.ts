import { leadingMm, wrapText } from './fitted-text.ts';
import type { FlowSection } from './flow.ts';
import { MARGIN_MM } from './paper.ts';
import { contentWidthMm, type SheetContext } from './sheet-context.ts';
import { group, tagged } from './tagging.ts';

/** Stands on every set; nothing a workshop sets takes any of it away. */
export const CAUTIONS: readonly (readonly [what: string, words: string])[] = [
  ['Eyes', 'Wear eye protection from the first punch to the last chip.'],
  ['Dust', 'Extract at the drill and wear a fitted dust mask. Wet wipe the bench, do not blow it.'],
  ['Clamp', 'Never hold the body by hand. V-block, stop and clamp; stop the drill before you reach in.'],
  ['Drill', 'Hair, sleeves and gloves away from the spindle. Isolate it before changing drills or reamers.'],
  [
    'Wood',
    'Some woods are toxic or sensitise skin and lungs. Read the wood’s own sheet before you cut it; stop if you itch, sneeze or wheeze.',
  ],
  [
    'Finish',
    'Anything that touches lips or fingers: food-safe, lead-free, fully cured. No lead solder or lead paint on an instrument.',
  ],
  ['Apprentices', 'Work under trained supervision, at machines you have been signed off for.'],
  ['Local rules', 'Your local workshop codes and the machine makers’ instructions come before this sheet.'],
];

const NAME_MM = 20;
const PADDING_MM = 3;
const GAP_MM = 6;
const HEADING_MM = 7.6;
const ROW_GAP_MM = 1.2;
const STYLE = { size: 8.8 } as const;

/** A framed box that is never parted over two pages. */
export function cautionsSection(context: SheetContext): FlowSection {
  const { pen, root } = context;
  const columnMm = (contentWidthMm(context) - 2 * PADDING_MM - GAP_MM) / 2;
  const texts = CAUTIONS.map(([, words]) => wrapText(pen, words, columnMm - NAME_MM, STYLE));
  const rowHeights = Array.from({ length: CAUTIONS.length / 2 }, (_, row) => {
    const lines = Math.max(texts[2 * row]?.length ?? 0, texts[2 * row + 1]?.length ?? 0);
    return lines * leadingMm(STYLE.size) + ROW_GAP_MM;
  });
  const heightMm = HEADING_MM + rowHeights.reduce((sum, height) => sum + height, 0) + 1.4;
  const draw = (topMm: number) => {
    tagged(pen, root, 'H3', () => {
      pen.strokeRect([MARGIN_MM, topMm], contentWidthMm(context), heightMm, { widthMm: 0.42 });
      pen.text('Cautions', [MARGIN_MM + PADDING_MM, topMm + 5.4], { size: 11.5, weight: 700 });
    });
    const list = group(pen, root, 'L');
    CAUTIONS.forEach(([name], index) => {
      const row = Math.floor(index / 2);
      const above = rowHeights.slice(0, row).reduce((sum, height) => sum + height, 0);
      const left = MARGIN_MM + PADDING_MM + (index % 2) * (columnMm + GAP_MM);
      const baseY = topMm + HEADING_MM + above + 2.6;
      tagged(pen, list, 'LI', () => {
        pen.text(name, [left, baseY], { ...STYLE, weight: 700 });
        texts[index]?.forEach((line, at) =>
          pen.text(line, [left + NAME_MM, baseY + at * leadingMm(STYLE.size)], STYLE),
        );
      });
    });
  };
  return { gapMm: 5, head: { heightMm, draw }, blocks: [] };
}
