import { DESIGN_SORTS, listDesignsQuery, type ListDesignsQuery } from '#shared/contract/designs.ts';

const DEFAULTS = listDesignsQuery.parse({});

export type DesignSort = (typeof DESIGN_SORTS)[number];

/** Names begin at A, dates at the newest. */
const FIRST_ORDER: Record<DesignSort, ListDesignsQuery['order']> = {
  name: 'asc',
  kind: 'asc',
  'lowest-note': 'asc',
  changed: 'desc',
};

/** What the address asks for. Whatever in it makes no sense is left at its usual value: an old link still opens. */
export function readListAddress(search: URLSearchParams): ListDesignsQuery {
  const asked = Object.fromEntries(search);
  const parsed = listDesignsQuery.safeParse(asked);
  if (parsed.success) return parsed.data;
  const wrong = new Set(parsed.error.issues.map((issue) => issue.path[0]));
  const known = Object.entries(asked).filter(([key]) => key in listDesignsQuery.shape && !wrong.has(key));
  return listDesignsQuery.parse(Object.fromEntries(known));
}

/** The address of a list; what is usual is left out, so that the plain list has the plain address. */
export function writeListAddress(list: ListDesignsQuery): URLSearchParams {
  const search = new URLSearchParams();
  for (const [key, value] of Object.entries(list)) {
    if (value !== undefined && value !== DEFAULTS[key as keyof ListDesignsQuery])
      search.set(key, String(value));
  }
  return search;
}

/** A change of what is looked for begins at the first page again. */
export function changeList(list: ListDesignsQuery, change: Partial<ListDesignsQuery>): ListDesignsQuery {
  return { ...list, page: 1, ...change };
}

/** By another column, or by the same one the other way round. */
export function sortList(list: ListDesignsQuery, sort: DesignSort): ListDesignsQuery {
  const turned = list.order === 'asc' ? 'desc' : 'asc';
  return changeList(list, { sort, order: list.sort === sort ? turned : FIRST_ORDER[sort] });
}

/** True when nothing is left out, so that an empty list means an empty workshop. */
export function isWholeList(list: ListDesignsQuery): boolean {
  return list.search === '' && list.kind === undefined && !list.mine && !list.archived;
}

/** What is being chosen on the rack to be compared: both, or the fellow of one; null while nothing is. */
export type Choosing = 'two' | number | null;

export function readChoosing(search: URLSearchParams): Choosing {
  const asked = search.get('compare');
  if (asked === 'two') return 'two';
  return asked !== null && /^[1-9]\d{0,9}$/.test(asked) ? Number(asked) : null;
}

/** The same address with a choice going on in it, or none. */
export function withChoosing(search: URLSearchParams, choosing: Choosing): URLSearchParams {
  const next = new URLSearchParams(search);
  if (choosing === null) next.delete('compare');
  else next.set('compare', String(choosing));
  return next;
}
