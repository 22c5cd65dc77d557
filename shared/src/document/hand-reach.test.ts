import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { HAND_REACH_MM, isBeyondReach } from './hand-reach.ts';

const [hole] = whistleDocument().holes;
const at = (byMm: number, change = {}) => ({ ...hole!, positionMm: hole!.positionMm + byMm, ...change });

describe('reach', () => {
  it.each(['small', 'middle', 'large'] as const)('of a %s hand ends where it says', (size) => {
    expect(isBeyondReach(hole!, at(HAND_REACH_MM[size]), size)).toBe(false);
    expect(isBeyondReach(hole!, at(HAND_REACH_MM[size] + 0.1), size)).toBe(true);
  });

  it('is nothing between two hands, nor to a hole that no finger covers', () => {
    const other = hole!.hand === 'left' ? 'right' : 'left';
    expect(isBeyondReach(hole!, at(90, { hand: other }), 'small')).toBe(false);
    expect(isBeyondReach(hole!, at(90, { cover: 'pad' }), 'small')).toBe(false);
    expect(isBeyondReach(hole!, at(90, { cover: 'thumb' }), 'small')).toBe(false);
  });
});
