import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';
import { woodBetweenMm } from '#shared/document/hole-faults.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { formatCents } from '#shared/music/cents.ts';
import type { ComparedSide, Comparison } from './comparison.ts';

/** One figure of both instruments as wholes. */
export interface SummaryRow {
  label: string;
  a: string;
  b: string;
}

/** What the changes came to: the notes furthest out, the hands, the wood, the drills. */
export function summaryRows({ a, b }: Comparison, unit: LengthUnit): SummaryRow[] {
  const length = (mm: number | null) => (mm === null ? '–' : printLength(mm, unit));
  const registers = [1, 2].filter((register) =>
    [a, b].some(({ document }) => document.fingerings.some((fingering) => fingering.register === register)),
  );
  const both = (label: string, figure: (side: ComparedSide) => string): SummaryRow => ({
    label,
    a: figure(a),
    b: figure(b),
  });
  return [
    ...registers.map((register) =>
      both(`Furthest in register ${register}`, (side) => furthestWords(side, register)),
    ),
    both(`Mouth end to foot, ${unit}`, ({ document }) => length(boreEnds(document).footMm)),
    both(`Spread of the left hand, ${unit}`, ({ document }) => length(spreadMm(document, 'left'))),
    both(`Spread of the right hand, ${unit}`, ({ document }) => length(spreadMm(document, 'right'))),
    both(`Least wall between holes, ${unit}`, ({ document }) => length(leastWallMm(document))),
    both('Final drills', ({ document }) =>
      String(new Set(document.holes.map(({ diameterMm }) => diameterMm.toFixed(2))).size),
    ),
  ];
}

function furthestWords({ prediction }: ComparedSide, register: number): string {
  const furthest = (prediction?.fingerings ?? []).reduce<{ note: string; cents: number } | null>(
    (worst, { register: of, note, centsFromScale: cents }) =>
      of === register && cents !== null && (worst === null || Math.abs(cents) > Math.abs(worst.cents))
        ? { note, cents }
        : worst,
    null,
  );
  return furthest === null ? '–' : `${furthest.note} ${formatCents(furthest.cents)}`;
}

/** From the first to the last finger hole of a hand; null with fewer than two. */
function spreadMm({ holes }: DesignDocument, hand: ToneHole['hand']): number | null {
  const places = holes
    .filter((hole) => hole.hand === hand && hole.cover === 'finger')
    .map(({ positionMm }) => positionMm);
  return places.length < 2 ? null : Math.max(...places) - Math.min(...places);
}

function leastWallMm(document: DesignDocument): number | null {
  const walls = document.holes.flatMap((hole, index) =>
    document.holes.slice(0, index).map((other) => woodBetweenMm(document, hole, other)),
  );
  return walls.length === 0 ? null : Math.min(...walls);
}
