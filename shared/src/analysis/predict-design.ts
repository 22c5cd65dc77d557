import { findResonances, type Resonance } from '../acoustics/response/resonances.ts';
import type { DesignDocument, Fingering } from '../document/design-document.ts';
import { beatsBetween, centsBetween, frequencyAbove } from '../music/cents.ts';
import { noteFrequencyHz } from '../music/temperament.ts';
import { accuracyParts, calibratedAccuracyCents, expectedAccuracyCents } from './expected-accuracy.ts';
import { fingeringNotices } from './fingering-notices.ts';
import { designNotices } from './notices.ts';
import { ENGINE } from './engine-version.ts';
import { ladderMultiples, playingResonance, ventCount } from './playing-mode.ts';
import { ladderOf } from './ladder.ts';
import { openHoleCutoffHz } from './open-hole-cutoff.ts';
import type { DesignPrediction, FingeringPrediction } from './prediction.ts';
import { prepareDesign, type PreparedDesign } from './prepare-design.ts';
import type { DesignColumn } from './to-column.ts';

/** Modes of a ladder when nothing else is asked for. */
const LADDER_MODES = 6;

export interface PredictionOptions {
  /** Rungs of each ladder, 1–24. */
  modes?: number;
  /** False: openings do not hear each other; for comparison only. */
  coupling?: boolean;
}

/**
 * Everything the engine says about a design: for every fingering its pitch, ladder, cutoff and accuracy.
 *
 * The document must have passed `readDocument`. Throws `EngineInputError`, with the document's field, on what no formula
 * answers.
 */
export function predictDesign(document: DesignDocument, options: PredictionOptions = {}): DesignPrediction {
  return predictPrepared(document, prepareDesign(document), options);
}

/** The same for a design that is prepared already. */
export function predictPrepared(
  document: DesignDocument,
  { design, prepared, fingerings }: PreparedDesign,
  { modes = LADDER_MODES, coupling = true }: PredictionOptions,
): DesignPrediction {
  const maxima = prepared.playsMaxima;
  const highest = Math.max(...document.fingerings.map((fingering) => fingering.register), 1);
  const count = Math.max(modes, highest + 1);
  const resonances = findResonances(prepared, fingerings, { count, coupling, maxima });
  const notices = designNotices(document);
  const unusualUndercuts = new Set(
    notices.filter(({ code }) => code === 'undercut-outside-formula').map(({ hole }) => hole ?? ''),
  );
  const hasUnevenHoles = notices.some(({ code }) => code === 'hole-over-bore-change');
  return {
    engine: ENGINE,
    notices,
    fingerings: document.fingerings.map((fingering, i) =>
      predictFingering(
        { document, design, fingering, index: i, maxima, modes, unusualUndercuts, hasUnevenHoles },
        resonances[i] ?? [],
      ),
    ),
  };
}

interface FingeringQuestion {
  document: DesignDocument;
  design: DesignColumn;
  fingering: Fingering;
  index: number;
  maxima: boolean;
  modes: number;
  unusualUndercuts: ReadonlySet<string>;
  hasUnevenHoles: boolean;
}

function predictFingering(
  question: FingeringQuestion,
  resonances: readonly Resonance[],
): FingeringPrediction {
  const { document, design, fingering, index, maxima, modes, unusualUndercuts, hasUnevenHoles } = question;
  const states = design.states[index] ?? [];
  const targetHz = targetFrequencyHz(document, fingering);
  const multiples = ladderMultiples(design.column, states, maxima);
  const playing = playingResonance({
    resonances,
    maxima,
    register: fingering.register,
    vents: ventCount(states),
    targetHz,
  });
  const vent = design.holes[states.findIndex((state) => state.kind !== 'closed')];
  const frequencyHz = playing?.frequency ?? null;
  const accuracy = accuracyParts({
    document,
    design,
    states,
    register: fingering.register,
    unusualUndercuts,
    hasUnevenHoles,
  });
  return {
    id: fingering.id,
    note: fingering.note,
    register: fingering.register,
    targetHz,
    frequencyHz,
    centsFromScale: frequencyHz === null ? null : centsBetween(frequencyHz, targetHz),
    beatsHz: frequencyHz === null ? null : beatsBetween(frequencyHz, targetHz),
    mode: playing?.order ?? null,
    ladder: ladderOf(resonances.slice(0, modes), maxima, multiples),
    ventHole: vent?.id ?? null,
    cutoffHz: openHoleCutoffHz(design.column, states),
    accuracyCents: expectedAccuracyCents(accuracy),
    calibratedAccuracyCents: calibratedAccuracyCents(accuracy),
    accuracy,
    notices: fingeringNotices({ document, design, fingering, states, resonances, playing, maxima }),
  };
}

/** What the scale asks of a fingering, Hz. */
export function targetFrequencyHz(document: DesignDocument, fingering: Fingering): number {
  return frequencyAbove(noteFrequencyHz(fingering.note, document.pitch), fingering.centsOffset);
}
