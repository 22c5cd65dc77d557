import { useQuery, useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useCallback } from 'react';
import { Link, useNavigate, useSearchParams } from 'react-router';
import type { ListDesignsQuery } from '#shared/contract/designs.ts';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import { ChoosingBand } from '../features/designs/ChoosingBand.tsx';
import { DesignFilters } from '../features/designs/DesignFilters.tsx';
import { DesignRack } from '../features/designs/DesignRack.tsx';
import { designListQuery, designQuery } from '../features/designs/designs.queries.ts';
import { EmptyRack } from '../features/designs/EmptyRack.tsx';
import { FindBox } from '../features/designs/FindBox.tsx';
import {
  changeList,
  isWholeList,
  readChoosing,
  readListAddress,
  withChoosing,
  writeListAddress,
  type Choosing,
} from '../features/designs/list-address.ts';
import { useListSearch } from '../features/designs/use-list-search.ts';
import { RackPager } from '../features/designs/RackPager.tsx';
import { ReadInDesign } from '../features/designs/ReadInDesign.tsx';
import { SortSelect } from '../features/designs/SortSelect.tsx';
import { useSession } from '../lib/session.ts';
import { signedInLoader } from '../lib/signed-in-loader.ts';
import { useUnit } from '../lib/unit.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/Button.tsx';
import { PageTitle } from '../ui/PageTitle.tsx';
import { Refusal } from '../ui/Problem.tsx';

export const designsLoader = (queryClient: QueryClient) =>
  signedInLoader(queryClient, ({ request }) =>
    queryClient.query({
      ...designListQuery(readListAddress(new URL(request.url).searchParams)),
      staleTime: 'static',
    }),
  );

export function DesignsPage() {
  const [search, setSearch] = useSearchParams();
  const list = readListAddress(search);
  const { data: found } = useSuspenseQuery(designListQuery(list));
  const session = useSession();
  const unit = useUnit();
  const choosing = readChoosing(search);
  const searchOf = useListSearch();
  const handleList = (next: ListDesignsQuery) => setSearch(searchOf(next));
  const handleSearch = useCallback(
    (text: string) =>
      setSearch(
        (current) =>
          withChoosing(
            writeListAddress(changeList(readListAddress(current), { search: text })),
            readChoosing(current),
          ),
        { replace: true },
      ),
    [setSearch],
  );

  return (
    <div className="px-margin pt-3.5 pb-10">
      <PageTitle>Designs</PageTitle>
      <DesignsHead refusal={permissionRefusal(session, 'create-design')} />
      {choosing !== null && <BandOf choosing={choosing} leaveTo={`?${writeListAddress(list).toString()}`} />}
      <div className="mt-3 mb-2 flex flex-wrap items-center justify-between gap-x-4 gap-y-3">
        <DesignFilters list={list} counts={found.counts} />
        <FindBox search={list.search} onSearch={handleSearch} />
        <SortSelect list={list} onChange={handleList} />
      </div>
      <p role="status" className="sr-only">
        {found.total === 1 ? '1 design' : `${found.total} designs`}
      </p>
      {found.items.length === 0 ? (
        <NothingFound
          list={list}
          total={found.counts.all}
          refusal={permissionRefusal(session, 'create-design')}
        />
      ) : (
        <DesignRack
          designs={found.items}
          list={list}
          unit={unit}
          bandCents={session.workshop.bandCents}
          pathOf={paths.design}
          chooseOf={choosing === null ? undefined : (id) => chosenPath(choosing, id)}
          compareOf={paths.chooseToCompare}
          onChange={handleList}
          refusals={{
            copy: permissionRefusal(session, 'copy-design'),
            edit: permissionRefusal(session, 'edit-design'),
          }}
        />
      )}
      <RackPager list={list} found={found} />
    </div>
  );
}

/** The second one chosen opens the comparison. */
const chosenPath = (choosing: NonNullable<Choosing>, id: number) =>
  choosing === 'two' ? paths.chooseToCompare(id) : paths.compare(choosing, id);

function BandOf({ choosing, leaveTo }: { choosing: NonNullable<Choosing>; leaveTo: string }) {
  const isChosen = choosing !== 'two';
  const { data: first } = useQuery({ ...designQuery(isChosen ? choosing : 0), enabled: isChosen });
  return (
    <ChoosingBand
      name={isChosen ? (first?.name ?? 'it') : null}
      selfTo={
        isChosen
          ? {
              pitch: paths.compare(choosing, choosing, 'pitch'),
              air: paths.compare(choosing, choosing, 'air'),
            }
          : null
      }
      leaveTo={leaveTo}
    />
  );
}

function DesignsHead({ refusal }: { refusal: string | null }) {
  const navigate = useNavigate();
  return (
    <div className="max-bar:justify-end flex flex-wrap items-start justify-between gap-3">
      <h1 className="text-page max-bar:sr-only font-semibold">Designs</h1>
      {refusal === null ? (
        <div className="flex flex-wrap justify-end gap-2">
          <Button asChild look="bare">
            <Link to={paths.chooseToCompare()}>Compare two</Link>
          </Button>
          <ReadInDesign onCreated={(design) => void navigate(paths.design(design.id))} />
          <Button asChild look="go">
            <Link to={paths.newDesign()}>New design</Link>
          </Button>
        </div>
      ) : (
        <div className="flex flex-wrap items-center justify-end gap-3">
          <Refusal id="why-no-new-design">{refusal}</Refusal>
          <Button disabled aria-describedby="why-no-new-design">
            New design
          </Button>
        </div>
      )}
    </div>
  );
}

interface NothingFoundProps {
  list: ListDesignsQuery;
  /** Designs of the workshop outside the archive. */
  total: number;
  refusal: string | null;
}

function NothingFound({ list, total, refusal }: NothingFoundProps) {
  const unit = useUnit();
  if (isWholeList(list) && total === 0)
    return (
      <EmptyRack unit={unit}>
        <p>
          {refusal === null
            ? 'No designs yet. Draw one, or read in one you have.'
            : `No designs yet. ${refusal}`}
        </p>
        {refusal === null && (
          <Button asChild look="go">
            <Link to={paths.newDesign()}>New design</Link>
          </Button>
        )}
      </EmptyRack>
    );
  return <NoMatch list={list} />;
}

function NoMatch({ list }: { list: ListDesignsQuery }) {
  const searchOf = useListSearch();
  const isNarrowed = list.kind !== undefined || list.mine || list.archived;
  const plain = readListAddress(new URLSearchParams());
  const wider = isNarrowed ? changeList(plain, { search: list.search }) : plain;
  return (
    <EmptyRack unit={useUnit()}>
      <p>
        {list.search === '' ? 'Nothing is here' : `Nothing matches “${list.search}”`}
        {isNarrowed ? ' in this part of the rack.' : '.'}
      </p>
      <Button asChild>
        <Link to={{ search: searchOf(wider) }}>{isNarrowed ? 'Look in all' : 'Show all designs'}</Link>
      </Button>
    </EmptyRack>
  );
}
