import { createHash } from 'node:crypto';
import { Op } from 'sequelize';
import type { Database } from '../db/connect.ts';

interface Allowance {
  most: number;
  /** Counted from the last try that was still allowed. */
  waitMs: number;
}

const hashOf = (key: string) => createHash('sha256').update(key).digest('hex');

/** Counts a try and returns how many there have been; the count starts anew after a quiet time. */
export async function countTry(
  { sequelize, models }: Database,
  key: string,
  { most, waitMs }: Allowance,
): Promise<number> {
  const now = new Date();
  await models.Try.destroy({ where: { resetsAt: { [Op.lt]: now } }, limit: 100 });
  const keyHash = hashOf(key);
  // MariaDB assigns from left to right: `resets_at` is decided by the count just written.
  await sequelize.query(
    `INSERT INTO tries (key_hash, count, resets_at) VALUES (:keyHash, 1, :resetsAt)
     ON DUPLICATE KEY UPDATE
       count = IF(resets_at < :now, 1, count + 1),
       resets_at = IF(count <= :most, VALUES(resets_at), resets_at)`,
    { replacements: { keyHash, most, now, resetsAt: new Date(now.getTime() + waitMs) } },
  );
  const row = await models.Try.findOne({ where: { keyHash } });
  return row?.count ?? 1;
}

export async function forgetTries({ models }: Database, key: string): Promise<void> {
  await models.Try.destroy({ where: { keyHash: hashOf(key) } });
}
