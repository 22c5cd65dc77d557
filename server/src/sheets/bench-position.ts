import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';
import type { SheetInput } from './sheet-input.ts';

/** A hole as the bench counts it. */
export interface NumberedHole {
  /** From 1 at the mouth end down. */
  number: number;
  /** What stands at the hole on paper: its own name where all holes have short ones, else its number. */
  label: string;
  /** Where it stands in the document, whose paths name it by index. */
  index: number;
  hole: ToneHole;
}

/** Holes from the mouth end down; of two at one position the first in the document leads. */
export function numberedHoles(document: DesignDocument): NumberedHole[] {
  const areNamed = haveShortNames(document.holes);
  return document.holes
    .map((hole, index) => ({ hole, index }))
    .sort((a, b) => a.hole.positionMm - b.hole.positionMm || a.index - b.index)
    .map((entry, at) => ({
      ...entry,
      number: at + 1,
      label: areNamed ? entry.hole.name.trim() : String(at + 1),
    }));
}

/** Longest name that fits over a hole; two ways of counting the same holes would be worse than none. */
const LONGEST_LABEL = 3;

function haveShortNames(holes: readonly ToneHole[]): boolean {
  const names = holes.map((hole) => hole.name.trim());
  const areShort = names.every((name) => name !== '' && name.length <= LONGEST_LABEL);
  return areShort && new Set(names).size === names.length;
}

export type ReferenceEnd = SheetInput['workshop']['referenceEnd'];

/** Distance from the reference end, mm; from the foot it counts upward, from the mouth end as the document does. */
export function benchPositionMm(
  document: DesignDocument,
  positionMm: number,
  referenceEnd: ReferenceEnd,
): number {
  return referenceEnd === 'foot' ? boreEnds(document).footMm - positionMm : positionMm;
}

/** What the line that everything is measured from is called. */
export function referenceName(document: DesignDocument, referenceEnd: ReferenceEnd): string {
  if (referenceEnd === 'foot') return 'foot';
  return {
    embouchure: 'centre of the embouchure hole',
    window: 'lip of the window',
    rim: 'rim',
    reed: 'reed seat',
    'ideal-open': 'mouth end',
    'ideal-closed': 'mouth end',
  }[document.mouthEnd.kind];
}

/** Where the body begins and ends along its axis, mm from the mouth end's reference point. */
export function bodyEnds(document: DesignDocument): { fromMm: number; toMm: number } {
  const { mouthMm, footMm } = boreEnds(document);
  const outsideFrom = document.outside.stations[0]?.positionMm ?? mouthMm;
  return { fromMm: Math.min(mouthMm, outsideFrom), toMm: footMm };
}
