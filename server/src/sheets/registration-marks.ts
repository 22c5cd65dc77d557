import type { Pen, Point } from './pen.ts';

const RING_MM = 1.6;
const CROSS_MM = 3;
const LINE = { widthMm: 0.2 };

/** A ring and a cross that must sit on the same mark of the next page. */
export function drawRegistrationMark(pen: Pen, [x, y]: Point): void {
  pen.circle([x, y], RING_MM, LINE);
  pen.stroke(LINE, (path) =>
    path
      .moveTo(x - CROSS_MM, y)
      .lineTo(x + CROSS_MM, y)
      .moveTo(x, y - CROSS_MM)
      .lineTo(x, y + CROSS_MM),
  );
}

/** The dashed line at which two pages lie on each other. */
export function drawJoinLine(pen: Pen, from: Point, to: Point): void {
  pen.line(from, to, { widthMm: 0.25, dashMm: [2.4, 1.2] });
}
