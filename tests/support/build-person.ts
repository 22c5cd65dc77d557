import { randomBytes } from 'node:crypto';
import type { Role } from '#shared/contract/session.ts';
import { hashPassword } from '../../server/src/identity/password.ts';
import { buildWorkshop, type BuiltWorkshop } from './build-workshop.ts';
import type { TestServer } from './start-test-server.ts';

export interface BuiltPerson {
  id: number;
  name: string;
  email: string;
  password: string;
  role: Role;
  workshop: BuiltWorkshop;
}

interface PersonSettings {
  role?: Role;
  name?: string;
  workshop?: BuiltWorkshop;
}

/** Someone who can sign in; an owner of a workshop of their own unless told otherwise. */
export async function buildPerson(server: TestServer, settings: PersonSettings = {}): Promise<BuiltPerson> {
  const { role = 'owner', name = 'Test Person' } = settings;
  const workshop = settings.workshop ?? (await buildWorkshop(server));
  const { Person, Membership } = server.database.models;
  const password = 'a long enough one';
  const email = `${randomBytes(6).toString('hex')}@yard.example`;
  const passwordHash = await hashPassword(password, server.config.passwordRounds);
  const { id } = await Person.create({ name, email, passwordHash });
  await Membership.create({ workshopId: workshop.id, personId: id, role });
  return { id, name, email, password, role, workshop };
}
