import type { DesignDocument } from '#shared/document/design-document.ts';
import { documentDifference, type DocumentDifference } from '#shared/document/document-difference.ts';
import { withIdsOf, type Pair } from '#shared/document/match-documents.ts';
import { boreEnds, fromFootMm } from '#shared/document/profile.ts';
import type { ToneHole } from '#shared/document/design-document.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { formatCents } from '#shared/music/cents.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import { hungNotes } from '../../bench/hung-notes.ts';
import { valueWords } from '../../bench/value-words.ts';
import { borePlaces, furthestPlace } from './bore-difference.ts';
import type { Comparison } from './comparison.ts';
import { holeChangeWords, isSameLength } from './hole-changes.ts';
import { noteRows } from './note-rows.ts';

/** One thing that differs, told in a sentence. */
export interface Change {
  key: string;
  title: string;
  words: string;
  /** The hole of the second instrument that it is about. */
  hole: string | null;
  /** What became of the note that hangs there: `G5 0.0 to −2.1`; empty where nothing is known. */
  pitch: string;
  part: 'hole' | 'other';
  /** What has to be taken over from the second to make the first like it; ids are those of the first. */
  differences: DocumentDifference[];
}

/** Everything in which the second instrument differs from the first, holes first, in the order of the bore. */
export function compareChanges(comparison: Comparison, unit: LengthUnit): Change[] {
  const { a, b, match } = comparison;
  const differences = documentDifference(a.document, withIdsOf(b.document, match)).filter(
    ({ path }) => path[0] !== 'name',
  );
  const of = (part: string) => differences.filter(({ path }) => path[0] === part);
  return [
    ...holeChanges(comparison, of('holes'), unit),
    ...profileChanges(comparison, differences, unit),
    ...['mouthEnd', 'foot', 'pitch', 'air'].flatMap((part) =>
      of(part).map((difference) => valueChange(difference, comparison, unit)),
    ),
    ...chartChanges(comparison, of('fingerings')),
  ];
}

function holeChanges(
  comparison: Comparison,
  differences: readonly DocumentDifference[],
  unit: LengthUnit,
): Change[] {
  const { a, b, match } = comparison;
  const titles = titlesOf(b.document);
  const titlesInA = titlesOf(a.document);
  const pitches = pitchByHole(comparison);
  return match.holes.flatMap((pair, index): Change[] => {
    const words = pairWords(pair, comparison, unit);
    if (words === '') return [];
    const [idInA, idInB] = [pair.a?.id ?? '', pair.b?.id ?? ''];
    return [
      {
        key: `hole-${index}`,
        title: titles.get(idInB) ?? titlesInA.get(idInA) ?? '',
        words,
        hole: pair.b === null ? null : idInB,
        pitch: pitches.get(idInB) ?? '',
        part: 'hole',
        differences: differences.filter(({ path }) => path[1] === (pair.a === null ? idInB : idInA)),
      },
    ];
  });
}

const titlesOf = (document: DesignDocument) =>
  new Map(labelledHoles(document).map(({ hole, title }) => [hole.id, title]));

function pairWords(
  pair: Pair<ToneHole>,
  { a: { document: a }, b: { document: b }, offsetMm }: Comparison,
  unit: LengthUnit,
): string {
  if (pair.a !== null && pair.b !== null) {
    return holeChangeWords({ document: a, hole: pair.a, offsetMm }, { document: b, hole: pair.b }, unit);
  }
  const [hole, document] = pair.b === null ? [pair.a, a] : [pair.b, b];
  if (hole === null) return '';
  const size = `${printLength(hole.diameterMm, unit)} ${unit === 'mm' ? 'mm' : 'in'}`;
  const place = `${printLength(fromFootMm(document, hole.positionMm), unit)} from foot`;
  return pair.b === null ? `gone; was ${size}, ${place}` : `new: ${size}, ${place}`;
}

