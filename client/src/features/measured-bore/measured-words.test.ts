import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { gapWords, movedCents, readingWords } from './measured-words.ts';

const fitted = {
  limitMm: 0.05,
  usualLimitMm: 0.05,
  leftOut: [],
  restored: [],
  outside: [],
  places: [],
  stations: [],
  outOfRound: null,
  refusal: null,
};

describe('what is said of a measured bore', () => {
  it('places a reading from the foot, in the unit at hand', () => {
    const reading = { positionMm: 145, diameterMm: 12.87 };
    expect(readingWords(whistleDocument(), reading, 'mm')).toBe('12.87 at 120.0 from the foot');
    expect(readingWords(whistleDocument(), reading, 'inch')).toBe('0.507 at 4.724 from the foot');
  });

  it.each([
    { gaps: [], beyond: 'held' as const, words: null },
    {
      gaps: [{ end: 'foot' as const, lengthMm: 5 }],
      beyond: 'held' as const,
      words: 'Nothing was measured over 5.0 at the foot. The nearest reading is held there.',
    },
    {
      gaps: [
        { end: 'mouth' as const, lengthMm: 104.4 },
        { end: 'foot' as const, lengthMm: 65 },
      ],
      beyond: 'drawn' as const,
      words:
        'Nothing was measured over 104.4 at the mouth end and 65.0 at the foot. The bore stays as drawn there.',
    },
  ])('says what stands where nothing was measured: $words', ({ gaps, beyond, words }) => {
    expect(gapWords({ ...fitted, gaps, beyond }, 'mm')).toBe(words);
  });

  it('moves no note that does not sound', () => {
    const move = { fingering: 'f', note: 'D5', register: 1, drawnCents: -2, measuredCents: 3.5 };
    expect(movedCents(move)).toBe(5.5);
    expect(movedCents({ ...move, measuredCents: null })).toBeNull();
  });
});
