import { predictDesign } from '#shared/analysis/predict-design.ts';
import { whistleDocument } from '../support/whistle-document.ts';

/** Prints how long the first chart of this process takes, ms. */
const document = whistleDocument();
const start = performance.now();
predictDesign(document);
process.stdout.write(String(performance.now() - start));
