import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import type { Fingering } from '#shared/document/design-document.ts';
import { numberedHoles } from './bench-position.ts';
import type { SheetInput } from './sheet-input.ts';

/** A note as the chart writes it down. */
export interface ChartNote {
  note: string;
  /** What the scale asks for, Hz. */
  targetHz: number;
  /** null when no resonance answers; a notice says why. */
  cents: number | null;
}

/** One way of covering the holes, and the notes that it gives. */
export interface FingeringRow {
  fingering: Fingering;
  first: ChartNote;
  /** The same covering in registers 2 and 3, beside a plain note of register 1. */
  second: ChartNote | null;
  third: ChartNote | null;
  /** What is special about the covering; empty for plain ones. */
  words: string;
}

/** From low to high: plain notes with their upper registers first, then half-covered, cross and upper ones that stand alone. */
export function fingeringRows(input: SheetInput): FingeringRow[] {
  const { document } = input;
  const left = [...document.fingerings];
  const take = (matches: (fingering: Fingering) => boolean): Fingering | null => {
    const at = left.findIndex(matches);
    return at < 0 ? null : (left.splice(at, 1)[0] ?? null);
  };
  const plain = document.fingerings
    .filter((fingering) => fingering.register === 1 && specialWords(input, fingering) === '')
    .map((fingering) => {
      take((other) => other === fingering);
      return fingering;
    });
  const rows = plain.map((fingering) => {
    const upper = (register: number) => {
      const found = take((other) => other.register === register && coversTheSame(other, fingering));
      return found === null ? null : chartNote(input, found);
    };
    return {
      fingering,
      first: chartNote(input, fingering),
      second: upper(2),
      third: upper(3),
      words: '',
    };
  });
  const alone = left.map((fingering) => ({
    fingering,
    first: chartNote(input, fingering),
    second: null,
    third: null,
    words: aloneWords(input, fingering),
  }));
  const fromLow = (a: FingeringRow, b: FingeringRow) => a.first.targetHz - b.first.targetHz;
  return [...rows.sort(fromLow), ...alone.sort(fromLow)];
}

function chartNote(input: SheetInput, fingering: Fingering): ChartNote {
  const predicted = predictionOf(input, fingering.id);
  return {
    note: fingering.note,
    targetHz: predicted.targetHz,
    cents: predicted.centsFromScale,
  };
}

function predictionOf({ prediction }: SheetInput, id: string): FingeringPrediction {
  const found = prediction.fingerings.find((entry) => entry.id === id);
  if (found === undefined) throw new RangeError(`The prediction lacks fingering ${id}.`);
  return found;
}

function coversTheSame(a: Fingering, b: Fingering): boolean {
  return (
    a.half.length === 0 &&
    b.half.length === 0 &&
    a.covered.length === b.covered.length &&
    a.covered.every((hole) => b.covered.includes(hole))
  );
}

function aloneWords(input: SheetInput, fingering: Fingering): string {
  const special = specialWords(input, fingering);
  const register = fingering.register === 1 ? '' : `register ${fingering.register}`;
  return [register, special].filter((part) => part !== '').join(', ');
}

function specialWords(input: SheetInput, fingering: Fingering): string {
  const numbered = numberedHoles(input.document);
  if (fingering.half.length > 0) {
    const parts = fingering.half.map(({ hole, fraction, from }) => {
      const label = numbered.find((entry) => entry.hole.id === hole)?.label ?? hole;
      const share = fraction === 0.5 ? 'half-cover' : `cover ${Math.round(fraction * 100)} % of`;
      return `${share} hole ${label}${from === 'end' ? ' from the end' : ''}`;
    });
    return parts.join(', ');
  }
  const closable = numbered.filter(({ hole }) => hole.cover !== 'vent').map(({ hole }) => hole.id);
  const firstOpen = closable.findIndex((id) => !fingering.covered.includes(id));
  const isCrossed = firstOpen >= 0 && closable.slice(firstOpen).some((id) => fingering.covered.includes(id));
  return isCrossed ? 'cross fingering' : '';
}

/** Cents for each degree of the bore air: the middle one of all notes; null when none is known. */
export function centsPerDegree({ sensitivities }: SheetInput): number | null {
  const known = sensitivities.fingerings
    .flatMap(({ centsPerUnit }) => centsPerUnit['air.temperatureC'] ?? [])
    .sort((a, b) => a - b);
  return known[Math.floor((known.length - 1) / 2)] ?? null;
}

/** What a maker has to know about the figures, each said once with all the notes that it holds for. */
export function predictionNotices({ prediction }: SheetInput): string[] {
  const byMessage = new Map<string, string[]>();
  prediction.notices.forEach((notice) => byMessage.set(notice.message, []));
  for (const { note, notices } of prediction.fingerings) {
    for (const { message } of notices) {
      const notes = byMessage.get(message) ?? [];
      if (!notes.includes(note)) notes.push(note);
      byMessage.set(message, notes);
    }
  }
  return [...byMessage].map(([message, notes]) =>
    notes.length === 0 ? message : `${notes.join(', ')}: ${message}`,
  );
}
