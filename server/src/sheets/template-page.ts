import { bodyEnds, referenceName } from './bench-position.ts';
import {
  CHECK_LENGTH_MM,
  CHECK_SENTENCE,
  drawRulerAcross,
  drawRulerDown,
  RULER_ABOVE_MM,
  RULER_BELOW_MM,
} from './check-rulers.ts';
import { leadingMm, wrapText } from './fitted-text.ts';
import { MARGIN_MM } from './paper.ts';
import { CONTENT_TOP_MM, contentBottomMm, type SheetContext } from './sheet-context.ts';
import { diameterInWords, lengthInWords, spanInWords, unitInWords } from './sheet-lengths.ts';
import { drawStrip, stripHeightMm } from './strip-template.ts';
import { group, tagged } from './tagging.ts';
import {
  benchReading,
  roundBands,
  templateFrames,
  type RoundBand,
  type TemplateFrame,
} from './template-frame.ts';
import { ALONG_PAGE } from './tiling.ts';
import { surfaceExcessMm } from './template-geometry.ts';
import { SMALL_WORDS, WORDS } from './template-lines.ts';
import { drawWrapAround } from './wrap-around-template.ts';

/** One page of the full-scale templates. */
export interface TemplatePage {
  frame: TemplateFrame;
  /** null on a page that holds the flat strip alone. */
  band: RoundBand | null;
  hasStrip: boolean;
}

/** From the top of the contents to the wrap-around, and from one thing to the next, mm. */
const HEADING_MM = 20.5;
const BELOW_WRAP_MM = 19;
const BELOW_STRIP_MM = 9;
const RULER_ROOM_MM = RULER_ABOVE_MM + RULER_BELOW_MM + 6;

export function templatePages(context: SheetContext): TemplatePage[] {
  const { document, workshop } = context.input;
  const roomMm = contentBottomMm(context.pen.paper) - CONTENT_TOP_MM - HEADING_MM - RULER_ROOM_MM;
  const stripMm = BELOW_WRAP_MM + stripHeightMm(document) + BELOW_STRIP_MM;
  const room = { ...ALONG_PAGE, drawnMm: roomMm - BELOW_STRIP_MM };
  return templateFrames(document, workshop.referenceEnd).flatMap((frame) => {
    const bands = roundBands(document, frame, room);
    const [only] = bands;
    if (bands.length === 1 && only !== undefined && bandHeight(only) + stripMm <= roomMm) {
      return [{ frame, band: only, hasStrip: true }];
    }
    const wraps = bands.map((band) => ({ frame, band, hasStrip: false }));
    return [...wraps, { frame, band: null, hasStrip: true }];
  });
}

function bandHeight(band: RoundBand): number {
  return band.highMm - band.lowMm;
}

export function templateSubtitle({ frame, band, hasStrip }: TemplatePage): string {
  const what = band === null ? ', flat strip' : hasStrip ? '' : ', wrap-around';
  return `Full-scale template, part ${frame.part} of ${frame.parts}${what}`;
}

/** Page of the set on which a part of the template lies. */
export type PageOfPart = (part: number) => number;

export function drawTemplatePage(context: SheetContext, page: TemplatePage, pageOfPart: PageOfPart): void {
  const { pen, root, input } = context;
  const { frame, band } = page;
  tagged(pen, root, 'P', () => drawHeading(context, frame));
  const top = CONTENT_TOP_MM + HEADING_MM;
  const bandMm = band === null ? 0 : bandHeight(band);
  const stripTop = band === null ? top : top + bandMm + BELOW_WRAP_MM;
  const bottom = page.hasStrip ? stripTop + stripHeightMm(input.document) : top + bandMm;
  const alt = `Template at full scale, part ${frame.part} of ${frame.parts}; the positions stand in the hole table.`;
  tagged(pen, root, { type: 'Figure', tag: { alt } }, () => {
    if (band !== null) {
      drawWrapWords(context, frame, { topMm: top, band });
      drawWrapAround(context, { frame, band, centreY: top + band.highMm });
    }
    if (page.hasStrip) {
      const words = 'Flat strip, for holes on the centre line';
      drawBeside(context, frame, { words, y: stripTop - 1.6, narrowY: stripTop + 4 });
      drawStrip(context, { frame, topMm: stripTop });
    }
  });
  drawRulersAndSteps(context, page, { bottomMm: bottom + BELOW_STRIP_MM, pageOfPart });
}

