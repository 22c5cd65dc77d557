import {
  prepareColumn,
  type FingeringBranches,
  type PreparedColumn,
} from '../acoustics/response/prepared-column.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { AIR_KEYS, MOUTH_KEYS, answering, refuseUnanswerableHoles } from './refuse-unanswerable.ts';
import { toColumn, type DesignColumn } from './to-column.ts';

export interface PreparedDesign {
  design: DesignColumn;
  prepared: PreparedColumn;
  fingerings: FingeringBranches[];
}

/** A design ready for any frequency. Throws `EngineInputError`, under the document's field, on what no formula answers. */
export function prepareDesign(document: DesignDocument): PreparedDesign {
  const design = answering('air', AIR_KEYS, () => toColumn(document));
  refuseUnanswerableHoles(document, design);
  return {
    design,
    ...answering('mouthEnd', MOUTH_KEYS, () => prepareColumn(design.column, design.states)),
  };
}