/** The note of register 1 that hangs under each hole of the second, and where it hung in the first. */
function pitchByHole(comparison: Comparison): Map<string, string> {
  const { b } = comparison;
  const rows = new Map(noteRows(comparison).map((row) => [row.key, row]));
  const hung = hungNotes(b.document, b.prediction).filter(
    ({ row, fingering }) => row === 'register' && fingering.register === 1,
  );
  return new Map(
    hung.flatMap(({ column, fingering }): [string, string][] => {
      const row = rows.get(fingering.id);
      if (row?.movedCents === undefined || row.movedCents === null) return [];
      const [from, to] = [row.a?.cents ?? 0, row.b?.cents ?? 0];
      return [[column, `${fingering.note} ${formatCents(from)} to ${formatCents(to)}`]];
    }),
  );
}

function profileChanges(
  comparison: Comparison,
  differences: readonly DocumentDifference[],
  unit: LengthUnit,
): Change[] {
  const of = (part: string) => differences.filter(({ path }) => path[0] === part);
  const base = { hole: null, pitch: '', part: 'other' as const };
  return [
    ...(of('bore').length === 0
      ? []
      : [
          {
            ...base,
            key: 'bore',
            title: 'Bore',
            words: boreWords(comparison, unit),
            differences: of('bore'),
          },
        ]),
    ...(of('outside').length === 0
      ? []
      : [
          {
            ...base,
            key: 'outside',
            title: 'Outside',
            words: 'of another shape',
            differences: of('outside'),
          },
        ]),
  ];
}

function boreWords(
  { a: { document: a }, b: { document: b }, offsetMm }: Comparison,
  unit: LengthUnit,
): string {
  const size = (mm: number, digits?: number) =>
    `${printLength(mm, unit, digits)} ${unit === 'mm' ? 'mm' : 'in'}`;
  const [footA, footB] = [boreEnds(a).footMm, boreEnds(b).footMm];
  const longer = isSameLength(footA, footB)
    ? []
    : [`${size(Math.abs(footB - footA))} ${footB > footA ? 'longer' : 'shorter'}`];
  const furthest = furthestPlace(borePlaces(a, b, offsetMm));
  const digits = unit === 'mm' ? 2 : 4;
  const wider =
    furthest === null
      ? []
      : [
          `${size(Math.abs(furthest.widerMm), digits)} ${furthest.widerMm > 0 ? 'wider' : 'narrower'} at most, ${printLength(fromFootMm(b, furthest.positionMm), unit)} from foot`,
        ];
  return [...longer, ...wider].join(', ') || 'measured at other places';
}

function valueChange(
  { label, path, before, after }: DocumentDifference,
  { a, b }: Comparison,
  unit: LengthUnit,
): Change {
  const key = path.at(-1) ?? '';
  const [from, to] = [
    valueWords(before, key, { document: a.document, unit }),
    valueWords(after, key, { document: b.document, unit }),
  ];
  return {
    key: path.join('.'),
    title: label,
    words: `${from} to ${to}`,
    hole: null,
    pitch: '',
    part: 'other',
    differences: [{ label, path, before, after }],
  };
}

/** Fingerings that differ, in one row: charts are long, and the table of notes tells them one by one. */
function chartChanges({ match }: Comparison, differences: readonly DocumentDifference[]): Change[] {
  const ids = new Set(differences.map(({ path }) => path[1]));
  if (ids.size === 0) return [];
  const alone = match.fingerings.filter(({ a, b }) => a === null || b === null).length;
  const words = [
    ids.size === 1 ? '1 fingering differs' : `${ids.size} fingerings differ`,
    ...(alone === 0 ? [] : [alone === 1 ? '1 has no fellow' : `${alone} have no fellow`]),
  ].join(', ');
  return [
    {
      key: 'chart',
      title: 'Chart',
      words,
      hole: null,
      pitch: '',
      part: 'other',
      differences: [...differences],
    },
  ];
}

/** `bore, window and chart the same`: the parts that do not differ; empty where all do. */
export function sameWords(changes: readonly Change[]): string {
  const touched = new Set(changes.flatMap(({ differences }) => differences.map(({ path }) => path[0])));
  const same = [
    ['bore', 'bore'],
    ['mouthEnd', 'mouth end'],
    ['fingerings', 'chart'],
  ].flatMap(([part = '', word = '']) => (touched.has(part) ? [] : [word]));
  if (same.length === 0) return '';
  const last = same.at(-1) ?? '';
  return same.length === 1 ? `${last} the same` : `${same.slice(0, -1).join(', ')} and ${last} the same`;
}