function drawHeading(context: SheetContext, frame: TemplateFrame): void {
  const { pen, input, writing } = context;
  const reading = benchReading(context);
  const [from = 0, to = 0] = [frame.alongFromMm, frame.alongToMm].map(reading).sort((a, b) => a - b);
  const reference = referenceName(input.document, input.workshop.referenceEnd);
  const overlap = frame.parts > 1 ? ` Parts lie ${spanInWords(10, writing)} over each other.` : '';
  const words = `Full scale, 1 : 1. Part ${frame.part} of ${frame.parts}: ${spanInWords(from, writing)} to ${spanInWords(to, writing)} ${unitInWords({ ...writing, besides: 'nothing' })} from the ${reference}.${overlap}`;
  const widthMm = pen.paper.widthMm - 2 * MARGIN_MM;
  wrapText(pen, words, widthMm, { size: 10.5, weight: 600 }).forEach((line, index) =>
    pen.text(line, [MARGIN_MM, CONTENT_TOP_MM + 3.6 + index * leadingMm(10.5)], { size: 10.5, weight: 600 }),
  );
}

function drawWrapWords(
  context: SheetContext,
  frame: TemplateFrame,
  { topMm, band }: { topMm: number; band: RoundBand },
): void {
  const { pen } = context;
  const words = wrapWords(context);
  drawBeside(context, frame, { words, y: topMm - 9.4, narrowY: topMm + 4 });
  // A tile too short for words has its neighbours' to go by, and a band's cut is no seam.
  if (isNarrow(frame) || band.joinsMm.length > 0) return;
  pen.text('seam', [wordsX(frame), topMm - 1.4], SMALL_WORDS);
  pen.text('seam, meets the other edge', [wordsX(frame), topMm + bandHeight(band) + 3.6], SMALL_WORDS);
}

function isNarrow(frame: TemplateFrame): boolean {
  return frame.alongToMm - frame.alongFromMm < 90;
}

/** Words over a template, or in the white beside one that is too short to carry them. */
function drawBeside(
  { pen, input }: SheetContext,
  frame: TemplateFrame,
  { words, y, narrowY }: { words: string; y: number; narrowY: number },
): void {
  if (!isNarrow(frame)) {
    pen.text(words, [wordsX(frame), y], SMALL_WORDS);
    return;
  }
  const isAtRight = input.workshop.referenceEnd === 'foot';
  const x = isAtRight ? frame.pageX(frame.alongFromMm) - 7 : frame.pageX(frame.alongToMm) + 7;
  wrapText(pen, words, 60, SMALL_WORDS).forEach((line, index) =>
    pen.text(line, [x, narrowY + index * leadingMm(SMALL_WORDS.size)], {
      ...SMALL_WORDS,
      align: isAtRight ? 'right' : 'left',
    }),
  );
}

/** Words over a template begin at its left end, after the ring marks where there are any. */
function wordsX(frame: TemplateFrame): number {
  const left = frame.pageX(frame.alongFromMm);
  return frame.joins.some(({ alongMm }) => frame.pageX(alongMm) < left + 20) ? left + 10 : left;
}

/** What body the wrap-around fits, and what its height is for. */
function wrapWords({ input, writing }: SheetContext): string {
  const diameters = input.document.outside.stations.map((station) => station.diameterMm);
  const [least, most] = [Math.min(...diameters), Math.max(...diameters)];
  if (most - least < 0.005) {
    const round = lengthInWords(Math.PI * most, writing);
    return `Wrap-around, for outside diameter ${diameterInWords(most, writing)}. Height ${round} is once round.`;
  }
  return `Wrap-around, for outside diameters ${diameterInWords(least, writing)} to ${diameterInWords(most, writing)}. The height is once round.`;
}

