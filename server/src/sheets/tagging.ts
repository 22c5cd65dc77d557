import type { Pen } from './pen.ts';

/** An element of the PDF's structure, through which readers and searches find their way. */
export type Tag = PDFKit.Mixins.StructureElementOptions & { scope?: 'Column' | 'Row' };
export type TaggedElement = ReturnType<PDFKit.PDFDocument['struct']>;

/** An element that other elements go into: Document, Sect, Table, TR, L. */
export function group(pen: Pen, parent: TaggedElement, type: string, tag: Tag = {}): TaggedElement {
  const element = pen.pdf.struct(type, tag);
  parent.add(element);
  return element;
}

/** An element that is drawn at once: P, H1, TH, TD, Figure. */
export function tagged(
  pen: Pen,
  parent: TaggedElement,
  type: string | { type: string; tag: Tag },
  draw: () => void,
): void {
  const named = typeof type === 'string' ? { type, tag: {} } : type;
  parent.add(pen.pdf.struct(named.type, named.tag, draw));
}

/** Lines, bars and repeated words that a reader may leave out. */
export function decoration(pen: Pen, draw: () => void): void {
  pen.pdf.markContent('Artifact', { type: 'Layout' });
  draw();
  pen.pdf.endMarkedContent();
}
