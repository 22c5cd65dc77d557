import type { Dependencies } from '../../dependencies.ts';
import { conflict, signedOut } from '../../http/http-error.ts';
import type { Caller } from '../../identity/caller.ts';
import { endOtherSessions } from '../../identity/end-sessions.ts';
import { hashPassword, passwordMatches } from '../../identity/password.ts';

/**
 * Sets a new password and signs every other device out.
 *
 * @throws HttpError 409 at `currentPassword` when it is not the present one
 */
export async function changePassword(
  { database, config, sessions }: Dependencies,
  caller: Caller,
  { currentPassword, newPassword }: { currentPassword: string; newPassword: string },
): Promise<void> {
  const person = await database.models.Person.findOne({ where: { id: caller.personId } });
  if (person === null) throw signedOut();
  if (!(await passwordMatches(currentPassword, person.passwordHash, config.passwordRounds))) {
    const message = 'This is not your present password. Nothing was changed. Type it again.';
    throw conflict(message, [{ path: 'currentPassword', message }]);
  }
  const passwordHash = await hashPassword(newPassword, config.passwordRounds);
  const ended = await database.sequelize.transaction(async (transaction) => {
    await person.update({ passwordHash }, { transaction });
    return endOtherSessions({ database }, caller, transaction);
  });
  for (const sessionId of ended) sessions.forget(sessionId);
}
