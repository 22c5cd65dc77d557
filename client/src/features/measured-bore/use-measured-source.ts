import { useState } from 'react';
import type { FitChoices } from '#shared/measured-bore/fit-stations.ts';
import type { MeasurementColumn } from '#shared/measured-bore/measurement-columns.ts';
import type { MeaningChoices } from '#shared/measured-bore/read-measured-bore.ts';
import { useSession } from '../../lib/session.ts';
import {
  keepMeasuredCopy,
  NO_SOURCE,
  NOTHING_SAID,
  readMeasuredCopy,
  type MeasuredSource,
} from './measured-copy.ts';

export interface SourceDesk {
  source: MeasuredSource;
  /** False where the browser keeps nothing: then a reload loses the table. */
  isKept: boolean;
  /** Another table: what was said of the last one does not hold for it. */
  readIn: (text: string, fileName: string | null) => void;
  /** The same table, mended by hand. */
  retype: (text: string) => void;
  clear: () => void;
  mean: (change: Partial<MeaningChoices>) => void;
  meanColumn: (index: number, change: Partial<Pick<MeasurementColumn, 'kind' | 'unit'>>) => void;
  fit: (change: Partial<FitChoices>) => void;
  keepBeside: (isBeside: boolean) => void;
}

/** The table and what was said of it, kept through reloads. */
export function useMeasuredSource(designId: number): SourceDesk {
  const { person } = useSession();
  const place = { personId: person.id, designId };
  const [{ source, isKept }, setKept] = useState(() => ({ source: readMeasuredCopy(place), isKept: true }));
  // Kept with every change, not when the page is left: a crash gives no time.
  const change = (next: MeasuredSource) => setKept({ source: next, isKept: keepMeasuredCopy(place, next) });
  return {
    source,
    isKept,
    readIn: (text, fileName) => change({ ...NO_SOURCE, text, fileName }),
    retype: (text) => change(retyped(source, text)),
    clear: () => change(NO_SOURCE),
    mean: (meaning) => change({ ...source, meaning: { ...source.meaning, ...meaning } }),
    meanColumn: (index, column) => change(withColumn(source, index, column)),
    fit: (fit) => change({ ...source, fit: { ...source.fit, ...fit } }),
    keepBeside: (isBeside) => change({ ...source, isBeside }),
  };
}

const firstLine = (text: string) => text.slice(0, text.search(/[\r\n]|$/));

/** A table with another first row is another table. Rows may have moved: what stood alone is judged anew. */
function retyped(before: MeasuredSource, text: string): MeasuredSource {
  const isAnother = before.text === '' || firstLine(before.text) !== firstLine(text);
  return {
    ...before,
    text,
    ...(text === '' ? { fileName: null } : {}),
    meaning: isAnother ? NOTHING_SAID.meaning : before.meaning,
    fit: { ...before.fit, restored: [] },
  };
}

function withColumn(
  before: MeasuredSource,
  index: number,
  change: Partial<Pick<MeasurementColumn, 'kind' | 'unit'>>,
): MeasuredSource {
  const { columns } = before.meaning;
  const next = { ...columns, [index]: { ...columns[index], ...change } };
  return { ...before, meaning: { ...before.meaning, columns: next } };
}
