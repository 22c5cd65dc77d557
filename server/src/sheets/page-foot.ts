import { referenceName } from './bench-position.ts';
import { fitText, writeLines } from './fitted-text.ts';
import { MARGIN_MM } from './paper.ts';
import { contentWidthMm, type SheetContext } from './sheet-context.ts';
import { unitInWords } from './sheet-lengths.ts';
import { decoration } from './tagging.ts';

const RULE_ABOVE_BOTTOM_MM = MARGIN_MM + 7.4;

const NOT_APPROVED_WORDS = 'This print is for looking at. It has no check code and must not be drilled from.';

/** Workshop, unit and reference end, and what the print is good for. */
export function drawPageFoot(context: SheetContext): void {
  const { pen, input, writing } = context;
  const { workshop, document, drawnBy } = input;
  const reference = referenceName(document, workshop.referenceEnd);
  const top = pen.paper.heightMm - RULE_ABOVE_BOTTOM_MM;
  const right = pen.paper.widthMm - MARGIN_MM;
  const style = { size: 8 };
  const box = { widthMm: contentWidthMm(context) / 2 - 2, heightMm: 5.5 };
  // What the figures mean comes before names, which may be long enough to be cut.
  const facts = `All sizes in ${unitInWords(writing)}. Reference end: ${reference}. ${workshop.name}. Printed by ${drawnBy}.`;
  decoration(pen, () => {
    pen.line([MARGIN_MM, top], [right, top], { widthMm: 0.21 });
    writeLines(pen, fitText(pen, facts, box, style), [MARGIN_MM, top + 3.4], style);
    writeLines(pen, fitText(pen, NOT_APPROVED_WORDS, box, style), [right, top + 3.4], {
      ...style,
      align: 'right',
    });
  });
}
