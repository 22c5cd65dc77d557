import { Op, type Order, type WhereOptions } from 'sequelize';
import type { DesignList, ListDesignsQuery } from '#shared/contract/designs.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import type { DesignRow } from '../../models/design.ts';
import { countDesigns } from './count-designs.ts';
import { DESIGN_PEOPLE, presentDesign } from './present-design.ts';

const SORT_COLUMNS = {
  name: 'name',
  changed: 'changedAt',
  kind: 'kind',
  'lowest-note': 'lowestMidi',
} as const satisfies Record<ListDesignsQuery['sort'], keyof DesignRow>;

export async function listDesigns(scope: WorkshopScope, query: ListDesignsQuery): Promise<DesignList> {
  const { page, pageSize } = query;
  const where = { [Op.and]: [scope.visibleDesigns(), ...conditions(scope, query)] };
  const [total, rows, counts] = await Promise.all([
    scope.designs.count({ where }),
    scope.designs.findAll({
      where,
      include: DESIGN_PEOPLE,
      order: order(query),
      limit: pageSize,
      offset: (page - 1) * pageSize,
    }),
    countDesigns(scope),
  ]);
  return { items: rows.map(presentDesign), total, page, pageSize, counts };
}

function conditions(scope: WorkshopScope, query: ListDesignsQuery): WhereOptions<DesignRow>[] {
  return [
    { archivedAt: query.archived ? { [Op.ne]: null } : null },
    ...(query.kind === undefined ? [] : [{ kind: query.kind }]),
    ...(query.mine ? [{ createdById: scope.caller.personId }] : []),
    // Every word has to be there, in any order.
    ...words(query.search).map((word) => ({ name: { [Op.like]: `%${asLiteral(word)}%` } })),
  ];
}

const words = (search: string) => search.split(/\s+/).filter((word) => word !== '');

/** A per cent sign that somebody types means itself. */
const asLiteral = (word: string) => word.replace(/[\\%_]/g, '\\$&');

function order({ sort, order: direction }: ListDesignsQuery): Order {
  // By id in the end, so that two of the same name never change places between pages.
  return [
    [SORT_COLUMNS[sort], direction],
    ['id', direction],
  ];
}
