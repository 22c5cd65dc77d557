import { placeLabels } from './hole-labels.ts';
import { holeRows, type HoleRow } from './hole-rows.ts';
import type { SheetContext } from './sheet-context.ts';
import { writeDiameter, writeLength } from './sheet-lengths.ts';
import { benchReading } from './template-frame.ts';
import { holeAppearances, type WrapCurve } from './template-geometry.ts';
import { FINAL_LINE, HAIR_LINE, PILOT_LINE, SMALL_WORDS, WORDS } from './template-lines.ts';
import { bandBox, onPage, traceCurve, type WrapPlace } from './wrap-place.ts';

/** From a centre to the end of its cross lines, mm; more for holes that would cover them. */
const CROSS_MM = 8;

interface ShownHole {
  row: HoleRow;
  curve: WrapCurve;
  pilot: WrapCurve | null;
  x: number;
  y: number;
  reachMm: number;
}

/** Every hole of a tile: final circle, pilot circle, cross lines and words. */
export function drawWrapHoles(context: SheetContext, place: WrapPlace): void {
  const shown = shownHoles(context, place);
  shown.forEach((hole) => drawHole(context, place, hole));
  drawWords(context, place, shown);
}

function drawHole({ pen }: SheetContext, place: WrapPlace, { curve, pilot, x, y, reachMm }: ShownHole): void {
  pen.stroke(FINAL_LINE, (path) => traceCurve(path, curve, place));
  if (pilot !== null) pen.stroke(PILOT_LINE, (path) => traceCurve(path, pilot, place));
  pen.stroke(HAIR_LINE, (path) =>
    path
      .moveTo(x - reachMm, y)
      .lineTo(x + reachMm, y)
      .moveTo(x, y - reachMm)
      .lineTo(x, y + reachMm),
  );
}

function drawWords(context: SheetContext, place: WrapPlace, shown: readonly ShownHole[]): void {
  const { pen, writing } = context;
  const box = bandBox(place);
  const inside = { topMm: box.at[1] + 6.4, bottomMm: box.at[1] + box.heightMm - 3.4 };
  const reading = benchReading(context);
  placeLabels(shown, inside).forEach(({ numberY, positionY, finalY }, index) => {
    const hole = shown[index];
    if (hole === undefined) return;
    const { x, row } = hole;
    const position = writeLength(reading(row.hole.positionMm), writing).main;
    const final = `final ${writeDiameter(row.hole.diameterMm, writing).main}`;
    pen.text(row.label, [x, numberY], { size: 14, weight: 700, align: 'centre' });
    pen.text(position, [x, positionY], { ...WORDS, align: 'centre' });
    pen.text(final, [x, finalY], { ...SMALL_WORDS, align: 'centre' });
  });
}

/** Holes whose centre lies on this tile and band; a hole over the seam is shown at both edges. */
function shownHoles({ input }: SheetContext, place: WrapPlace): ShownHole[] {
  const { document } = input;
  const { frame, band } = place;
  return holeRows(input).flatMap((row) => {
    const { hole } = row;
    if (hole.positionMm < frame.alongFromMm || hole.positionMm > frame.alongToMm) return [];
    const pilots =
      row.pilot === null ? [] : holeAppearances(document, { ...hole, diameterMm: row.pilot.diameterMm });
    return holeAppearances(document, hole).flatMap(({ centre, curve }, index) => {
      if (centre.roundMm < band.lowMm - 1e-6 || centre.roundMm > band.highMm + 1e-6) return [];
      const [x, y] = onPage(place)(centre);
      const reachMm = Math.max(CROSS_MM, hole.diameterMm / 2 + 4);
      return [{ row, curve, pilot: pilots[index]?.curve ?? null, x, y, reachMm }];
    });
  });
}
