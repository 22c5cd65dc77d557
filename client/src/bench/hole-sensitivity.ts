import type { DesignSensitivities } from '#shared/analysis/prediction.ts';
import { MM_PER_INCH } from '#shared/lengths/drills.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { notesOfColumn, type HungNote } from './hung-notes.ts';
import type { Selection } from './panel-props.ts';

/** The small step that sensitivities are told for. */
export const SENSITIVITY_STEP: Record<LengthUnit, { mm: number; label: string }> = {
  mm: { mm: 0.1, label: '0.1 mm' },
  inch: { mm: 0.005 * MM_PER_INCH, label: '0.005 inch' },
};

/** Cents that one small step of a dimension does to a note; null until it is worked out. */
export function centsPerStep(
  sensitivities: DesignSensitivities | null,
  fingering: string | undefined,
  key: string,
  stepMm: number,
): number | null {
  const perUnit = sensitivities?.fingerings.find(({ id }) => id === fingering)?.centsPerUnit[key];
  return perUnit === undefined ? null : perUnit * stepMm;
}

/** Whose cents stand beside a hole's sizes: the chosen note where it hangs here, else the lowest note that does. */
export function leadingNote(
  notes: readonly HungNote[],
  column: string,
  selection: Selection,
): HungNote | undefined {
  const hung = notesOfColumn(notes, column);
  return (
    hung.find((note) => note.fingering.id === selection.fingering) ??
    hung.find((note) => note.row === 'register') ??
    hung[0]
  );
}
