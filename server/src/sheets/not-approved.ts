import type { Pen, Point } from './pen.ts';
import type { SheetInput } from './sheet-input.ts';
import { printDayAndTime } from './sheet-dates.ts';
import { decoration } from './tagging.ts';

const BAND_HEIGHT_MM = 8.5;
const BAND_WORDS = 'NOT APPROVED. DO NOT DRILL';
const TEMPLATE_WORDS = 'NOT APPROVED';

/** Width of a diagonal bar and of the white between two, measured across them, mm. */
const BAR_MM = 3;
const GAP_MM = 17;
const BAR_COLOUR = '#ededed';

/** Grey enough to leave the circles over it clear, black enough for any printer. */
const TEMPLATE_WORDS_COLOUR = '#9a9a9a';

/** What the approval cell says of a print that nobody has approved. */
export function notApprovedWords({ state, draftSavedAt }: SheetInput['revision']): string {
  const of = { draft: 'draft of', 'in-review': 'in review,', 'changes-asked': 'changes asked,' }[state];
  return `${of} ${printDayAndTime(draftSavedAt)}`;
}

/** Diagonal bars over the whole page, to be drawn before anything else, and a black band at top and bottom. */
export function drawNotApprovedPage(pen: Pen): void {
  decoration(pen, () => {
    drawBars(pen);
    drawBand(pen, 0);
    drawBand(pen, pen.paper.heightMm - BAND_HEIGHT_MM);
  });
}

function drawBars(pen: Pen): void {
  const { widthMm, heightMm } = pen.paper;
  const along = Math.SQRT2;
  const style = { widthMm: BAR_MM, colour: BAR_COLOUR };
  pen.clipped([0, 0], widthMm, heightMm, () => {
    pen.stroke(style, (path) => {
      for (let start = 0; start < widthMm + heightMm; start += (BAR_MM + GAP_MM) * along) {
        path.moveTo(start, 0).lineTo(start - heightMm, heightMm);
      }
    });
  });
}

function drawBand(pen: Pen, topMm: number): void {
  pen.fillRect([0, topMm], pen.paper.widthMm, BAND_HEIGHT_MM);
  pen.text(BAND_WORDS, [pen.paper.widthMm / 2, topMm + 6.1], {
    size: 15,
    weight: 700,
    colour: '#ffffff',
    align: 'centre',
    spacing: 0.08,
  });
}

/** White between two words along a template, and the least distance of two rows across it, mm. */
const WORDS_APART_MM = 13;
const ROWS_APART_MM = 30;

/** Base lines of the first and last row from the upper and lower edge: clear of the scale and of the figures. */
const FIRST_ROW_MM = 11;
const LAST_ROW_MM = 6.5;
const NARROW_ROW_MM = { first: 7.4, last: 4 };

/** The words again and again inside a template, so that each strip that is cut out carries them. */
export function drawNotApprovedInside(
  pen: Pen,
  { at: [x, y], widthMm, heightMm }: { at: Point; widthMm: number; heightMm: number },
): void {
  const style = { size: 14.7, weight: 700, colour: TEMPLATE_WORDS_COLOUR, spacing: 0.06 } as const;
  const share = Math.min(1, (widthMm - 4) / pen.textWidthMm(TEMPLATE_WORDS, style));
  const fitted = { ...style, size: style.size * share };
  const wordsMm = pen.textWidthMm(TEMPLATE_WORDS, fitted);
  const count = Math.max(1, Math.floor((widthMm - 4) / (wordsMm + WORDS_APART_MM)));
  const pitchMm = widthMm / count;
  wordRows(heightMm).forEach((rowMm, row) => {
    for (let index = 0; index < count; index += 1) {
      // Every other row is shifted, so that a narrow piece cut out across still has one.
      const free = pitchMm - wordsMm;
      const indent = row % 2 === 0 ? free * 0.25 : free * 0.75;
      pen.text(TEMPLATE_WORDS, [x + index * pitchMm + indent, y + rowMm], fitted);
    }
  });
}

/** Base lines of the rows, mm below the upper edge of a template. */
function wordRows(heightMm: number): number[] {
  const isNarrow = heightMm < ROWS_APART_MM;
  const first = isNarrow ? NARROW_ROW_MM.first : FIRST_ROW_MM;
  const last = heightMm - (isNarrow ? NARROW_ROW_MM.last : LAST_ROW_MM);
  const room = Math.max(1, Math.floor((last - first) / ROWS_APART_MM));
  // An even count of rows leaves the middle to the holes on the centre line.
  const gaps = room % 2 === 0 ? room - 1 : room;
  return Array.from({ length: gaps + 1 }, (_, row) => first + ((last - first) * row) / gaps);
}
