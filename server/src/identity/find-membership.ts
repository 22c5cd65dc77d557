import type { Transaction, WhereOptions } from 'sequelize';
import type { Database } from '../db/connect.ts';
import type { MembershipRow } from '../models/membership.ts';

/** A membership with its person and workshop; of several the one last used. */
export async function findMembership(
  { models }: Database,
  where: WhereOptions<MembershipRow>,
  transaction: Transaction | null = null,
): Promise<MembershipRow | null> {
  return models.Membership.findOne({
    where,
    include: ['person', 'workshop'],
    order: [
      ['lastHereAt', 'DESC'],
      ['id', 'ASC'],
    ],
    transaction,
  });
}
