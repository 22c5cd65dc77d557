import { Link } from 'react-router';
import type { DesignList, ListDesignsQuery } from '#shared/contract/designs.ts';
import { Button } from '../../ui/Button.tsx';
import { useListSearch } from './use-list-search.ts';

interface RackPagerProps {
  list: ListDesignsQuery;
  found: Pick<DesignList, 'total' | 'page' | 'pageSize'>;
}

/** Which part of a long rack this is, and the way on. Says nothing while everything is on one page. */
export function RackPager({ list, found }: RackPagerProps) {
  const { total, page, pageSize } = found;
  const pages = Math.ceil(total / pageSize);
  if (pages <= 1) return null;
  const from = (page - 1) * pageSize + 1;
  return (
    <nav aria-label="Pages" className="text-data text-ink2 flex flex-wrap items-center gap-4 py-4">
      <span>
        {from}–{Math.min(total, page * pageSize)} of {total}
      </span>
      <PageLink list={list} page={page - 1} isThere={page > 1}>
        Back
      </PageLink>
      <PageLink list={list} page={page + 1} isThere={page < pages}>
        On
      </PageLink>
    </nav>
  );
}

interface PageLinkProps {
  list: ListDesignsQuery;
  page: number;
  isThere: boolean;
  children: string;
}

function PageLink({ list, page, isThere, children }: PageLinkProps) {
  const searchOf = useListSearch();
  if (!isThere)
    return (
      <Button size="small" disabled>
        {children}
      </Button>
    );
  return (
    <Button asChild size="small">
      <Link to={{ search: searchOf({ ...list, page }) }}>{children}</Link>
    </Button>
  );
}
