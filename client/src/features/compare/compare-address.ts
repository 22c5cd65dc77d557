import type { LaidAt } from './comparison.ts';
import type { TransformOrder } from '#shared/transform/transform-design.ts';

/** What can be laid on the bench to be compared. Revisions will be named beside the design. */
export interface CompareSource {
  designId: number;
}

const DESIGN = /^[1-9]\d{0,9}$/;

/** Reads one side of the address; null where it names nothing that can be compared. */
export function readSource(text: string | undefined): CompareSource | null {
  return text !== undefined && DESIGN.test(text) ? { designId: Number(text) } : null;
}

/** How the two are looked at: what the address says after its question mark. */
export interface CompareTerms {
  /** The lowest note wanted; null as it is. */
  key: string | null;
  a4Hz: number | null;
  bore: TransformOrder['bore'];
  holeSizes: TransformOrder['holeSizes'];
  /** Temperature that each is looked at; null its own. */
  airA: number | null;
  airB: number | null;
  /** Where the two are laid together; null as suits them. */
  laidAt: LaidAt | null;
}

const NOTE = /^[A-G](#|b)?\d$/;
const LIMITS = { a4: { least: 300, most: 600 }, air: { least: 0, most: 40 } } as const;

/** Whatever makes no sense is left as it is: an old link still opens. */
export function readTerms(search: URLSearchParams): CompareTerms {
  const key = search.get('key');
  const at = search.get('at');
  return {
    key: key !== null && NOTE.test(key) ? key : null,
    a4Hz: readFigure(search.get('a4'), LIMITS.a4),
    bore: search.get('bore') === 'kept' ? 'kept' : 'scaled',
    holeSizes: search.get('drills') === 'nearest' ? 'nearest-drill' : 'exact',
    airA: readFigure(search.get('airA'), LIMITS.air),
    airB: readFigure(search.get('airB'), LIMITS.air),
    laidAt: at === 'mouth' || at === 'foot' ? at : null,
  };
}

function readFigure(text: string | null, { least, most }: { least: number; most: number }): number | null {
  if (text === null || text.trim() === '') return null;
  const value = Number(text);
  return Number.isFinite(value) && value >= least && value <= most ? value : null;
}

/** The same search with other terms; what is usual is left out, and whatever else stood there stays. */
export function writeTerms(search: URLSearchParams, change: Partial<CompareTerms>): URLSearchParams {
  const next = new URLSearchParams(search);
  const terms = { ...readTerms(search), ...change };
  put(next, 'key', terms.key);
  put(next, 'a4', terms.a4Hz);
  put(next, 'bore', terms.bore === 'kept' ? 'kept' : null);
  put(next, 'drills', terms.holeSizes === 'nearest-drill' ? 'nearest' : null);
  put(next, 'airA', terms.airA);
  put(next, 'airB', terms.airB);
  put(next, 'at', terms.laidAt);
  return next;
}

function put(search: URLSearchParams, key: string, value: string | number | null): void {
  if (value === null) search.delete(key);
  else search.set(key, String(value));
}
