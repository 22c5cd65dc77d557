import request from 'supertest';
import { startSession } from '../../server/src/identity/start-session.ts';
import type { BuiltPerson } from './build-person.ts';
import type { TestServer } from './start-test-server.ts';

/** Requests in the name of a person: a session is written for them, without going through the sign-in page. */
export async function signInAs(server: TestServer, person: BuiltPerson) {
  const tokens = await server.database.sequelize.transaction((transaction) =>
    startSession(server, { personId: person.id, workshopId: person.workshop.id }, transaction),
  );
  const cookie = `borewright_access=${tokens.accessToken}; borewright_refresh=${tokens.refreshToken}`;
  const agent = request.agent(server.address);
  agent.set('Cookie', cookie);
  return agent;
}

/** Requests in nobody's name; cookies that come are kept, as a browser does. */
export function anonymous(server: TestServer) {
  return request.agent(server.address);
}
