import { col, fn, literal } from 'sequelize';
import type { DesignList } from '#shared/contract/designs.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';

interface Group {
  kind: string;
  isMine: 0 | 1;
  isArchived: 0 | 1;
  count: number;
}

/** How many designs each filter of the list would show, in one query. */
export async function countDesigns(scope: WorkshopScope): Promise<DesignList['counts']> {
  const rows = await scope.designs.findAll({
    attributes: [
      'kind',
      [literal(`created_by_id = ${scope.caller.personId}`), 'isMine'],
      [literal('archived_at IS NOT NULL'), 'isArchived'],
      [fn('COUNT', col('id')), 'count'],
    ],
    where: scope.visibleDesigns(),
    group: ['kind', 'isMine', 'isArchived'],
    raw: true,
  });
  const groups = rows as unknown as Group[];
  const sum = (some: readonly Group[]) => some.reduce((total, group) => total + group.count, 0);
  const present = groups.filter((group) => group.isArchived === 0);
  const kinds = [...new Set(present.map((group) => group.kind))];
  return {
    all: sum(present),
    mine: sum(present.filter((group) => group.isMine === 1)),
    archived: sum(groups) - sum(present),
    kinds: Object.fromEntries(
      kinds.map((kind) => [kind, sum(present.filter((group) => group.kind === kind))]),
    ),
  };
}
