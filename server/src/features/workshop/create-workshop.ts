import { UniqueConstraintError } from 'sequelize';
import type { z } from 'zod';
import type { createWorkshopRequest, Session } from '#shared/contract/session.ts';
import type { Dependencies } from '../../dependencies.ts';
import { conflict } from '../../http/http-error.ts';
import type { Reply } from '../../http/route.ts';
import { findMembership } from '../../identity/find-membership.ts';
import { hashPassword } from '../../identity/password.ts';
import { presentSession } from '../../identity/present-session.ts';
import { startSession } from '../../identity/start-session.ts';

type Request = z.output<typeof createWorkshopRequest>;

/** @throws HttpError 409 at `email` when it belongs to an account already */
export async function createWorkshop(dependencies: Dependencies, request: Request): Promise<Reply<Session>> {
  try {
    return await openWorkshop(dependencies, request);
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    const message = 'This address has an account. Sign in with it, or use another address.';
    throw conflict(message, [{ path: 'email', message }]);
  }
}

async function openWorkshop(dependencies: Dependencies, request: Request): Promise<Reply<Session>> {
  const { database, config } = dependencies;
  const { Workshop, Person, Membership } = database.models;
  const passwordHash = await hashPassword(request.password, config.passwordRounds);
  const { workshopName, name, unit, a4Hz, temperatureC } = request;
  return database.sequelize.transaction(async (transaction) => {
    const email = request.email.toLowerCase();
    const person = await Person.create({ name, email, passwordHash }, { transaction });
    const workshop = await Workshop.create({ name: workshopName, unit, a4Hz, temperatureC }, { transaction });
    const owner = { personId: person.id, workshopId: workshop.id };
    await Membership.create({ ...owner, role: 'owner' }, { transaction });
    const tokens = await startSession(dependencies, owner, transaction);
    const membership = await findMembership(database, owner, transaction);
    if (membership === null) throw new TypeError('A membership just made is not there.');
    return { body: presentSession(membership, tokens.accessExpiresAt), session: tokens };
  });
}
