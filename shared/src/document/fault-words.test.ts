import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { documentFaults } from './document-faults.ts';
import { wordsFromFoot } from './fault-words.ts';

describe('figures for the bench', () => {
  it.each([
    ['mm', 'Place it between 4.3 and 257.4 from the foot.'],
    ['inch', 'Place it between 0.169 in and 10.134 in from the foot.'],
  ] as const)('count from the foot, in %s', (unit, words) => {
    const document = whistleDocument();
    document.holes[1]!.positionMm = 400;
    expect(documentFaults(document, wordsFromFoot(unit))[0]?.message).toContain(words);
  });
});
