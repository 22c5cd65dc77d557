import { Link } from 'react-router';
import type { DesignList, ListDesignsQuery } from '#shared/contract/designs.ts';
import { classNames } from '../../ui/class-names.ts';
import { changeList } from './list-address.ts';
import { useListSearch } from './use-list-search.ts';

interface DesignFiltersProps {
  list: ListDesignsQuery;
  counts: DesignList['counts'];
}

const KINDS = [
  ['window', 'Whistles'],
  ['embouchure', 'Flutes'],
  ['rim', 'End-blown'],
  ['reed', 'Reed pipes'],
  ['ideal-open', 'Ideal open'],
  ['ideal-closed', 'Ideal closed'],
] as const;

/** What is looked at, in plain words with their counts. Each is a link, because each is an address. */
export function DesignFilters({ list, counts }: DesignFiltersProps) {
  const none: Partial<ListDesignsQuery> = { kind: undefined, mine: false, archived: false };
  const isAll = list.kind === undefined && !list.mine && !list.archived;
  const kinds = KINDS.filter(([kind]) => (counts.kinds[kind] ?? 0) > 0 || list.kind === kind);
  return (
    <nav aria-label="Which designs">
      <ul className="flex flex-wrap items-center gap-x-5.5 gap-y-1">
        <Filter list={list} change={none} isOn={isAll} label="All" count={counts.all} />
        {kinds.map(([kind, label]) => (
          <Filter
            key={kind}
            list={list}
            change={{ ...none, kind }}
            isOn={list.kind === kind}
            label={label}
            count={counts.kinds[kind] ?? 0}
          />
        ))}
        <li aria-hidden="true" className="bg-hair max-tablet:hidden h-4.5 w-px" />
        <Filter
          list={list}
          change={{ ...none, mine: true }}
          isOn={list.mine}
          label="Mine"
          count={counts.mine}
        />
        {(counts.archived > 0 || list.archived) && (
          <Filter
            list={list}
            change={{ ...none, archived: true }}
            isOn={list.archived}
            label="Archive"
            count={counts.archived}
          />
        )}
      </ul>
    </nav>
  );
}

interface FilterProps {
  list: ListDesignsQuery;
  change: Partial<ListDesignsQuery>;
  isOn: boolean;
  label: string;
  count: number;
}

function Filter({ list, change, isOn, label, count }: FilterProps) {
  const searchOf = useListSearch();
  return (
    <li>
      <Link
        to={{ search: searchOf(changeList(list, change)) }}
        aria-current={isOn ? 'true' : undefined}
        className="target flex min-w-11 items-center text-[14.5px] no-underline"
      >
        <span
          className={classNames(
            'flex gap-1.5',
            isOn ? 'text-ink font-semibold shadow-[0_2px_0_var(--ink)]' : 'text-ink2 hover:text-ink',
          )}
        >
          {label} <span className="text-ink3 font-normal">{count}</span>
        </span>
      </Link>
    </li>
  );
}
