import PDFDocument from 'pdfkit';
import { boreTableSection } from './bore-table.ts';
import { cautionsSection } from './cautions.ts';
import { chartNotesSections } from './chart-notes.ts';
import { drillingOrderSection } from './drilling-order.ts';
import { fingeringChartSection } from './fingering-chart.ts';
import { flowOverPages, type FlowPage } from './flow.ts';
import { holeTableSection } from './hole-table.ts';
import { drawNotApprovedPage } from './not-approved.ts';
import { outlineSection } from './outline-drawing.ts';
import { drawPageFoot } from './page-foot.ts';
import { PAPERS } from './paper.ts';
import { Pen } from './pen.ts';
import { recordSection } from './record.ts';
import { CONTENT_TOP_MM, contentBottomMm, type SheetContext } from './sheet-context.ts';
import type { SheetInput } from './sheet-input.ts';
import { writingOf } from './sheet-lengths.ts';
import { drawTemplatePage, templatePages, templateSubtitle } from './template-page.ts';
import { drawTitleBlock } from './title-block.ts';

interface PlannedPage {
  subtitle: string;
  draw: () => void;
}

/**
 * A set of drilling sheets as a PDF, to be piped where it is wanted; it is drawn whole when this returns.
 *
 * Whatever cannot be drawn throws before the first byte has left.
 */
export function drawDrillingSheet(input: SheetInput): PDFKit.PDFDocument {
  const pdf = openPdf(input);
  const root = pdf.struct('Document');
  pdf.addStructure(root);
  const pen = new Pen(pdf, PAPERS[input.paper]);
  const context: SheetContext = { pen, input, writing: writingOf(input), root };
  const pages = planPages(context);
  pages.forEach((page, index) => {
    pen.newPage();
    drawNotApprovedPage(pen);
    drawTitleBlock(context, { subtitle: page.subtitle, page: index + 1, pages: pages.length });
    page.draw();
    drawPageFoot(context);
  });
  pdf.end();
  return pdf;
}

function openPdf(input: SheetInput): PDFKit.PDFDocument {
  const { document, revision, printedAt, drawnBy } = input;
  const pdf = new PDFDocument({
    autoFirstPage: false,
    pdfVersion: '1.7',
    tagged: true,
    displayTitle: true,
    lang: 'en-GB',
    info: {
      Title: `NOT APPROVED, ${document.name} rev ${revision.number}`,
      Author: drawnBy,
      Creator: 'Borewright',
      Producer: 'Borewright',
      CreationDate: printedAt,
    },
  });
  forbidScaling(pdf);
  return pdf;
}

/** Viewers fit pages to the paper unless they are told not to; the option has no door of its own. */
function forbidScaling(pdf: PDFKit.PDFDocument): void {
  const catalogue = pdf as unknown as {
    _root: { data: { ViewerPreferences: { data: Record<string, unknown> } } };
  };
  catalogue._root.data.ViewerPreferences.data.PrintScaling = 'None';
}

/** The pages in their order; steps that send the reader to another page learn its number once all are counted. */
function planPages(context: SheetContext): PlannedPage[] {
  const area = { topMm: CONTENT_TOP_MM, bottomMm: contentBottomMm(context.pen.paper) };
  const named = { cautions: 0, templates: [] as number[] };
  const first = flowOverPages(
    [
      outlineSection(context),
      ...(context.input.document.holes.length === 0 ? [] : [holeTableSection(context)]),
      boreTableSection(context),
      drillingOrderSection(context, () => named),
    ],
    area,
  );
  const templates = templatePages(context);
  const last = flowOverPages(
    [
      fingeringChartSection(context),
      ...chartNotesSections(context),
      recordSection(context),
      cautionsSection(context),
    ],
    area,
  );
  named.templates = templates.map((_, index) => first.length + 1 + index);
  named.cautions = first.length + templates.length + last.length;
  const pageOfPart = (part: number) =>
    first.length + 1 + templates.findIndex((template) => template.frame.part === part);
  return [
    ...first.map((blocks) => flowPage('Holes, bore and drilling order', blocks)),
    ...templates.map((template) => ({
      subtitle: templateSubtitle(template),
      draw: () => drawTemplatePage(context, template, pageOfPart),
    })),
    ...last.map((blocks) => flowPage('Fingering chart, record and cautions', blocks)),
  ];
}

function flowPage(subtitle: string, blocks: FlowPage): PlannedPage {
  return { subtitle, draw: () => blocks.forEach((block) => block.draw()) };
}
