import { createHash } from 'node:crypto';
import { Op, QueryTypes } from 'sequelize';
import type { Database } from '../db/connect.ts';

interface Allowance {
  most: number;
  /** Counted from the last try that was still allowed. */
  waitMs: number;
}

const hashOf = (key: string) => createHash('sha256').update(key).digest('hex');

/** Counts a try and returns how many there have been; the count starts anew after a quiet time. */
export async function countTry(
  { sequelize }: Database,
  key: string,
  { most, waitMs }: Allowance,
): Promise<number> {
  const now = new Date();
  // One statement, so that of tries sent all at once each gets a number of its own.
  // MariaDB assigns from left to right: `resets_at` is decided by the count just written.
  const [row] = await sequelize.query<{ count: number }>(
    `INSERT INTO tries (key_hash, count, resets_at) VALUES (:keyHash, 1, :resetsAt)
     ON DUPLICATE KEY UPDATE
       count = IF(resets_at < :now, 1, count + 1),
       resets_at = IF(count <= :most, VALUES(resets_at), resets_at)
     RETURNING count`,
    {
      replacements: { keyHash: hashOf(key), most, now, resetsAt: new Date(now.getTime() + waitMs) },
      type: QueryTypes.SELECT,
    },
  );
  if (row === undefined) throw new TypeError('A try was counted and no count came back.');
  return row.count;
}

/** Forgets the tries under this key, and with them all that have run out. */
export async function forgetTries({ models }: Database, key: string): Promise<void> {
  await models.Try.destroy({
    where: { [Op.or]: [{ keyHash: hashOf(key) }, { resetsAt: { [Op.lt]: new Date() } }] },
  });
}
