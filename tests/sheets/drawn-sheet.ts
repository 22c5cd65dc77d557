import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import { drawDrillingSheet } from '../../server/src/sheets/draw-drilling-sheet.ts';
import type { SheetInput } from '../../server/src/sheets/sheet-input.ts';
import { buildSheetInput, buildWhistle } from './build-sheet-input.ts';
import { readSheet, type ReadPage, type ReadSheet } from './read-sheet.ts';
import { readTemplates } from './read-templates.ts';

/** Draws a set and reads it back. */
export const drawnSheet = (changes: Partial<SheetInput> = {}): Promise<ReadSheet> =>
  readSheet(drawDrillingSheet(buildSheetInput(changes)));

export const templatePages = (sheet: ReadSheet): ReadPage[] =>
  sheet.pages.filter((page) => readTemplates(page).length > 0);

export const wordsOf = (page: ReadPage): string => page.texts.map(({ text }) => text).join('\n');

/** A straight tube of one length with some holes and no notes. */
export function tube(lengthMm: number, outsideMm: number, holes: ToneHole[]): DesignDocument {
  return buildWhistle({
    bore: {
      stations: [
        { positionMm: -4.6, diameterMm: outsideMm * 0.7 },
        { positionMm: lengthMm, diameterMm: outsideMm * 0.7 },
      ],
    },
    outside: {
      stations: [
        { positionMm: -31, diameterMm: outsideMm },
        { positionMm: lengthMm, diameterMm: outsideMm },
      ],
    },
    holes,
    fingerings: [],
  });
}
