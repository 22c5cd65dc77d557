import type { ReactNode } from 'react';
import { WorkshopTabs } from '../features/workshop/WorkshopTabs.tsx';
import { useSession } from '../lib/session.ts';
import { paths } from '../paths.ts';
import { PageTitle } from '../ui/PageTitle.tsx';

const TABS = [
  { to: paths.workshopMembers(), label: 'Members and roles' },
  { to: paths.workshopDefaults(), label: 'Defaults' },
] as const;

interface WorkshopFrameProps {
  title: string;
  /** Stands at the right of the heading. */
  beside?: ReactNode;
  children: ReactNode;
}

/** What the workshop's pages share: its name, and the way between them. */
export function WorkshopFrame({ title, beside, children }: WorkshopFrameProps) {
  const { workshop } = useSession();
  return (
    <>
      <PageTitle>{title}</PageTitle>
      <div className="px-margin flex flex-wrap items-baseline justify-between gap-x-6 pt-3 pb-2">
        <h1 className="text-page font-semibold break-words">{workshop.name}</h1>
        {beside !== undefined && <p className="text-data text-ink2">{beside}</p>}
      </div>
      <WorkshopTabs tabs={TABS} />
      <div className="px-margin py-5">{children}</div>
    </>
  );
}
