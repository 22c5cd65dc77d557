import { boreEnds } from '#shared/document/profile.ts';
import { referenceName } from './bench-position.ts';
import type { SheetContext } from './sheet-context.ts';
import type { TemplateFrame } from './template-frame.ts';
import { REFERENCE_LINE, WORDS } from './template-lines.ts';

/** The heavy line that everything is measured from, with its name beside it. */
export function drawReferenceBar(
  { pen, input }: SheetContext,
  frame: TemplateFrame,
  { topMm, bottomMm, isNamed = true }: { topMm: number; bottomMm: number; isNamed?: boolean },
): void {
  const { document, workshop } = input;
  const alongMm = workshop.referenceEnd === 'foot' ? boreEnds(document).footMm : 0;
  if (alongMm < frame.alongFromMm - 1e-9 || alongMm > frame.alongToMm + 1e-9) return;
  const x = frame.pageX(alongMm);
  pen.line([x, topMm - 2], [x, bottomMm + 2], REFERENCE_LINE);
  if (!isNamed) return;
  const words = `${referenceName(document, workshop.referenceEnd)}, reference end`;
  const isAtRight = workshop.referenceEnd === 'foot';
  if (!isAtRight && alongMm > frame.alongFromMm + 3) {
    // The bar stands inside the template: its name goes beside it, clear of the opening on the centre line.
    pen.text(words, [x + 1.4, bottomMm - 12], WORDS);
    return;
  }
  const middle = (topMm + bottomMm) / 2;
  pen.turned([isAtRight ? x + 2.2 : x - 2.2, middle], isAtRight ? 90 : -90, () =>
    pen.text(words, [0, 0], { ...WORDS, align: 'centre' }),
  );
}
