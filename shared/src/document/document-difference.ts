import { holeTitle } from './hole-labels.ts';
import type { DesignDocument } from './design-document.ts';

/** One value that differs between two documents. */
export interface DocumentDifference {
  /** Where, by keys; items that carry an id are named by it, so that a hole added above does not shift the rest. */
  path: string[];
  /** In a maker's words: `Hole 4 diameter`. */
  label: string;
  /** undefined: not there at all. */
  before: unknown;
  after: unknown;
}

type Json = null | string | number | boolean | Json[] | { [key: string]: Json };

const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
const hasId = (value: unknown): value is { id: string } => isObject(value) && typeof value.id === 'string';
const isKeyed = (value: unknown): value is { id: string }[] =>
  Array.isArray(value) && value.length > 0 && value.every(hasId);

/**
 * Every value that differs between two documents, in the order of the document.
 *
 * Holes and fingerings are matched by id and differ field by field; profiles and lists of covered holes differ as wholes.
 */
export function documentDifference(before: DesignDocument, after: DesignDocument): DocumentDifference[] {
  return compare(before, after, []).map(({ path, ...values }) => ({
    path,
    label: labelOf(path, before, after),
    ...values,
  }));
}

interface RawDifference {
  path: string[];
  before: unknown;
  after: unknown;
}

function compare(before: unknown, after: unknown, path: string[]): RawDifference[] {
  if (isSame(before, after)) return [];
  if (path[0] === 'mouthEnd' && kindChanged(before, after)) return [{ path, before, after }];
  if (isObject(before) && isObject(after)) {
    const keys = [...new Set([...Object.keys(before), ...Object.keys(after)])];
    return keys.flatMap((key) => compare(before[key], after[key], [...path, key]));
  }
  if (isKeyed(before) || isKeyed(after)) return compareKeyed(before, after, path);
  return [{ path, before, after }];
}

/** A mouth end of another kind shares no fields with the old one: it changes as a whole. */
function kindChanged(before: unknown, after: unknown): boolean {
  return isObject(before) && isObject(after) && before.kind !== after.kind;
}

function compareKeyed(before: unknown, after: unknown, path: string[]): RawDifference[] {
  const olds = isKeyed(before) ? before : [];
  const news = isKeyed(after) ? after : [];
  const ids = [...new Set([...olds, ...news].map((item) => item.id))];
  return ids.flatMap((id) => {
    const old = olds.find((item) => item.id === id);
    const now = news.find((item) => item.id === id);
    return compare(old, now, [...path, id]);
  });
}

function isSame(a: unknown, b: unknown): boolean {
  if (a === b) return true;
  if (Array.isArray(a) && Array.isArray(b)) {
    return a.length === b.length && a.every((item, index) => isSame(item, b[index]));
  }
  if (!isObject(a) || !isObject(b)) return false;
  const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
  return [...keys].every((key) => isSame(a[key], b[key]));
}

/**
 * The document with one difference taken over from another version of it.
 *
 * Used to merge field by field; the result is checked like any other document before it is saved.
 */
export function takeDifference(
  document: DesignDocument,
  { path, after }: DocumentDifference,
): DesignDocument {
  return setAt(document, path, after) as DesignDocument;
}

function setAt(target: unknown, path: readonly string[], value: unknown): unknown {
  const [key, ...rest] = path;
  if (key === undefined) return value;
  if (Array.isArray(target)) return setInList(target as Json[], key, (item) => setAt(item, rest, value));
  const object = isObject(target) ? target : {};
  const next = setAt(object[key], rest, value);
  if (next === undefined) return Object.fromEntries(Object.entries(object).filter(([name]) => name !== key));
  return { ...object, [key]: next };
}

function setInList(list: Json[], id: string, change: (item: unknown) => unknown): unknown[] {
  const at = list.findIndex((item) => hasId(item) && item.id === id);
  if (at < 0) return [...list, change(undefined)];
  const next = change(list[at]);
  return next === undefined ? list.toSpliced(at, 1) : list.with(at, next as Json);
}

const WORDS: Record<string, string> = {
  name: 'Name',
  a4Hz: 'A4',
  temperament: 'Temperament',
  tonic: 'Tonic',
  centsOffsets: 'Own cents',
  temperatureC: 'Air temperature',
  relativeHumidity: 'Humidity',
  co2Fraction: 'Carbon dioxide in the breath',
  pressurePa: 'Air pressure',
  mouthTemperatureC: 'Temperature at the mouth',
  warmLengthMm: 'Warm length',
  losses: 'Losses',
  fixed: 'Fixed air',
  mouthEnd: 'Mouth end',
  bore: 'Bore',
  outside: 'Outside',
  foot: 'Foot',
  kind: 'kind',
  stations: 'stations',
  positionMm: 'position',
  diameterMm: 'diameter',
  angleDeg: 'angle',
  chimneyMm: 'chimney',
  undercut: 'undercut',
  cover: 'cover',
  padHeightMm: 'pad height',
  hand: 'hand',
  lengthMm: 'length',
  widthMm: 'width',
  wallMm: 'wall',
  rampDeg: 'ramp',
  lipCover: 'lip cover',
  lipAngleDeg: 'lip angle',
  stopperMm: 'stopper',
  correctionScale: 'correction',
  equivalentVolumeMm3: 'equivalent volume',
  note: 'note',
  register: 'register',
  covered: 'covered holes',
  half: 'half-covered holes',
  weight: 'weight',
  centsOffset: 'offset',
};

const wordsFor = (keys: readonly string[]) => keys.map((key) => WORDS[key] ?? key).join(' ');

function labelOf(path: readonly string[], before: DesignDocument, after: DesignDocument): string {
  const [part = '', id = '', ...rest] = path;
  if (part === 'holes') return `${holeLabel(id, before, after)} ${wordsFor(rest)}`.trim();
  if (part === 'fingerings') return `${fingeringLabel(id, before, after)} ${wordsFor(rest)}`.trim();
  return wordsFor(part === 'pitch' || part === 'air' ? path.slice(1) : path);
}

function holeLabel(id: string, before: DesignDocument, after: DesignDocument): string {
  const has = after.holes.some((hole) => hole.id === id) ? after : before;
  return holeTitle(has, id);
}

function fingeringLabel(id: string, before: DesignDocument, after: DesignDocument): string {
  const fingering = [...after.fingerings, ...before.fingerings].find((item) => item.id === id);
  return fingering === undefined ? id : `${fingering.note}, register ${fingering.register}`;
}
