import { Op, type Transaction } from 'sequelize';
import type { Dependencies } from '../dependencies.ts';
import { signAccessToken } from './access-token.ts';
import { hashToken, newRefreshToken } from './refresh-token.ts';

/** A device that does not come back for this long has to sign in again. */
export const SESSION_DAYS = 30;
const DAY_MS = 24 * 60 * 60 * 1000;

/** What a browser keeps of a session, in cookies that scripts cannot read. */
export interface SessionTokens {
  accessToken: string;
  accessExpiresAt: Date;
  refreshToken: string;
  refreshExpiresAt: Date;
}

interface Beginner {
  personId: number;
  workshopId: number;
}

export function sessionEnd(): Date {
  return new Date(Date.now() + SESSION_DAYS * DAY_MS);
}

/** Signs a person in on one device. */
export async function startSession(
  { database, config }: Dependencies,
  { personId, workshopId }: Beginner,
  transaction: Transaction,
): Promise<SessionTokens> {
  const { Session, Membership } = database.models;
  await Session.destroy({ where: { expiresAt: { [Op.lt]: new Date() } }, limit: 100, transaction });
  const expiresAt = sessionEnd();
  const session = await Session.create({ personId, workshopId, expiresAt }, { transaction });
  await Membership.update({ lastHereAt: new Date() }, { where: { personId, workshopId }, transaction });
  return issueTokens({ database, config }, { sessionId: session.id, expiresAt }, transaction);
}

/** A fresh pair of tokens for a session that exists. */
export async function issueTokens(
  { database, config }: Pick<Dependencies, 'database' | 'config'>,
  { sessionId, expiresAt }: { sessionId: number; expiresAt: Date },
  transaction: Transaction,
): Promise<SessionTokens> {
  const refreshToken = newRefreshToken();
  await database.models.RefreshToken.create(
    { tokenHash: hashToken(refreshToken), sessionId },
    { transaction },
  );
  const access = signAccessToken(sessionId, config.sessionSecret);
  return {
    accessToken: access.token,
    accessExpiresAt: access.expiresAt,
    refreshToken,
    refreshExpiresAt: expiresAt,
  };
}
