import { describe, expect, it } from 'vitest';
import { buildPerson } from '../support/build-person.ts';
import { expectProblem, pathsOf } from '../support/expect-problem.ts';
import { anonymous, signInAs } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';

const server = await startTestServer();
const newPassword = 'quite another long one';

describe('changing the password', () => {
  it('signs every other device out, keeps this one, and takes the new one from then on', async () => {
    const person = await buildPerson(server);
    const here = await signInAs(server, person);
    const elsewhere = await signInAs(server, person);
    const someoneElse = await signInAs(server, await buildPerson(server));
    await elsewhere.get('/api/session').expect(200);
    const { email, password } = person;
    await here.put('/api/account/password').send({ currentPassword: password, newPassword }).expect(204);
    await here.get('/api/session').expect(200);
    await someoneElse.get('/api/session').expect(200);
    expectProblem(await elsewhere.get('/api/session'), 401, 'signed-out');
    expectProblem(await elsewhere.post('/api/session/refresh'), 401, 'signed-out');
    const stranger = anonymous(server);
    expectProblem(await stranger.post('/api/session').send({ email, password }), 401, 'wrong-credentials');
    await stranger.post('/api/session').send({ email, password: newPassword }).expect(200);
  });

  it('refuses when the present password is not the one typed', async () => {
    const { email, password, ...person } = await buildPerson(server);
    const agent = await signInAs(server, { ...person, email, password });
    const answer = await agent.put('/api/account/password').send({ currentPassword: 'not it', newPassword });
    expect(pathsOf(expectProblem(answer, 409, 'conflict'))).toEqual(['currentPassword']);
    await anonymous(server).post('/api/session').send({ email, password }).expect(200);
  });

  it.each([
    [{ currentPassword: 'x', newPassword: 'short' }, 'newPassword', 'Use at least 10 characters.'],
    [{ newPassword }, 'currentPassword', 'Fill this in.'],
    [
      { currentPassword: 'x', newPassword, role: 'owner' },
      'role',
      'There is no field named role. Leave it out.',
    ],
  ])('names what cannot be read in %j', async (body, path, message) => {
    const agent = await signInAs(server, await buildPerson(server));
    const answer = await agent.put('/api/account/password').send(body);
    expect(expectProblem(answer, 400, 'bad-request').errors).toEqual([{ path, message }]);
  });

  it('needs a session', async () => {
    const answer = await anonymous(server)
      .put('/api/account/password')
      .send({ currentPassword: 'x', newPassword });
    expectProblem(answer, 401, 'signed-out');
  });

  it('tells apart long passwords that differ only after the 72nd byte', async () => {
    const person = await buildPerson(server);
    const agent = await signInAs(server, person);
    const long = 'ü'.repeat(60);
    const body = { currentPassword: person.password, newPassword: `${long}1` };
    await agent.put('/api/account/password').send(body).expect(204);
    const signIn = (password: string) =>
      anonymous(server).post('/api/session').send({ email: person.email, password });
    expectProblem(await signIn(`${long}2`), 401, 'wrong-credentials');
    expect((await signIn(`${long}1`)).status).toBe(200);
  });
});
