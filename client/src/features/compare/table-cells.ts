import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import { woodBetweenMm } from '#shared/document/hole-faults.ts';
import type { Pair } from '#shared/document/match-documents.ts';
import { boreEnds, chimneyMm, diameterAt, fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { formatCents } from '#shared/music/cents.ts';
import { hungNotes } from '../../bench/hung-notes.ts';
import type { Comparison } from './comparison.ts';
import { noteRows } from './note-rows.ts';

/** A figure and what it was; `was` is null where nothing changed or nothing was there. */
export interface ComparedFigure {
  was: string | null;
  now: string;
  /** Worth the eye: it moved the pitch by more than half a cent. */
  isStrong?: boolean;
}

export interface ComparedRow {
  key: string;
  label: string;
  unit: string;
  /** Between a column and the next. */
  isBetween: boolean;
  /** By column key: hole ids of the second instrument, and `foot`. */
  figures: ReadonlyMap<string, ComparedFigure>;
}

/** Sizes of every hole of the second instrument with what they were in the first, and how far its notes moved. */
export function comparedRows(comparison: Comparison, unit: LengthUnit): ComparedRow[] {
  const print = (mm: number) => printLength(mm, unit);
  return [
    ...sizeRows(comparison, unit, print),
    ...betweenRows(comparison, unit, print),
    ...movedRows(comparison),
  ];
}

type Print = (mm: number) => string;
type Size = (document: DesignDocument, hole: ToneHole) => string;

export function figure(was: string | null, now: string): ComparedFigure {
  return { was: was === now ? null : was, now };
}

function sizeRows(comparison: Comparison, unit: LengthUnit, print: Print): ComparedRow[] {
  const { a, b } = comparison;
  const footWidth = ({ bore }: DesignDocument) => print(diameterAt(bore.stations, boreEnds({ bore }).footMm));
  const row = (key: string, label: string, size: Size, foot?: ComparedFigure): ComparedRow => ({
    key,
    label,
    unit,
    isBetween: false,
    figures: new Map([
      ...holeFigures(comparison, size),
      ...(foot === undefined ? [] : [['foot', foot] as const]),
    ]),
  });
  return [
    row('position', 'From foot', (document, { positionMm }) => print(fromFootMm(document, positionMm)), {
      was: null,
      now: print(0),
    }),
    row(
      'diameter',
      'Diameter',
      (_, { diameterMm }) => print(diameterMm),
      figure(footWidth(a.document), footWidth(b.document)),
    ),
    row('chimney', 'Chimney', (document, hole) => print(chimneyMm(document, hole))),
    row('undercut', 'Undercut to', (_, { undercut }) =>
      undercut === null ? '–' : print(undercut.innerDiameterMm),
    ),
  ];
}

function holeFigures({ a, b, match }: Comparison, size: Size): [string, ComparedFigure][] {
  return match.holes.flatMap((pair): [string, ComparedFigure][] => {
    if (pair.b === null) return [];
    const was = pair.a === null ? null : size(a.document, pair.a);
    return [[pair.b.id, figure(was, size(b.document, pair.b))]];
  });
}

function betweenRows(comparison: Comparison, unit: LengthUnit, print: Print): ComparedRow[] {
  const reach = (_: DesignDocument, one: ToneHole, next: ToneHole) =>
    print(Math.abs(next.positionMm - one.positionMm));
  const wall = (document: DesignDocument, one: ToneHole, next: ToneHole) =>
    print(woodBetweenMm(document, one, next));
  return [
    { key: 'reach', label: 'Reach to next', size: reach },
    { key: 'wall', label: 'Wall to next', size: wall },
  ].map(({ key, label, size }) => ({
    key,
    label,
    unit,
    isBetween: true,
    figures: new Map(neighbours(comparison, size)),
  }));
}

type BetweenSize = (document: DesignDocument, one: ToneHole, next: ToneHole) => string;

function neighbours({ a, b, match }: Comparison, size: BetweenSize): [string, ComparedFigure][] {
  const inB = match.holes.filter(({ b: hole }) => hole !== null);
  return inB.slice(1).flatMap((next, index): [string, ComparedFigure][] => {
    const one: Pair<ToneHole> | undefined = inB[index];
    if (one?.b === undefined || one.b === null || next.b === null) return [];
    const was = one.a === null || next.a === null ? null : size(a.document, one.a, next.a);
    return [[one.b.id, figure(was, size(b.document, one.b, next.b))]];
  });
}

/** Above this a note has moved, cents. */
const MOVED_CENTS = 1;

function movedRows(comparison: Comparison): ComparedRow[] {
  const { b } = comparison;
  const moved = new Map(noteRows(comparison).map(({ key, movedCents }) => [key, movedCents]));
  const hung = hungNotes(b.document, b.prediction).filter(({ row }) => row === 'register');
  const registers = [...new Set(hung.map(({ fingering }) => fingering.register))].sort(
    (one, other) => one - other,
  );
  return registers.map((register) => ({
    key: `moves-${register}`,
    label: `Moves register ${register}`,
    unit: 'cents',
    isBetween: false,
    figures: new Map(
      hung.flatMap(({ column, fingering }): [string, ComparedFigure][] => {
        const cents = moved.get(fingering.id) ?? null;
        if (fingering.register !== register || cents === null) return [];
        return [[column, { was: null, now: formatCents(cents), isStrong: Math.abs(cents) >= MOVED_CENTS }]];
      }),
    ),
  }));
}
