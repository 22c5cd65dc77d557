import { describe, expect, it } from 'vitest';
import { accuracyWords } from './accuracy-words.ts';

describe('accuracyWords', () => {
  it('say what calibration narrows, and what the figure is made of', () => {
    const words = accuracyWords({
      accuracyCents: Math.hypot(0.6, 1, 8),
      calibratedAccuracyCents: Math.hypot(0.6, 1, 2),
      accuracy: [
        { part: 'bore-and-holes', cents: 0.6 },
        { part: 'losses', cents: 1 },
        { part: 'mouth-end', cents: 8, calibratedCents: 2 },
      ],
    });
    expect(words).toBe(
      'Expect it within 8 cents until this mouth end has been calibrated, 2 cents after that (bore and holes 0.6; wall losses 1; mouth end 8, calibrated 2).',
    );
  });

  it('promise nothing of calibration where there is no mouth end to calibrate', () => {
    expect(
      accuracyWords({
        accuracyCents: 0.6,
        calibratedAccuracyCents: 0.6,
        accuracy: [{ part: 'bore-and-holes', cents: 0.6 }],
      }),
    ).toBe('Expect it within 1 cent (bore and holes 0.6).');
  });

  it('say what is known of a prediction that was stored without its parts', () => {
    expect(accuracyWords({ accuracyCents: 8.2 })).toBe('Expect it within 8 cents.');
  });
});
