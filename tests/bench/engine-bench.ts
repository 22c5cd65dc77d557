import { predictDesign } from '#shared/analysis/predict-design.ts';
import { sixHoleDesign } from './demo-workshop.ts';
import { figureOf, type Figure } from './figure.ts';

const WARM_UP = 300;
const RUNS = 1000;

/** All predictions of a design, ladders to the sixth mode included, once the code is warm. */
export async function measureEngine(): Promise<Figure> {
  const document = await sixHoleDesign();
  const samples: number[] = [];
  for (let run = -WARM_UP; run < RUNS; run += 1) {
    const begun = performance.now();
    const { fingerings } = predictDesign(document);
    const took = performance.now() - begun;
    if (fingerings.length !== document.fingerings.length) throw new Error('A fingering was not predicted.');
    if (run >= 0) samples.push(took);
  }
  const what = `All ${document.fingerings.length} fingerings of a six-hole design, ladders to mode 6, warm`;
  return figureOf({ what, unit: 'ms', budget: 1 }, samples);
}
