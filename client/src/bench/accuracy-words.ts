import type { AccuracyPart, FingeringPrediction } from '#shared/analysis/prediction.ts';

const PARTS: Record<AccuracyPart['part'], string> = {
  'bore-and-holes': 'bore and holes',
  losses: 'wall losses',
  undercut: 'undercuts',
  'half-covered': 'half-covered hole',
  pad: 'pads',
  'mouth-end': 'mouth end',
};

type Figures = Pick<FingeringPrediction, 'accuracyCents' | 'calibratedAccuracyCents' | 'accuracy'>;

/** How far a note's figure can be trusted, before and after calibration, and what that is made of. */
export function accuracyWords({ accuracyCents, calibratedAccuracyCents, accuracy = [] }: Figures): string {
  const after = calibratedAccuracyCents ?? accuracyCents;
  const narrows = after < accuracyCents;
  const within = narrows
    ? `within ${centsWords(accuracyCents)} until this mouth end has been calibrated, ${centsWords(after)} after that`
    : `within ${centsWords(accuracyCents)}`;
  const parts = accuracy.map(({ part, cents, calibratedCents }) =>
    calibratedCents === undefined
      ? `${PARTS[part]} ${cents}`
      : `${PARTS[part]} ${cents}, calibrated ${calibratedCents}`,
  );
  return `Expect it ${within}${parts.length === 0 ? '' : ` (${parts.join('; ')})`}.`;
}

function centsWords(cents: number): string {
  const whole = Math.max(1, Math.round(cents));
  return whole === 1 ? '1 cent' : `${whole} cents`;
}
