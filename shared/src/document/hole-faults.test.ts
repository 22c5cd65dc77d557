import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { woodBetweenMm } from './hole-faults.ts';

describe('wood between two holes', () => {
  it('is measured at the bore wall, round the tube too', () => {
    const document = whistleDocument();
    const [a, b] = document.holes;
    expect(woodBetweenMm(document, a!, b!)).toBeCloseTo(21.9 - 7.75, 9);
    expect(woodBetweenMm(document, a!, { ...a!, angleDeg: 180 })).toBeCloseTo(Math.PI * 6.35 - 7, 9);
    expect(woodBetweenMm(document, { ...a!, angleDeg: 350 }, { ...a!, angleDeg: 10 })).toBeCloseTo(
      (6.35 * Math.PI) / 9 - 7,
      9,
    );
  });
});
