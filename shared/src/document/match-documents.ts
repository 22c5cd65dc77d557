import { midiNumber, readNoteName } from '../music/note-name.ts';
import type { DesignDocument, Fingering, ToneHole } from './design-document.ts';
import { boreEnds } from './profile.ts';

/** One thing of both documents, or of one alone. */
export interface Pair<Thing> {
  a: Thing | null;
  b: Thing | null;
}

export interface DocumentMatch {
  /** In the order of the second document along its bore; what only the first has comes where it lies. */
  holes: Pair<ToneHole>[];
  /** In the order of the second document's chart; what only the first has comes last. */
  fingerings: Pair<Fingering>[];
  /** True when the two have no names in common, and holes were matched by where they lie. */
  isByPlace: boolean;
}

/** Which holes and fingerings of two documents are the same: by their ids where these agree, else by place, note and pattern. */
export function matchDocuments(a: DesignDocument, b: DesignDocument): DocumentMatch {
  const byId = holesById(a, b);
  const holes = byId ?? holesByPlace(a, b);
  const inB = new Map(
    holes.flatMap(({ a: one, b: other }): [string, string][] =>
      one === null || other === null ? [] : [[one.id, other.id]],
    ),
  );
  return { holes, fingerings: matchFingerings(a, b, inB), isByPlace: byId === null };
}

/** The second document with the ids of the first wherever the two have the same thing, so that the rest can be told apart. */
export function withIdsOf(b: DesignDocument, { holes, fingerings }: DocumentMatch): DesignDocument {
  const holeIds = renaming(holes);
  const fingeringIds = renaming(fingerings);
  const renamed = (ids: Map<string, string>, id: string) => ids.get(id) ?? id;
  return {
    ...b,
    holes: b.holes.map((hole) => ({ ...hole, id: renamed(holeIds, hole.id) })),
    fingerings: b.fingerings.map((fingering) => ({
      ...fingering,
      id: renamed(fingeringIds, fingering.id),
      covered: fingering.covered.map((id) => renamed(holeIds, id)),
      half: fingering.half.map((half) => ({ ...half, hole: renamed(holeIds, half.hole) })),
    })),
  };
}

function renaming(pairs: readonly Pair<{ id: string }>[]): Map<string, string> {
  const taken = new Set(pairs.flatMap(({ a }) => (a === null ? [] : [a.id])));
  return new Map(
    pairs.flatMap(({ a, b }): [string, string][] => {
      if (b === null) return [];
      return [[b.id, a?.id ?? freeId(b.id, taken)]];
    }),
  );
}

const LONGEST_ID = 40;

function freeId(id: string, taken: Set<string>): string {
  let free = id;
  for (let count = 2; taken.has(free); count += 1) free = `${id.slice(0, LONGEST_ID - 4)}-${count}`;
  taken.add(free);
  return free;
}

const alongBore = (holes: readonly ToneHole[]) =>
  holes.toSorted((one, other) => one.positionMm - other.positionMm);

/** null where ids say nothing: two kinds of instrument, fewer than half shared, or another order along the bore. */
function holesById(a: DesignDocument, b: DesignDocument): Pair<ToneHole>[] | null {
  const [ofA, ofB] = [alongBore(a.holes), alongBore(b.holes)];
  const idsOfB = new Set(ofB.map(({ id }) => id));
  const shared = ofA.filter(({ id }) => idsOfB.has(id)).map(({ id }) => id);
  const inB = ofB.map(({ id }) => id).filter((id) => shared.includes(id));
  const isSameOrder = shared.every((id, index) => inB[index] === id);
  const isSameKind = a.mouthEnd.kind === b.mouthEnd.kind;
  if (!isSameKind || !isSameOrder || shared.length * 2 < Math.min(ofA.length, ofB.length)) return null;
  const pairs = ofB.map((hole) => ({ a: ofA.find(({ id }) => id === hole.id) ?? null, b: hole }));
  const alone = ofA.filter(({ id }) => !idsOfB.has(id)).map((hole) => ({ a: hole, b: null }));
  return inPlace([...pairs, ...alone], a, b);
}

/** From the mouth end to the foot, each pair where it lies in the second, or else in the first. */
function inPlace(pairs: Pair<ToneHole>[], a: DesignDocument, b: DesignDocument): Pair<ToneHole>[] {
  const [footA, footB] = [boreEnds(a).footMm, boreEnds(b).footMm];
  const shareOf = (pair: Pair<ToneHole>) =>
    pair.b === null ? (pair.a?.positionMm ?? 0) / footA : pair.b.positionMm / footB;
  return pairs.sort((one, other) => shareOf(one) - shareOf(other));
}

/** What one hole too many costs against holes that lie apart by this share of the length. */
const ALONE_COST = 0.08;

