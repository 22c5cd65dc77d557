import type { Session } from '#shared/contract/session.ts';
import type { Dependencies } from '../../dependencies.ts';
import { HttpError } from '../../http/http-error.ts';
import { tooManyTries } from '../../http/rate-limits.ts';
import type { Reply } from '../../http/route.ts';
import { findMembership } from '../../identity/find-membership.ts';
import { passwordMatches } from '../../identity/password.ts';
import { presentSession } from '../../identity/present-session.ts';
import { startSession } from '../../identity/start-session.ts';
import { countTry, forgetTries } from '../../identity/tries.ts';

const TRIES = { most: 5, waitMs: 5 * 60_000 };

const wrongPair = () =>
  new HttpError(401, 'wrong-credentials', 'E-mail and password do not match', {
    detail: 'Email and password do not match. Try again.',
  });

/** Never says whether the e-mail or the password was wrong, neither in words nor in time taken. */
export async function signIn(
  dependencies: Dependencies,
  request: { email: string; password: string; address: string },
): Promise<Reply<Session>> {
  const { database, config } = dependencies;
  const email = request.email.toLowerCase();
  const key = `sign-in ${request.address} ${email}`;
  // Counted before the password is looked at, so that tries sent all at once count too.
  if ((await countTry(database, key, TRIES)) > TRIES.most) {
    throw tooManyTries('Wait 5 minutes, then try again.', TRIES.waitMs);
  }
  const person = await database.models.Person.findOne({ where: { email } });
  if (!(await passwordMatches(request.password, person?.passwordHash, config.passwordRounds)))
    throw wrongPair();
  const membership = person === null ? null : await findMembership(database, { personId: person.id });
  if (membership === null) throw wrongPair();
  await forgetTries(database, key);
  const tokens = await database.sequelize.transaction((transaction) =>
    startSession(dependencies, membership, transaction),
  );
  return { body: presentSession(membership, tokens.accessExpiresAt), session: tokens };
}
