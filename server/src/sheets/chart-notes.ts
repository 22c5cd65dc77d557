import { centsPerDegree, predictionNotices } from './fingering-rows.ts';
import type { FlowSection } from './flow.ts';
import type { SheetContext } from './sheet-context.ts';
import type { SheetInput } from './sheet-input.ts';
import { textSection } from './text-section.ts';

/** Under the chart: what another temperature does, the bands, and what the prediction warns of. */
export function chartNotesSections(context: SheetContext): FlowSection[] {
  const { input } = context;
  const lines = [temperatureWords(input), bandWords(input), accuracyWords(input)]
    .filter((part) => part !== '')
    .join(' ');
  const notices = predictionNotices(input);
  return [
    textSection(context, { paragraphs: [lines], gapMm: 1.6 }),
    ...(notices.length === 0
      ? []
      : [textSection(context, { caption: 'Before you trust these figures', paragraphs: notices, gapMm: 2 })]),
  ];
}

function temperatureWords(input: SheetInput): string {
  const cents = centsPerDegree(input);
  if (cents === null) return '';
  const { temperatureC } = input.document.air;
  const size = Math.abs(cents).toFixed(1);
  const [above, below] = cents < 0 ? ['take away', 'add'] : ['add', 'take away'];
  return `At other bore temperatures ${above} ${size} cents for each degree above ${temperatureC} °C, ${below} ${size} for each degree below.`;
}

function bandWords({ workshop }: SheetInput): string {
  const bands = workshop.bandCents.map((cents, index) =>
    index === 0 ? `±${cents} cents in register 1` : `±${cents} in register ${index + 1}`,
  );
  return bands.length === 0 ? '' : `Band for sign-off: ${bands.join(', ')}.`;
}

function accuracyWords({ prediction }: SheetInput): string {
  const worst = Math.max(0, ...prediction.fingerings.map((fingering) => fingering.accuracyCents));
  if (worst === 0) return '';
  const calibrated = Math.max(
    ...prediction.fingerings.map(
      ({ accuracyCents, calibratedAccuracyCents = accuracyCents }) => calibratedAccuracyCents,
    ),
  );
  const after = calibrated < worst ? `, after it ±${calibrated.toFixed(0)}` : '';
  return `Expected accuracy of the prediction before calibration: within ±${worst.toFixed(0)} cents${after}.`;
}
