import type { DesignPrediction, DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import type { BenchGeometry } from './bench-geometry.ts';

/** One change of the document, one undo step. */
export interface DesignEdit {
  label: string;
  change: (document: DesignDocument) => DesignDocument;
  /** Edits with the same key within a drag merge into one undo step. */
  mergeKey?: string;
}

/** What is chosen on the bench; it lives in the address, so that a link opens on the same hole. */
export interface Selection {
  /** Hole id, `foot` or `mouth`. */
  hole: string | null;
  /** Fingering id. */
  fingering: string | null;
  register: number | 'all';
}

/** What every panel of the workbench is handed by the page. */
export interface PanelProps {
  document: DesignDocument;
  prediction: DesignPrediction | null;
  sensitivities: DesignSensitivities | null;
  unit: LengthUnit;
  /** Half width of the band by register, cents; index 0 is register 1, the last one holds for all above. */
  bandCents: readonly number[];
  /** Why nothing may be changed, or null. */
  readOnly: string | null;
  selection: Selection;
  onSelect: (change: Partial<Selection>) => void;
  onEdit: (edit: DesignEdit) => void;
  geometry: BenchGeometry;
}
