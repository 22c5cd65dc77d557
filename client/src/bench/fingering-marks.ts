import type { Fingering, ToneHole } from '#shared/document/design-document.ts';

export type HoleMark = 'covered' | 'half' | 'open' | 'never';

/** What a fingering does with a hole; `never` for vents, which no finger reaches. */
export function holeMark(fingering: Fingering, hole: ToneHole): HoleMark {
  if (hole.cover === 'vent') return 'never';
  if (fingering.covered.includes(hole.id)) return 'covered';
  return fingering.half.some((half) => half.hole === hole.id) ? 'half' : 'open';
}

const SPOKEN: Record<HoleMark, string> = {
  covered: 'covered',
  half: 'half covered',
  open: 'open',
  never: 'never covered',
};

export const spokenMark = (mark: HoleMark): string => SPOKEN[mark];
