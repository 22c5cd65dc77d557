import { formatCents } from '#shared/music/cents.ts';
import { drawFingering, fingeringAlt } from './fingering-picture.ts';
import { fingeringRows, type ChartNote, type FingeringRow } from './fingering-rows.ts';
import type { FlowSection } from './flow.ts';
import type { SheetContext } from './sheet-context.ts';
import { filledWidths, tableSection, type TableCell } from './table.ts';

const SHARES = [34, 16, 19, 21, 22, 17, 20, 20, 25];
const HEADS = [
  'Fingering',
  'Note',
  'Hz',
  'Predicted',
  'Measured',
  'Register 2',
  'Predicted',
  'Measured',
  'Register 3',
];
const ROW_MM = 7.4;
const NOTHING = '–';

/** Every fingering with its predicted cents and room for the measured ones. */
export function fingeringChartSection(context: SheetContext): FlowSection {
  const { air, pitch } = context.input.document;
  return tableSection(context, {
    caption: 'Fingering chart',
    note: `head at the left; predicted cents with bore air at ${air.temperatureC} °C, A = ${pitch.a4Hz} Hz, steady breath`,
    widthsMm: filledWidths(context, SHARES),
    head: [HEADS.map((text, column) => ({ text, column }))],
    headRowMm: 5,
    rowMm: ROW_MM,
    rows: fingeringRows(context.input).map((row) => chartCells(context, row)),
    gapMm: 0,
  });
}

function chartCells({ pen, input }: SheetContext, row: FingeringRow): TableCell[] {
  const { document } = input;
  const { fingering, first, second, third, words } = row;
  const cells: TableCell[] = [
    {
      text: '',
      picture: {
        alt: fingeringAlt(document, fingering),
        draw: (box) => drawFingering(pen, { document, fingering, box }),
      },
    },
    { text: first.note, look: 'key' },
    { text: first.targetHz.toFixed(1) },
    { text: centsOf(first), look: 'key' },
    { text: '', look: 'write' },
  ];
  if (words !== '') return [...cells, { text: words, align: 'left', span: 4 }];
  return [
    ...cells,
    { text: second?.note ?? NOTHING },
    { text: second === null ? NOTHING : centsOf(second) },
    second === null ? { text: '' } : { text: '', look: 'write' },
    { text: third === null ? NOTHING : `${third.note} ${centsOf(third)}` },
  ];
}

function centsOf({ cents }: ChartNote): string {
  return cents === null ? 'none' : formatCents(cents);
}
