import { printLength } from '../lengths/print-length.ts';
import type { LengthUnit } from '../lengths/read-length.ts';
import type { DesignDocument } from './design-document.ts';
import { fromFootMm } from './profile.ts';

/** One thing that is wrong: where (path of keys and indices), and what to do, in a maker's words. */
export interface DocumentFault {
  path: (string | number)[];
  message: string;
}

/** How a fault writes its figures: by whoever reads it. */
export interface FaultWords {
  length: (mm: number) => string;
  place: (document: DesignDocument, positionMm: number) => string;
  /** Both places as they are counted, the lesser figure first. */
  between: (document: DesignDocument, fromMm: number, toMm: number) => string;
}

export interface FaultCheck {
  document: DesignDocument;
  words: FaultWords;
}

/** As the document stores them: for files and for other programs. */
export const MM_FROM_MOUTH_END: FaultWords = {
  length: (mm) => mm.toFixed(1),
  place: (_, positionMm) => `${positionMm.toFixed(1)} from the mouth end`,
  between: (_, fromMm, toMm) => `between ${fromMm.toFixed(1)} and ${toMm.toFixed(1)} from the mouth end`,
};

/** As the bench shows them: in the person's unit, places counted from the foot. */
export function wordsFromFoot(unit: LengthUnit): FaultWords {
  const length = (mm: number) => `${printLength(mm, unit)}${unit === 'mm' ? '' : ' in'}`;
  return {
    length,
    place: (document, positionMm) => `${length(fromFootMm(document, positionMm))} from the foot`,
    between: (document, fromMm, toMm) =>
      `between ${length(fromFootMm(document, toMm))} and ${length(fromFootMm(document, fromMm))} from the foot`,
  };
}
