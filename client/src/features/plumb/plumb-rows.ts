import type { BenchGeometry } from '../../bench/bench-geometry.ts';
import type { BenchMeasures } from '../../bench/bench-layout.ts';
import type { HungNote } from '../../bench/hung-notes.ts';
import type { Selection } from '../../bench/panel-props.ts';

export interface PlumbRow {
  register: number;
  /** Below the beam, px. */
  y: number;
}

export interface PlumbRows {
  registers: PlumbRow[];
  /** First row of cross and half fingerings, or null where there are none. */
  crossY: number | null;
  /** From one row of cross fingerings to the next. */
  crossStep: number;
  /** Where bands and verticals end, below the beam. */
  bandEnd: number;
  /** Where labels end, below the beam. */
  end: number;
}

/** From the last register's row to the cross fingerings, and from one row of those to the next. */
const CROSS_BELOW = 60;
const CROSS_STEP = 54;
/** Room that picture and label of a cross fingering take below its bob. */
const CROSS_LABEL = 44;
/** A second line of a label. */
const SECOND_LINE = 16;
/** Labels stand in one line where columns leave room for a note and a figure side by side, px. */
const ONE_LINE_PX = 64;

export const hasTwoLines = ({ layout, columnSpacing }: Pick<BenchGeometry, 'columnSpacing' | 'layout'>) =>
  layout === 'phone' || columnSpacing < ONE_LINE_PX;

/** Rows of the chart: a register each, those that are shown, then cross and half fingerings. */
export function plumbRows(
  notes: readonly HungNote[],
  shown: Selection['register'],
  geometry: Pick<BenchGeometry, 'measures' | 'columnSpacing' | 'layout'>,
): PlumbRows {
  const { measures } = geometry;
  const secondLine = hasTwoLines(geometry) && measures.rowStep > 0 ? SECOND_LINE : 0;
  const registers = registerRows(notes, shown, measures);
  const [firstY = 0] = measures.rowY;
  const last = registers.at(-1)?.y ?? firstY;
  const stacked = mostCrosses(notes, new Set(registers.map((row) => row.register)));
  if (stacked === 0 || measures.rowStep === 0) {
    return {
      registers,
      crossY: null,
      crossStep: CROSS_STEP,
      bandEnd: last + 30,
      end: last + measures.labelBelow + 22 + secondLine,
    };
  }
  const crossY = last + CROSS_BELOW + secondLine;
  const crossStep = CROSS_STEP + secondLine;
  const lastCross = crossY + (stacked - 1) * crossStep;
  return { registers, crossY, crossStep, bandEnd: crossY + 12, end: lastCross + CROSS_LABEL + secondLine };
}

/** One register at a time where rows would not fit one below another. */
function registerRows(
  notes: readonly HungNote[],
  shown: Selection['register'],
  { rowY, rowStep }: BenchMeasures,
): PlumbRow[] {
  const present = [...new Set(notes.map((note) => note.fingering.register))].sort((a, b) => a - b);
  const chosen = shown === 'all' || !present.includes(shown) ? present : [shown];
  const [firstY = 0] = rowY;
  return (rowStep === 0 ? chosen.slice(0, 1) : chosen).map((register, index) => ({
    register,
    y: firstY + index * rowStep,
  }));
}

function mostCrosses(notes: readonly HungNote[], registers: ReadonlySet<number>): number {
  const counts = new Map<string, number>();
  for (const { row, column, fingering } of notes) {
    if (row !== 'cross' || !registers.has(fingering.register)) continue;
    counts.set(column, (counts.get(column) ?? 0) + 1);
  }
  return Math.max(0, ...counts.values());
}
