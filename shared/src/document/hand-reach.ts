import type { ToneHole } from './design-document.ts';

/** Hands as makers speak of them. */
export type HandSize = 'small' | 'middle' | 'large';

/** From the middle of one hole to the next under neighbouring fingers, without strain, mm. Common practice. */
export const HAND_REACH_MM: Record<HandSize, number> = { small: 31, middle: 36, large: 41 };

/** True where two neighbouring fingers of one hand would have to stretch: between two hands nothing limits. */
export function isBeyondReach(hole: ToneHole, next: ToneHole, size: HandSize): boolean {
  const isFingered = [hole, next].every(({ cover }) => cover === 'finger');
  return isFingered && hole.hand === next.hand && next.positionMm - hole.positionMm > HAND_REACH_MM[size];
}