type HoleClass = 'finger' | 'thumb' | 'vent';
const CLASSES: readonly HoleClass[] = ['finger', 'thumb', 'vent'];
const classOf = ({ cover }: ToneHole): HoleClass =>
  cover === 'thumb' || cover === 'vent' ? cover : 'finger';

function holesByPlace(a: DesignDocument, b: DesignDocument): Pair<ToneHole>[] {
  const [footA, footB] = [boreEnds(a).footMm, boreEnds(b).footMm];
  const distance = (one: ToneHole, other: ToneHole) =>
    Math.abs(one.positionMm / footA - other.positionMm / footB);
  const pairs = CLASSES.flatMap((kind) =>
    aligned(
      alongBore(a.holes.filter((hole) => classOf(hole) === kind)),
      alongBore(b.holes.filter((hole) => classOf(hole) === kind)),
      distance,
    ),
  );
  return inPlace(pairs, a, b);
}

interface Alignment {
  cost: number;
  pairs: Pair<ToneHole>[];
}

/** The pairing that keeps the order along the bore and lies closest, every hole left over at its cost. */
function aligned(
  a: readonly ToneHole[],
  b: readonly ToneHole[],
  distance: (one: ToneHole, other: ToneHole) => number,
): Pair<ToneHole>[] {
  const best: Alignment[][] = [];
  for (let i = 0; i <= a.length; i += 1) {
    const row: Alignment[] = [];
    for (let j = 0; j <= b.length; j += 1) {
      const [one, other] = [a[i - 1], b[j - 1]];
      const apart = one === undefined || other === undefined ? Infinity : distance(one, other);
      row.push(
        cheapest([
          extended(best[i - 1]?.[j], one, undefined, ALONE_COST),
          extended(row[j - 1], undefined, other, ALONE_COST),
          extended(best[i - 1]?.[j - 1], one, other, apart),
        ]),
      );
    }
    best.push(row);
  }
  return best.at(-1)?.at(-1)?.pairs ?? [];
}

const cheapest = (choices: readonly (Alignment | null)[]): Alignment =>
  choices.reduce<Alignment | null>(
    (least, choice) => (choice !== null && choice.cost < (least?.cost ?? Infinity) ? choice : least),
    null,
  ) ?? { cost: 0, pairs: [] };

function extended(
  from: Alignment | undefined,
  a: ToneHole | undefined,
  b: ToneHole | undefined,
  cost: number,
): Alignment | null {
  if (from === undefined || (a === undefined && b === undefined)) return null;
  return { cost: from.cost + cost, pairs: [...from.pairs, { a: a ?? null, b: b ?? null }] };
}

type Same = (one: Fingering, other: Fingering) => boolean;

function matchFingerings(
  a: DesignDocument,
  b: DesignDocument,
  inB: ReadonlyMap<string, string>,
): Pair<Fingering>[] {
  const usual = usualInterval(a, b);
  const isSame: readonly Same[] = [
    (one, other) => one.id === other.id && intervalOf(one, other) === usual,
    (one, other) => one.note === other.note && one.register === other.register,
    (one, other) => one.register === other.register && patternOf(one, inB) === patternOf(other),
  ];
  const left = new Set(a.fingerings);
  const found = new Map<Fingering, Fingering>();
  for (const same of isSame) {
    for (const other of b.fingerings) {
      if (found.has(other)) continue;
      const one = [...left].find((candidate) => same(candidate, other));
      if (one === undefined) continue;
      left.delete(one);
      found.set(other, one);
    }
  }
  return [
    ...b.fingerings.map((other) => ({ a: found.get(other) ?? null, b: other })),
    ...[...left].map((one) => ({ a: one, b: null })),
  ];
}

const midiOf = ({ note }: Fingering) => {
  const name = readNoteName(note);
  return name === null ? 0 : midiNumber(name);
};
const intervalOf = (one: Fingering, other: Fingering) => midiOf(other) - midiOf(one);

/** By how much the chart as a whole is transposed: what most fingerings of one name differ by. */
function usualInterval(a: DesignDocument, b: DesignDocument): number {
  const counts = new Map<number, number>();
  for (const other of b.fingerings) {
    const one = a.fingerings.find(({ id }) => id === other.id);
    if (one === undefined) continue;
    const interval = intervalOf(one, other);
    counts.set(interval, (counts.get(interval) ?? 0) + 1);
  }
  const [most = [0, 0]] = [...counts].sort((one, other) => other[1] - one[1]);
  return most[0];
}

function patternOf({ covered, half }: Fingering, names: ReadonlyMap<string, string> = new Map()): string {
  const name = (id: string) => names.get(id) ?? id;
  return JSON.stringify([covered.map(name).sort(), half.map(({ hole }) => name(hole)).sort()]);
}
