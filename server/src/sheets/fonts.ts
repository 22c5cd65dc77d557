import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import unicodeRanges from '@fontsource/source-sans-3/unicode.json' with { type: 'json' };
import { unpackedFont } from './unpacked-font.ts';

export type FontWeight = 400 | 600 | 700;

/** A stretch of text that one font file has all the letters of. */
export interface FontRun {
  face: Face;
  text: string;
}

/** The font is sold in one file per group of letters; the first that has a letter draws it. */
const FACES = ['latin', 'latin-ext', 'greek', 'greek-ext', 'cyrillic', 'cyrillic-ext', 'vietnamese'] as const;
type Face = (typeof FACES)[number];

const fromHere = createRequire(import.meta.url);

/** Bytes of the font files read so far: every sheet embeds the same ones. */
const fontFiles = new Map<string, Buffer>();

const letterRanges = new Map(FACES.map((face) => [face, readRanges(unicodeRanges[face])]));

function readRanges(text: string): [number, number][] {
  return text.split(',').map((range) => {
    const [first = '', last = first] = range.replace('U+', '').split('-');
    return [Number.parseInt(first, 16), Number.parseInt(last, 16)];
  });
}

function faceOf(letter: string): Face {
  const code = letter.codePointAt(0) ?? 0;
  const has = (face: Face) =>
    letterRanges.get(face)?.some(([first, last]) => code >= first && code <= last) === true;
  // A letter that the font lacks altogether prints as the font's own box, so that nobody misses it.
  return FACES.find(has) ?? 'latin';
}

/** Text as it can be printed: letters composed, line breaks and marks without width taken out. */
export function printableText(text: string): string {
  return text
    .normalize('NFC')
    .replaceAll(/[\p{Cc}\p{Zl}\p{Zp}]+/gu, ' ')
    .replaceAll(/\p{Cf}/gu, '');
}

export function fontRuns(text: string): FontRun[] {
  const runs: FontRun[] = [];
  for (const letter of text) {
    const face = faceOf(letter);
    const last = runs.at(-1);
    if (last?.face === face) last.text += letter;
    else runs.push({ face, text: letter });
  }
  return runs;
}

/** Chooses a font file and a weight for the text that follows, embedding the file on first use. */
export function chooseFont(pdf: PDFKit.PDFDocument, face: Face, weight: FontWeight): void {
  const name = `${face}-${weight}`;
  let bytes = fontFiles.get(name);
  if (bytes === undefined) {
    const path = fromHere.resolve(`@fontsource/source-sans-3/files/source-sans-3-${name}-normal.woff`);
    bytes = unpackedFont(readFileSync(path));
    fontFiles.set(name, bytes);
  }
  pdf.registerFont(name, bytes).font(name);
}
