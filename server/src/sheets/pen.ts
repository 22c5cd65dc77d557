import { chooseFont, fontRuns, printableText, type FontWeight } from './fonts.ts';
import { MM_PER_POINT, POINTS_PER_MM, type Paper } from './paper.ts';

export interface LineStyle {
  widthMm: number;
  /** Stroke and gap, mm. */
  dashMm?: readonly [number, number];
  colour?: string;
}

export interface TextStyle {
  /** Size of the type, points. */
  size: number;
  weight?: FontWeight;
  colour?: string;
  align?: 'left' | 'centre' | 'right';
  /** Extra space between letters, as a share of the size. */
  spacing?: number;
}

export type Point = readonly [xMm: number, yMm: number];

/** Thinnest line that any office printer still draws whole, mm. */
export const HAIRLINE_MM = 0.13;

const INK = '#000000';

/**
 * Draws on a page in millimetres from its top left corner.
 *
 * One scaling at the head of each page makes the unit of the PDF a millimetre; nothing after it is scaled again.
 */
export class Pen {
  readonly pdf: PDFKit.PDFDocument;
  readonly paper: Paper;
  private readonly widths = new Map<string, number>();

  constructor(pdf: PDFKit.PDFDocument, paper: Paper) {
    this.pdf = pdf;
    this.paper = paper;
  }

  newPage(): void {
    const size: [number, number] = [this.paper.widthMm * POINTS_PER_MM, this.paper.heightMm * POINTS_PER_MM];
    this.pdf.addPage({ size, margin: 0 });
    this.pdf.scale(POINTS_PER_MM);
  }

  /** Strokes everything that `draw` traces, in one path. */
  stroke(style: LineStyle, draw: (path: PDFKit.PDFDocument) => void): void {
    this.pdf.save().lineWidth(style.widthMm);
    if (style.dashMm !== undefined) this.pdf.dash(style.dashMm[0], { space: style.dashMm[1] });
    draw(this.pdf);
    this.pdf.stroke(style.colour ?? INK).restore();
  }

  line(from: Point, to: Point, style: LineStyle): void {
    this.stroke(style, (path) => path.moveTo(...from).lineTo(...to));
  }

  /** A line of long strokes and dots, as centre lines are drawn. */
  centreLine([x1, y1]: Point, [x2, y2]: Point): void {
    const length = Math.hypot(x2 - x1, y2 - y1);
    const at = (mm: number): [number, number] => {
      const share = Math.min(1, mm / length);
      return [x1 + share * (x2 - x1), y1 + share * (y2 - y1)];
    };
    this.stroke({ widthMm: 0.16 }, (path) => {
      for (let mm = 0; mm < length; mm += 8.4) {
        path.moveTo(...at(mm)).lineTo(...at(mm + 5));
        if (mm + 6.2 < length) path.moveTo(...at(mm + 6.2)).lineTo(...at(mm + 7.2));
      }
    });
  }

  polygon(points: readonly Point[], style: LineStyle): void {
    this.stroke(style, (path) => path.polygon(...points.map(([x, y]) => [x, y])));
  }

  circle([x, y]: Point, radiusMm: number, style: LineStyle): void {
    this.stroke(style, (path) => path.circle(x, y, radiusMm));
  }

  fillRect([x, y]: Point, widthMm: number, heightMm: number, colour = INK): void {
    this.pdf.save().rect(x, y, widthMm, heightMm).fill(colour).restore();
  }

  fillCircle([x, y]: Point, radiusMm: number, colour = INK): void {
    this.pdf.save().circle(x, y, radiusMm).fill(colour).restore();
  }

  strokeRect([x, y]: Point, widthMm: number, heightMm: number, style: LineStyle): void {
    this.stroke(style, (path) => path.rect(x, y, widthMm, heightMm));
  }

  /** Whatever `draw` draws is kept inside a rectangle. */
  clipped([x, y]: Point, widthMm: number, heightMm: number, draw: () => void): void {
    this.pdf.save().rect(x, y, widthMm, heightMm).clip();
    draw();
    this.pdf.restore();
  }

  /** Turns what `draw` draws about a point, clockwise; `draw` counts from that point. */
  turned([x, y]: Point, degrees: number, draw: () => void): void {
    this.pdf.save().translate(x, y).rotate(degrees);
    draw();
    this.pdf.restore();
  }

  /** Writes one line of text on a base line. */
  text(text: string, [x, y]: Point, style: TextStyle): void {
    const line = printableText(text);
    const { align = 'left', weight = 400, spacing = 0 } = style;
    const sizeMm = style.size * MM_PER_POINT;
    const width = align === 'left' ? 0 : this.textWidthMm(line, style);
    let at = x - (align === 'centre' ? width / 2 : width);
    this.pdf.fillColor(style.colour ?? INK);
    for (const run of fontRuns(line)) {
      chooseFont(this.pdf, run.face, weight);
      this.pdf.fontSize(sizeMm);
      const options = {
        lineBreak: false,
        baseline: 'alphabetic',
        characterSpacing: spacing * sizeMm,
      } as const;
      this.pdf.text(run.text, at, y, options);
      at += this.textWidthMm(run.text, style);
    }
  }

  textWidthMm(text: string, { size, weight = 400, spacing = 0 }: TextStyle): number {
    const line = printableText(text);
    return (this.widthPerSize(line, weight) + spacing * line.length) * size * MM_PER_POINT;
  }

  /** Width of a line as a share of its size; fitting asks for the same words at one size after another. */
  private widthPerSize(line: string, weight: FontWeight): number {
    const key = `${weight} ${line}`;
    const known = this.widths.get(key);
    if (known !== undefined) return known;
    const width = fontRuns(line).reduce((sum, run) => {
      chooseFont(this.pdf, run.face, weight);
      return sum + this.pdf.fontSize(1).widthOfString(run.text);
    }, 0);
    this.widths.set(key, width);
    return width;
  }
}
