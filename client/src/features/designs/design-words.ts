import type { DesignSummary } from '#shared/contract/designs.ts';

type Kind = DesignSummary['kind'];

const KIND_WORDS: Record<Kind, string> = {
  window: 'fipple whistle',
  embouchure: 'transverse flute',
  rim: 'end-blown flute',
  reed: 'reed pipe',
  'ideal-open': 'ideal open column',
  'ideal-closed': 'ideal closed column',
};

const NUMBER_WORDS = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine', 'Ten'];

/** "Six-hole fipple whistle", under a design's name. */
export function describeDesign({ kind, outline }: Pick<DesignSummary, 'kind' | 'outline'>): string {
  const count = outline.holes.length;
  const word = KIND_WORDS[kind];
  if (count === 0) return `${word.charAt(0).toUpperCase()}${word.slice(1)}, no holes yet`;
  return `${NUMBER_WORDS[count] ?? String(count)}-hole ${word}`;
}

export const TEMPERAMENT_WORDS: Record<string, string> = {
  equal: 'equal',
  just: 'just',
  pythagorean: 'Pythagorean',
  'quarter-comma-meantone': 'meantone',
  own: 'own cents',
};
