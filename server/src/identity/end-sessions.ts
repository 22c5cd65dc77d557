import { Op, type Transaction } from 'sequelize';
import type { Dependencies } from '../dependencies.ts';
import type { SessionRow } from '../models/session.ts';

type Reason = NonNullable<SessionRow['endedBecause']>;

export async function endSession(
  { database, sessions }: Dependencies,
  sessionId: number,
  because: Reason,
): Promise<void> {
  await database.models.Session.update(
    { endedAt: new Date(), endedBecause: because },
    { where: { id: sessionId, endedAt: null } },
  );
  sessions.forget(sessionId);
}

/** Ends every session of a person but the one that asks; returns their ids, to forget once the change is kept. */
export async function endOtherSessions(
  { database }: Pick<Dependencies, 'database'>,
  { personId, sessionId }: { personId: number; sessionId: number },
  transaction: Transaction,
): Promise<number[]> {
  const where = { personId, id: { [Op.ne]: sessionId }, endedAt: null };
  const others = await database.models.Session.findAll({ where, attributes: ['id'], transaction });
  await database.models.Session.update(
    { endedAt: new Date(), endedBecause: 'password-changed' },
    { where, transaction },
  );
  return others.map((session) => session.id);
}
