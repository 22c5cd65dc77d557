import { designSensitivities } from '#shared/analysis/design-sensitivities.ts';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import { drawDrillingSheet } from '../../server/src/sheets/draw-drilling-sheet.ts';
import { sixHoleDesign } from './demo-workshop.ts';
import { figureOf, type Figure } from './figure.ts';

const WARM_UP = 5;
const RUNS = 40;

/** From a design document to the last byte of its PDF, predictions and sensitivities included. */
export async function measureSheet(): Promise<Figure> {
  const document = await sixHoleDesign();
  const samples: number[] = [];
  for (let run = -WARM_UP; run < RUNS; run += 1) {
    const begun = performance.now();
    const pdf = drawDrillingSheet({
      document,
      prediction: predictDesign(document),
      sensitivities: designSensitivities(document),
      workshop: { name: 'Bench', unit: 'mm', referenceEnd: 'foot', bandCents: [5, 8, 12] },
      revision: { number: 1, state: 'draft', draftSavedAt: new Date() },
      printedAt: new Date(),
      paper: 'A4',
      unit: 'mm',
      drawnBy: 'Bench',
    });
    let bytes = 0;
    for await (const chunk of pdf) bytes += (chunk as Buffer).length;
    if (bytes === 0) throw new Error('The sheet is empty.');
    if (run >= 0) samples.push(performance.now() - begun);
  }
  return figureOf({ what: 'Drilling sheet of a six-hole design, PDF', unit: 'ms', budget: 400 }, samples);
}