function drawRulersAndSteps(
  context: SheetContext,
  page: TemplatePage,
  { bottomMm, pageOfPart }: { bottomMm: number; pageOfPart: PageOfPart },
): void {
  const { pen, root } = context;
  const pageBottom = contentBottomMm(pen.paper);
  const leftMm = MARGIN_MM + 22;
  const lineY = bottomMm + RULER_ABOVE_MM;
  // The ruler down the page stands below the templates where there is room, else in the white beside them.
  const isBelow = lineY + CHECK_LENGTH_MM + 2 <= pageBottom;
  const downX = isBelow ? pen.paper.widthMm - MARGIN_MM - 12 : MARGIN_MM + 7;
  const downY = isBelow ? lineY + CHECK_LENGTH_MM : pageBottom - 3;
  const alt = 'Two rulers of 100 mm to check the print with, one across and one down the page.';
  tagged(pen, root, { type: 'Figure', tag: { alt } }, () => {
    drawRulerAcross(pen, [leftMm, lineY]);
    drawRulerDown(pen, [downX, downY]);
  });
  const sentenceY = lineY + RULER_BELOW_MM + 4.5;
  tagged(pen, root, 'P', () => pen.text(CHECK_SENTENCE, [leftMm, sentenceY], WORDS));
  drawSteps(context, stepsOf(context, page, pageOfPart), { topMm: sentenceY + 5, bottomMm: pageBottom });
}

function stepsOf(context: SheetContext, { frame, band }: TemplatePage, pageOfPart: PageOfPart): string[] {
  const { input, writing } = context;
  const reading = benchReading(context);
  const reference = referenceName(input.document, input.workshop.referenceEnd);
  const joins = frame.joins.map(({ alongMm, part }) => {
    const join = `join line ${spanInWords(reading(alongMm), writing)}`;
    return `Lay ${join} on ${join} of page ${pageOfPart(part)}; the ring marks must sit on each other.`;
  });
  const first = `Lay the reference line exactly on the ${reference}.`;
  return [
    'Cut along the thin outline. Keep the page ends for the marks.',
    ...(frame.part === 1 ? [first] : joins.slice(0, 1)),
    ...(band === null ? [] : ['Seam edges meet underneath. The centre line runs along the top of the body.']),
    'Punch through the paper. Check each mark against the table on page 1.',
    ...closeJoinWords(context, frame),
    ...taperWords(context),
  ];
}

/** Where holes stand so close that no join is clear of them. */
function closeJoinWords({ writing }: SheetContext, frame: TemplateFrame): string[] {
  const close = frame.joins.filter((join) => join.clearMm < 8 - 1e-6);
  return close.map(
    ({ clearMm }) =>
      `Holes stand close here: a join lies ${lengthInWords(clearMm, writing)} from a centre. Punch that hole where it is whole.`,
  );
}

/** Paper lies along the slope, rules and figures along the axis. */
function taperWords({ input, writing }: SheetContext): string[] {
  const { fromMm, toMm } = bodyEnds(input.document);
  const excess = surfaceExcessMm(input.document, { fromMm, toMm });
  if (excess < 0.05) return [];
  return [
    `Positions run along the axis. Along its sloping outside the body is ${lengthInWords(excess, writing)} longer: check each mark with callipers.`,
  ];
}

function drawSteps(
  { pen, root }: SheetContext,
  steps: readonly string[],
  { topMm, bottomMm }: { topMm: number; bottomMm: number },
): void {
  const style = { size: 10.5 };
  const left = MARGIN_MM + 22;
  const widthMm = 120;
  const list = group(pen, root, 'L');
  let y = topMm;
  steps.forEach((step, index) => {
    const lines = wrapText(pen, step, widthMm - 8, style);
    const heightMm = 4.2 + lines.length * leadingMm(style.size);
    if (y + heightMm > bottomMm) return;
    const top = y;
    tagged(pen, list, 'LI', () => {
      pen.line([left, top], [left + widthMm, top], { widthMm: 0.18, colour: '#777777' });
      pen.text(String(index + 1), [left + 1, top + 5.6], { ...style, weight: 700 });
      lines.forEach((line, at) => pen.text(line, [left + 7, top + 5.6 + at * leadingMm(style.size)], style));
    });
    y += heightMm;
  });
}
