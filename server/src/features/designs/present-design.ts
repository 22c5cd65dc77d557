import type { DesignSummary } from '#shared/contract/designs.ts';
import type { RackView } from '#shared/rules/design-summary.ts';
import type { DesignRow } from '../../models/design.ts';
import { presentName } from '../../models/present-name.ts';

/** What every reading of a design row has to bring along. */
export const DESIGN_PEOPLE = ['createdBy', 'changedBy'];

export function presentDesign(row: DesignRow): DesignSummary {
  // Written by this server from `rackView()` and by nobody else.
  const { outline, plumb, furthest1, furthest2 } = JSON.parse(row.rackView) as RackView;
  return {
    id: row.id,
    name: row.name,
    kind: row.kind,
    lowestNote: row.lowestNote,
    temperament: row.temperament,
    a4Hz: row.a4Hz,
    draftVersion: row.draftVersion,
    revisionNumber: row.revisionNumber,
    state: row.state,
    archived: row.archivedAt !== null,
    outline,
    plumb,
    furthest1,
    furthest2,
    createdBy: presentName(row.createdBy),
    changedBy: presentName(row.changedBy),
    changedAt: row.changedAt.toISOString(),
  };
}
