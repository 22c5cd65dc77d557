import type { Session } from '#shared/contract/session.ts';
import type { Dependencies } from '../../dependencies.ts';
import { signedOut } from '../../http/http-error.ts';
import type { Caller } from '../../identity/caller.ts';
import { findMembership } from '../../identity/find-membership.ts';
import { presentSession } from '../../identity/present-session.ts';

export async function readSession({ database }: Dependencies, caller: Caller): Promise<Session> {
  const { personId, workshopId } = caller;
  const membership = await findMembership(database, { personId, workshopId });
  if (membership === null) throw signedOut();
  return presentSession(membership, caller.tokenExpiresAt);
}
