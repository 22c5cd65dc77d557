import type { z } from 'zod';
import type { membersSchema } from '#shared/contract/session.ts';
import type { WorkshopScope } from '../../db/workshop-scope.ts';
import type { MembershipRow } from '../../models/membership.ts';

type Members = z.output<typeof membersSchema>;

export async function listMembers(scope: WorkshopScope): Promise<Members> {
  const memberships = await scope.memberships.findAll({
    include: ['person'],
    order: [
      ['person', 'name', 'ASC'],
      ['id', 'ASC'],
    ],
  });
  return { items: memberships.map(presentMember) };
}

function presentMember({ person, role, lastHereAt }: MembershipRow): Members['items'][number] {
  if (person === undefined) throw new TypeError('Membership read without its person.');
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    role,
    lastHereAt: lastHereAt?.toISOString() ?? null,
  };
}
