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

/**
 * How much more another rung may stand out before it takes a note over, dB. Both are our own judgement, held against what
 * the demo workshop's instruments do in hand: a reed follows whatever stands out most.
 */
const REED_LEAD_DB = 0.5;
const LOSSLESS_REED_LEAD_DB = 6;
/** Even where the jet passes over it, a rung this much stronger than the wanted one makes it hard to reach, dB. */
const JET_REACH_DB = 12;

/** Notices about one fingering: no resonance, a weak one, one that slips, formulas outside their range. */
export function fingeringNotices(facts: FingeringFacts): Notice[] {
  return [...speechNotices(facts), ...frequencyNotices(facts), ...halfCoverNotices(facts)];
}

function speechNotices(facts: FingeringFacts): Notice[] {
  const { playing, fingering } = facts;
  if (playing === null) {
    const lost = facts.states.some(({ kind }) => kind !== 'closed')
      ? 'above the cutoff the open holes let it through'
      : 'walls and ends take all of it';
    return [
      {
        code: 'no-resonance',
        message: `No resonance answers for register ${fingering.register} of this fingering: ${lost}. It would not speak.`,
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
  const rival = strongestRival(facts, playing);
  if (rival !== null) notices.push(slipNotice(playing, rival));
  return notices;
}

function slipNotice(playing: Resonance, rival: Resonance): Notice {
  const advice =
    rival.frequency < playing.frequency
      ? `It may need firmer blowing, or slip there; a vent that weakens rung ${rival.order} helps it to speak.`
      : 'It may need gentler blowing, or jump there.';
  return {
    code: 'register-slips',
    message: `Rung ${playing.order} is much weaker than rung ${rival.order} at ${rival.frequency.toFixed(0)} Hz. ${advice}`,
  };
}

function strongestRival(facts: FingeringFacts, playing: Resonance): Resonance | null {
  const { resonances, maxima } = facts;
  const height = resonanceHeight(playing, maxima);
  let strongest: Resonance | null = null;
  let most = 0;
  for (const rival of resonances) {
    if (rival.order === playing.order || rival.weak) continue;
    const lead = 20 * Math.log10(resonanceHeight(rival, maxima) / height);
    const excess = lead - allowedLead(facts, playing, rival);
    if (excess <= most) continue;
    strongest = rival;
    most = excess;
  }
  return strongest;
}

function allowedLead({ maxima, document }: FingeringFacts, playing: Resonance, rival: Resonance): number {
  const { losses } = document.air;
  // Without losses only radiation damps, and every rung is weaker than the one below as the square of its frequency.
  const lossless = losses ? 0 : Math.max(40 * Math.log10(playing.frequency / rival.frequency), 0);
  if (maxima) return lossless + (losses ? REED_LEAD_DB : LOSSLESS_REED_LEAD_DB);
  const drive = jetDrive(rival.frequency / playing.frequency);
  return lossless + Math.min(drive > 0 ? -20 * Math.log10(drive) : Infinity, JET_REACH_DB);
}

/**
 * How strongly a jet blown for one note drives another frequency, as a share: it works on a rung while a disturbance takes
 * between a quarter and three quarters of its period to cross the mouth, most at one half. An octave apart it does nothing,
 * which is why flutes overblow at the octave although the lower rung stands out more.
 */
function jetDrive(frequencyRatio: number): number {
  return frequencyRatio > 0.5 && frequencyRatio < 1.5 ? -Math.cos(Math.PI * frequencyRatio) : 0;
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
