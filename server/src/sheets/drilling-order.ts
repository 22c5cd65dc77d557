import { leadingMm, wrapText } from './fitted-text.ts';
import type { FlowSection } from './flow.ts';
import { numberedHoles } from './bench-position.ts';
import { dowelMm } from './bore-rows.ts';
import { MARGIN_MM } from './paper.ts';
import { contentWidthMm, type SheetContext } from './sheet-context.ts';
import { lengthInWords } from './sheet-lengths.ts';
import { drawCaption } from './table.ts';
import { group, tagged, type TaggedElement } from './tagging.ts';
import { bodyEnds } from './bench-position.ts';

/** Where the rest of the set lies, for steps that send the reader there. */
export interface PagesNamed {
  cautions: number;
  templates: readonly number[];
}

const BOX_MM = 4.2;
const GAP_MM = 8;
const STEP_STYLE = { size: 9.8 } as const;

/**
 * Tick boxes in two columns, to be worked down the left one first.
 *
 * The order always starts with the cautions and the code, and opens holes from the foot upward, a little at a time.
 */
export function drillingOrderSection(context: SheetContext, pages: () => PagesNamed): FlowSection {
  const columnMm = (contentWidthMm(context) - GAP_MM) / 2;
  const wrapped = (text: string) => wrapText(context.pen, text, columnMm - 12, STEP_STYLE);
  // Page numbers do not change how long a step is: the heights hold before the pages are counted.
  const count = drillingSteps(context, { cautions: 88, templates: [88, 88] }).map(wrapped);
  const rows = Math.ceil(count.length / 2);
  const heights = Array.from({ length: rows }, (_, row) => {
    const lines = Math.max(count[row]?.length ?? 0, count[row + rows]?.length ?? 0);
    return 4.6 + lines * leadingMm(STEP_STYLE.size);
  });
  const draw = (topMm: number) => {
    drawCaption(context, topMm, { caption: 'Drilling order' });
    const list = group(context.pen, context.root, 'L');
    drillingSteps(context, pages()).forEach((step, index) => {
      const row = index % rows;
      const above = heights.slice(0, row).reduce((sum, height) => sum + height, 0);
      const left = MARGIN_MM + (index < rows ? 0 : columnMm + GAP_MM);
      const place = { left, topMm: topMm + 5.4 + above, widthMm: columnMm, number: index + 1 };
      drawStep(context, list, { ...place, lines: wrapped(step) });
    });
  };
  const heightMm = 5.4 + heights.reduce((sum, height) => sum + height, 0);
  return { gapMm: 5, head: { heightMm, draw }, blocks: [] };
}

interface PlacedStep {
  left: number;
  topMm: number;
  widthMm: number;
  number: number;
  lines: readonly string[];
}

function drawStep({ pen }: SheetContext, list: TaggedElement, step: PlacedStep): void {
  const { left, topMm, widthMm, number, lines } = step;
  tagged(pen, list, 'LI', () => {
    pen.line([left, topMm], [left + widthMm, topMm], { widthMm: 0.18, colour: '#777777' });
    pen.strokeRect([left, topMm + 2], BOX_MM, BOX_MM, { widthMm: 0.32 });
    pen.text(String(number), [left + 6.2, topMm + 5.2], { ...STEP_STYLE, weight: 700 });
    lines.forEach((line, at) =>
      pen.text(line, [left + 11, topMm + 5.2 + at * leadingMm(STEP_STYLE.size)], STEP_STYLE),
    );
  });
}

export function drillingSteps(context: SheetContext, pages: PagesNamed): string[] {
  const { document } = context.input;
  const holes = numberedHoles(document).reverse();
  const first = `Read the cautions on page ${pages.cautions}. This print has no code to check: it is for looking at.`;
  const trim = trimStep(context);
  const last = 'Ease every edge. Let the bore cool, then play all notes.';
  if (holes.length === 0) return [first, trim, last];
  const labels = holes.map(({ label }) => label);
  const span = labels.length === 1 ? `hole ${labels[0]}` : `holes ${labels[0]} to ${labels.at(-1)}`;
  const [lowest, ...others] = labels;
  const then = others.length === 0 ? '' : `, then ${shortList(others)}`;
  return [
    first,
    settingStep(context),
    `Glue on the template (${pagesInWords(pages.templates)}). Check both 100 mm rulers first.`,
    `Centre punch ${span}. Check each against the table before drilling.`,
    `Pilot ${shortList(labels)}. Clear the chips each time.`,
    trim,
    `Open ${lowest}${then}. After each: play, read, open a little, read again.`,
    `${undercutWords(holes)}${last}`,
  ];
}

function settingStep({ input, writing }: SheetContext): string {
  const dowel = dowelMm(input.document);
  const inBore =
    dowel === null
      ? 'a dowel that fits the bore in it'
      : `dowel ${lengthInWords(dowel, writing)} in the bore`;
  const end = input.workshop.referenceEnd === 'foot' ? 'foot' : 'mouth end';
  return `Set the body in the V-block, ${end} against the stop, ${inBore}.`;
}

/** The lowest note sounds with everything covered; the foot is shortened until it is in its band. */
function trimStep({ input, writing }: SheetContext): string {
  const { document } = input;
  const { fromMm, toMm } = bodyEnds(document);
  const closable = document.holes.filter((hole) => hole.cover !== 'vent').length;
  const lowest = document.fingerings.find(
    ({ register, covered, half }) => register === 1 && half.length === 0 && covered.length === closable,
  );
  const length = lengthInWords(toMm - fromMm, writing);
  if (lowest === undefined || document.foot.kind === 'stopped') {
    return `Bring the body to its length of ${length}. Write down what you measure.`;
  }
  return `Trim the foot until ${lowest.note} sounds inside the band. Drawn length ${length}. Write the length down.`;
}

function undercutWords(holes: ReturnType<typeof numberedHoles>): string {
  const undercut = holes.filter(({ hole }) => hole.undercut !== null).map(({ label }) => label);
  if (undercut.length === 0) return '';
  return undercut.length === 1 ? `Undercut hole ${undercut[0]}. ` : `Undercut holes ${undercut.join(', ')}. `;
}

/** All holes from the foot upward: every one of a few, the ends of many. */
function shortList(labels: readonly string[]): string {
  return labels.length > 9 ? `${labels[0]} up to ${labels.at(-1)}` : labels.join(', ');
}

function pagesInWords(pages: readonly number[]): string {
  if (pages.length === 1) return `page ${pages[0]}`;
  if (pages.length === 2) return `pages ${pages[0]} and ${pages[1]}`;
  return `pages ${pages[0]} to ${pages.at(-1)}`;
}
