import type { Session } from '#shared/contract/session.ts';
import type { MembershipRow } from '../models/membership.ts';
import { presentWorkshop } from './present-workshop.ts';

/** Who is signed in, where, and until when. The membership comes with its person and workshop. */
export function presentSession(membership: MembershipRow, expiresAt: Date): Session {
  const { person, workshop } = membership;
  if (person === undefined || workshop === undefined)
    throw new TypeError('Membership read without its people.');
  return {
    person: { id: person.id, name: person.name, email: person.email },
    role: membership.role,
    workshop: presentWorkshop(workshop),
    expiresAt: expiresAt.toISOString(),
  };
}
