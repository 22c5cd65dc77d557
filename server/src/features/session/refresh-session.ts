import type { Transaction } from 'sequelize';
import type { Session } from '#shared/contract/session.ts';
import type { Dependencies } from '../../dependencies.ts';
import { signedOut } from '../../http/http-error.ts';
import type { Reply } from '../../http/route.ts';
import { endSession } from '../../identity/end-sessions.ts';
import { findMembership } from '../../identity/find-membership.ts';
import { presentSession } from '../../identity/present-session.ts';
import { hashToken } from '../../identity/refresh-token.ts';
import { issueTokens, sessionEnd } from '../../identity/start-session.ts';
import type { SessionRow } from '../../models/session.ts';

/**
 * Trades a refresh token for a new pair.
 *
 * A token that comes a second time has been copied: nobody can tell the thief from the owner, so the session ends for
 * both, and the owner signs in again.
 */
export async function refreshSession(
  dependencies: Dependencies,
  refreshToken: string | undefined,
): Promise<Reply<Session>> {
  if (refreshToken === undefined) throw signedOut();
  const tokenHash = hashToken(refreshToken);
  const { database } = dependencies;
  const outcome = await database.sequelize.transaction(async (transaction) => {
    const session = await useToken(dependencies, tokenHash, transaction);
    if (session === null) return null;
    return continueSession(dependencies, session, transaction);
  });
  if (outcome !== null) return outcome;
  const known = await database.models.RefreshToken.findOne({ where: { tokenHash } });
  if (known !== null) await endSession(dependencies, known.sessionId, 'token-reused');
  throw signedOut();
}

/** Marks the token used; null when there is no such token, it was used before, or its session is over. */
async function useToken(
  { database }: Dependencies,
  tokenHash: string,
  transaction: Transaction,
): Promise<SessionRow | null> {
  const { RefreshToken, Session } = database.models;
  const [used] = await RefreshToken.update(
    { usedAt: new Date() },
    { where: { tokenHash, usedAt: null }, transaction },
  );
  if (used === 0) return null;
  const token = await RefreshToken.findOne({ where: { tokenHash }, transaction });
  const session = await Session.findOne({ where: { id: token?.sessionId ?? 0, endedAt: null }, transaction });
  return session !== null && session.expiresAt > new Date() ? session : null;
}

async function continueSession(
  dependencies: Dependencies,
  session: SessionRow,
  transaction: Transaction,
): Promise<Reply<Session> | null> {
  const { database } = dependencies;
  const { id: sessionId, personId, workshopId } = session;
  const membership = await findMembership(database, { personId, workshopId }, transaction);
  if (membership === null) return null;
  const expiresAt = sessionEnd();
  await session.update({ expiresAt }, { transaction });
  await membership.update({ lastHereAt: new Date() }, { transaction });
  const tokens = await issueTokens(dependencies, { sessionId, expiresAt }, transaction);
  return { body: presentSession(membership, tokens.accessExpiresAt), session: tokens };
}
