import { createHash } from 'node:crypto';
import bcrypt from 'bcryptjs';

/** bcrypt reads 72 bytes and no more; a digest first lets every character of a long password count. */
function digest(password: string): string {
  return createHash('sha384').update(password.normalize('NFKC')).digest('base64');
}

export async function hashPassword(password: string, rounds: number): Promise<string> {
  return bcrypt.hash(digest(password), rounds);
}

const decoys = new Map<number, Promise<string>>();

/**
 * Whether a password belongs to a stored hash.
 *
 * Without a hash (nobody has this e-mail address) it takes the same time, so that a clock tells a stranger nothing.
 */
export async function passwordMatches(
  password: string,
  hash: string | undefined,
  rounds: number,
): Promise<boolean> {
  if (hash !== undefined) return bcrypt.compare(digest(password), hash);
  const decoy = decoys.get(rounds) ?? bcrypt.hash('nobody', rounds);
  decoys.set(rounds, decoy);
  await bcrypt.compare(digest(password), await decoy);
  return false;
}
