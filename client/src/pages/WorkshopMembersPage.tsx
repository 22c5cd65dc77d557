import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import type { Role } from '#shared/contract/session.ts';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import { MemberTable } from '../features/workshop/MemberTable.tsx';
import { RoleTable } from '../features/workshop/RoleTable.tsx';
import { membersQuery } from '../features/workshop/workshop.queries.ts';
import { printWhen } from '../lib/print-when.ts';
import { useSession } from '../lib/session.ts';
import { signedInLoader } from '../lib/signed-in-loader.ts';
import { Refusal } from '../ui/Problem.tsx';
import { WorkshopFrame } from './WorkshopFrame.tsx';

export const workshopMembersLoader = (queryClient: QueryClient) =>
  signedInLoader(queryClient, async (_args, session) =>
    // Who may not see the list is told so on the page; there is nothing to fetch for them.
    permissionRefusal(session, 'see-members') === null
      ? queryClient.query({ ...membersQuery, staleTime: 'static' })
      : null,
  );

export function WorkshopMembersPage() {
  const { role } = useSession();
  const refusal = permissionRefusal({ role }, 'see-members');
  if (refusal === null) return <Members ownRole={role} />;
  return (
    <WorkshopFrame title="Members and roles">
      <div className="grid gap-8">
        <Refusal>{refusal}</Refusal>
        <RoleTable ownRole={role} />
      </div>
    </WorkshopFrame>
  );
}

function Members({ ownRole }: { ownRole: Role }) {
  const { items } = useSuspenseQuery(membersQuery).data;
  return (
    <WorkshopFrame
      title="Members and roles"
      beside={items.length === 1 ? '1 person' : `${items.length} people`}
    >
      <div className="grid gap-10">
        <MemberTable members={items} printWhen={printWhen} />
        <RoleTable ownRole={ownRole} />
      </div>
    </WorkshopFrame>
  );
}
