import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Link } from 'react-router';
import { listDesignsQuery, type DesignSummary } from '#shared/contract/designs.ts';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import { designListQuery } from '../features/designs/designs.queries.ts';
import { EmptyRack } from '../features/designs/EmptyRack.tsx';
import { TodayRack } from '../features/designs/TodayRack.tsx';
import { printDay } from '../lib/print-when.ts';
import { useSession } from '../lib/session.ts';
import { signedInLoader } from '../lib/signed-in-loader.ts';
import { useUnit } from '../lib/unit.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/Button.tsx';
import { PageTitle } from '../ui/PageTitle.tsx';

/** As many as fit a glance; the rest hangs in Designs. */
const ROWS = 6;

const lastTouched = designListQuery({ ...listDesignsQuery.parse({}), mine: true, pageSize: ROWS });

export const todayLoader = (queryClient: QueryClient) =>
  signedInLoader(queryClient, () => queryClient.query({ ...lastTouched, staleTime: 'static' }));

export function TodayPage() {
  const { data: found } = useSuspenseQuery(lastTouched);
  const drafts = found.items.filter((design) => design.state === 'draft');
  return (
    <div className="px-margin pt-4 pb-10">
      <PageTitle>Today</PageTitle>
      <h1 className="text-page font-semibold">{printToday(new Date())}</h1>
      <p className="text-ink2 text-[16px] leading-5.5">{sentenceOf(drafts, found.total)}</p>
      {drafts.length === 0 ? <NothingWaits /> : <OnTheBench drafts={drafts} />}
      {found.total > drafts.length && (
        <p className="mt-4">
          <Link to={`${paths.designs()}?mine=true`} className="text-link target inline-flex items-center">
            Show all {found.total} of mine
          </Link>
        </p>
      )}
    </div>
  );
}

function OnTheBench({ drafts }: { drafts: readonly DesignSummary[] }) {
  const session = useSession();
  return (
    <TodayRack
      title="On the bench"
      designs={drafts}
      unit={useUnit()}
      bandCents={session.workshop.bandCents}
      pathOf={paths.design}
    />
  );
}

function NothingWaits() {
  const session = useSession();
  const refusal = permissionRefusal(session, 'create-design');
  return (
    <EmptyRack unit={useUnit()}>
      <p>{refusal === null ? 'Nothing waits. Draw something.' : `Nothing waits. ${refusal}`}</p>
      <div className="flex flex-wrap gap-2">
        {refusal === null && (
          <Button asChild look="go">
            <Link to={paths.newDesign()}>New design</Link>
          </Button>
        )}
        <Button asChild>
          <Link to={paths.designs()}>Look at the designs</Link>
        </Button>
      </div>
    </EmptyRack>
  );
}

function sentenceOf(drafts: readonly DesignSummary[], total: number): string {
  if (drafts.length === 0) return 'Your bench is clear.';
  const count = drafts.length === 1 ? 'One draft lies' : `${drafts.length} drafts lie`;
  return total > drafts.length ? `${count} on top; the rest is in Designs.` : `${count} on your bench.`;
}

const DAYS = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday'];

function printToday(now: Date): string {
  return `${DAYS[now.getDay()] ?? ''} ${printDay(now)}`;
}
