import { MM_PER_POINT } from './paper.ts';
import type { Pen, Point, TextStyle } from './pen.ts';

/** Smallest type on a sheet, points: what can be read at arm's length on a bench. */
export const SMALLEST_TYPE = 8;

/** Distance of two base lines, as a share of the size. */
const LEADING = 1.22;

/** Height of figures and capitals above the base line, as a share of the size. */
export const CAP_HEIGHT = 0.66;

export interface TextBox {
  widthMm: number;
  heightMm: number;
}

export interface FittedText {
  size: number;
  lines: string[];
  /** From one base line to the next, mm. */
  leadingMm: number;
}

export function leadingMm(size: number): number {
  return size * LEADING * MM_PER_POINT;
}

/** Breaks text into lines of a width, between words and, where a word is wider than the line, between letters. */
export function wrapText(pen: Pen, text: string, widthMm: number, style: TextStyle): string[] {
  const fits = (line: string) => pen.textWidthMm(line, style) <= widthMm;
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (fits(longer)) {
      line = longer;
      continue;
    }
    if (line !== '') lines.push(line);
    const pieces = brokenWord(word, fits);
    lines.push(...pieces.slice(0, -1));
    line = pieces.at(-1) ?? '';
  }
  return [...lines, line];
}

function brokenWord(word: string, fits: (line: string) => boolean): string[] {
  if (fits(word)) return [word];
  const pieces: string[] = [];
  let piece = '';
  for (const letter of word) {
    if (piece !== '' && !fits(piece + letter)) {
      pieces.push(piece);
      piece = letter;
    } else {
      piece += letter;
    }
  }
  return [...pieces, piece];
}

/**
 * The largest size, down to the smallest type, at which a text wraps into a box.
 *
 * What does not fit even then is cut at the end and says so with an ellipsis: nothing is ever written over its neighbour.
 */
export function fitText(pen: Pen, text: string, box: TextBox, style: TextStyle): FittedText {
  for (let { size } = style; size >= SMALLEST_TYPE; size -= 0.5) {
    const lines = wrapText(pen, text, box.widthMm, { ...style, size });
    if (lines.length <= roomForLines(box, size)) return { size, lines, leadingMm: leadingMm(size) };
  }
  const size = SMALLEST_TYPE;
  const lines = wrapText(pen, text, box.widthMm, { ...style, size });
  const room = roomForLines(box, size);
  const kept = lines.slice(0, room);
  if (lines.length > room) kept[room - 1] = cutLine(pen, kept[room - 1] ?? '', box, { ...style, size });
  return { size, lines: kept, leadingMm: leadingMm(size) };
}

/** A line takes its capitals' height; every further one a leading. A box holds one line at least. */
function roomForLines(box: TextBox, size: number): number {
  const first = size * CAP_HEIGHT * MM_PER_POINT;
  return Math.max(1, 1 + Math.floor((box.heightMm - first + 1e-9) / leadingMm(size)));
}

function cutLine(pen: Pen, line: string, box: TextBox, style: TextStyle): string {
  let letters = Array.from(line);
  while (letters.length > 0 && pen.textWidthMm(`${letters.join('')}…`, style) > box.widthMm) {
    letters = letters.slice(0, -1);
  }
  return `${letters.join('')}…`;
}

/** Writes fitted lines, the first base line at a point. */
export function writeLines(pen: Pen, fitted: FittedText, [x, y]: Point, style: TextStyle): void {
  fitted.lines.forEach((line, index) => {
    pen.text(line, [x, y + index * fitted.leadingMm], { ...style, size: fitted.size });
  });
}

/** Height from the top of the first line's capitals to the last base line, mm. */
export function fittedHeightMm(fitted: FittedText): number {
  return fitted.size * CAP_HEIGHT * MM_PER_POINT + (fitted.lines.length - 1) * fitted.leadingMm;
}

/** Fits a text into a box and writes it, in the middle of the box from top to bottom. */
export function writeInBox(pen: Pen, text: string, box: TextBox & { at: Point }, style: TextStyle): void {
  const fitted = fitText(pen, text, box, style);
  const [x, y] = box.at;
  const along = { left: 0, centre: box.widthMm / 2, right: box.widthMm }[style.align ?? 'left'];
  const capMm = fitted.size * CAP_HEIGHT * MM_PER_POINT;
  const top = y + (box.heightMm - fittedHeightMm(fitted)) / 2;
  writeLines(pen, fitted, [x + along, top + capMm], style);
}
