import { TONE_HOLE_RANGE } from '../acoustics/tone-hole/tone-hole-range.ts';
import { HALF_COVERED_RANGE } from '../acoustics/tone-hole/half-covered.ts';
import type { HoleState } from '../acoustics/response/column.ts';
import type { Resonance } from '../acoustics/response/resonances.ts';
import type { DesignDocument, Fingering } from '../document/design-document.ts';
import { resonanceHeight } from './ladder.ts';
import type { Notice } from './prediction.ts';
import { isOutside } from './range.ts';
import { holeTitle } from '../document/hole-labels.ts';
import { holeMeasures } from './hole-notices.ts';
import type { DesignColumn } from './to-column.ts';
import { titleInSentence } from '../document/title-in-sentence.ts';

export interface FingeringFacts {
  document: DesignDocument;
  design: DesignColumn;
  fingering: Fingering;
  states: readonly HoleState[];
  resonances: readonly Resonance[];
  playing: Resonance | null;
  maxima: boolean;
}

/** A jet holds its register by its speed, so a neighbour must stand out by so much more to take the note over, dB. */
const JET_HOLD_DB = 6;

/** Notices about one fingering: no resonance, a weak one, one that slips, formulas outside their range. */
export function fingeringNotices(facts: FingeringFacts): Notice[] {
  return [...speechNotices(facts), ...frequencyNotices(facts), ...halfCoverNotices(facts)];
}

function speechNotices(facts: FingeringFacts): Notice[] {
  const { playing, fingering } = facts;
  if (playing === null) {
    return [
      {
        code: 'no-resonance',
        message: `No resonance answers for register ${fingering.register} of this fingering: above the cutoff the open holes let it through. It would not speak.`,
      },
    ];
  }
  const notices: Notice[] = [];
  if (playing.order !== fingering.register) {
    notices.push({
      code: 'other-rung-plays',
      message: `With its vent open this fingering sounds on rung ${playing.order}, which stands out more than rung ${fingering.register} and lies nearer to the note.`,
    });
  }
  if (playing.weak) {
    notices.push({
      code: 'weak-resonance',
      message:
        'The resonance lies above the cutoff of the open holes and is weak. It is no use as a note; take its pitch as a hint.',
    });
    return notices;
  }
  const stronger = strongerNeighbour(facts, playing);
  if (stronger !== null) {
    notices.push({
      code: 'register-slips',
      message: `Rung ${playing.order} is much weaker than rung ${stronger.order} at ${stronger.frequency.toFixed(0)} Hz. It may need firmer blowing, or slip there; a vent that weakens rung ${stronger.order} helps it to speak.`,
    });
  }
  return notices;
}

function strongerNeighbour(facts: FingeringFacts, playing: Resonance): Resonance | null {
  const { resonances, maxima } = facts;
  const height = resonanceHeight(playing, maxima);
  for (const order of [playing.order - 1, playing.order + 1]) {
    const neighbour = resonances.find((resonance) => resonance.order === order);
    if (neighbour === undefined) continue;
    const lead = 20 * Math.log10(resonanceHeight(neighbour, maxima) / height);
    if (lead > allowedLead(facts, playing, neighbour)) return neighbour;
  }
  return null;
}

/** How much stronger a neighbour may be, dB: a reed follows the strongest, a jet is held by the blowing. */
function allowedLead({ maxima, document }: FingeringFacts, playing: Resonance, neighbour: Resonance): number {
  // Without losses only radiation damps, and every rung is weaker than the one below as the square of its frequency.
  const lossless = document.air.losses ? 0 : 40 * Math.log10(playing.frequency / neighbour.frequency);
  return Math.max(lossless, 0) + (maxima && document.air.losses ? 0.5 : JET_HOLD_DB);
}

function frequencyNotices({ design, playing, states }: FingeringFacts): Notice[] {
  if (playing === null) return [];
  const open = design.column.holes.filter((_, i) => states[i]?.kind !== 'closed');
  const radius = Math.max(0, ...open.map((hole) => hole.boreRadius));
  const ka = ((2 * Math.PI * playing.frequency) / design.column.outside.speedOfSound) * radius;
  if (ka <= TONE_HOLE_RANGE.boreWavenumber.unreliableAbove) return [];
  return [
    {
      code: 'frequency-above-formula',
      message: `At ${playing.frequency.toFixed(0)} Hz the bore is wide against the wavelength, and the tone-hole formulas lose hold. Expect errors of several cents.`,
    },
  ];
}

function halfCoverNotices({ document, design, states }: FingeringFacts): Notice[] {
  return states.flatMap((state, i): Notice[] => {
    const hole = design.holes[i];
    if (state.kind !== 'half' || hole === undefined) return [];
    const title = titleInSentence(holeTitle(document, hole.id));
    const { radius, outer, chimney } = holeMeasures(document, hole);
    const notices: Notice[] = [];
    if (state.from === 'end') {
      notices.push({
        code: 'half-cover-from-foot-end',
        message: `The finger on ${title} is taken to cover it from the foot end, leaving the mouth side open.`,
        hole: hole.id,
      });
    }
    const outside =
      isOutside(state.fraction, HALF_COVERED_RANGE.fraction) ||
      isOutside(chimney / radius, HALF_COVERED_RANGE.chimneyRatio) ||
      isOutside(radius / outer, HALF_COVERED_RANGE.outerRatio);
    if (outside) {
      notices.push({
        code: 'half-cover-outside-formula',
        message: `How ${title} is half-covered lies outside what was studied (0.1 to 0.9 of the hole). The note may be off by several cents.`,
        hole: hole.id,
      });
    }
    return notices;
  });
}
