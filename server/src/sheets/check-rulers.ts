import type { Pen, Point } from './pen.ts';
import { scaleTicks } from './scale-ticks.ts';

/** What a steel rule must measure on the paper, both ways. */
export const CHECK_LENGTH_MM = 100;

/** Room that a ruler takes above and below its line, mm. */
export const RULER_ABOVE_MM = 6.5;
export const RULER_BELOW_MM = 6;

export const CHECK_SENTENCE =
  'If it is not 100.0 within 0.2, do not use this page. Print again at 100 %, with fit to page turned off.';

const LINE = { widthMm: 0.3 };
const TICK = { widthMm: 0.13 };
const END_MM = 3;
const TICK_MM = 2.6;

/** Across the page from a point; printers scale the two ways differently, so there is one of each. */
export function drawRulerAcross(pen: Pen, [x, y]: Point): void {
  pen.pdf.save().translate(x, y);
  drawRuler(pen, 'across the page');
  pen.pdf.restore();
}

/** Down the page to a point, which is its 0. */
export function drawRulerDown(pen: Pen, foot: Point): void {
  pen.turned(foot, -90, () => drawRuler(pen, 'down the page'));
}

function drawRuler(pen: Pen, way: string): void {
  const ticks = scaleTicks(0, CHECK_LENGTH_MM, 'mm');
  pen.stroke(LINE, (path) =>
    path
      .moveTo(0, 0)
      .lineTo(CHECK_LENGTH_MM, 0)
      .moveTo(0, -END_MM)
      .lineTo(0, END_MM)
      .moveTo(CHECK_LENGTH_MM, -END_MM)
      .lineTo(CHECK_LENGTH_MM, END_MM),
  );
  pen.stroke(TICK, (path) =>
    ticks.forEach(({ atMm, length }) => path.moveTo(atMm, 0).lineTo(atMm, -TICK_MM * length)),
  );
  ticks
    .filter(({ figure }) => figure !== '')
    .forEach(({ atMm, figure }) => pen.text(figure, [atMm, -4], { size: 8, align: 'centre' }));
  const words = `${way}: must measure 100.0 mm with your steel rule`;
  pen.text(words, [CHECK_LENGTH_MM / 2, 5], { size: 8.8, align: 'centre' });
}
