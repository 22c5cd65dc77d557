import { describe, expect, it } from 'vitest';
import { sessionSchema } from '#shared/contract/session.ts';
import { SessionDirectory } from '../../server/src/identity/session-directory.ts';
import { signAccessToken } from '../../server/src/identity/access-token.ts';
import { buildPerson } from '../support/build-person.ts';
import { expectProblem, pathsOf } from '../support/expect-problem.ts';
import { anonymous, signInAs } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';

const server = await startTestServer();

const cookiesOf = (headers: unknown) => (headers as { 'set-cookie'?: string[] })['set-cookie'] ?? [];
const refreshTokenIn = (headers: unknown) =>
  cookiesOf(headers)
    .find((cookie) => cookie.startsWith('borewright_refresh='))!
    .split(';')[0]!;

describe('signing in', () => {
  it('answers with the session and keeps it in cookies that scripts cannot read', async () => {
    const person = await buildPerson(server, { role: 'maker', name: 'Bryn' });
    const agent = anonymous(server);
    const { email, password } = person;
    const answer = await agent
      .post('/api/session')
      .send({ email: email.toUpperCase(), password })
      .expect(200);
    const session = sessionSchema.parse(answer.body);
    expect(session.person).toEqual({ id: person.id, name: 'Bryn', email });
    expect(session.role).toBe('maker');
    for (const cookie of cookiesOf(answer.headers)) {
      expect(cookie).toMatch(/; HttpOnly/);
      expect(cookie).toMatch(/; SameSite=(Lax|Strict)/);
      expect(cookie).toMatch(/; Path=\/api/);
    }
    const again = await agent.get('/api/session').expect(200);
    expect(sessionSchema.parse(again.body)).toEqual(session);
  });

  it('never says which of e-mail and password was wrong', async () => {
    const { email, password } = await buildPerson(server);
    const agent = anonymous(server);
    const wrongPassword = await agent.post('/api/session').send({ email, password: `${password}!` });
    const unknownEmail = await agent.post('/api/session').send({ email: 'no@yard.example', password });
    const first = expectProblem(wrongPassword, 401, 'wrong-credentials');
    expect(first.detail).toBe('Email and password do not match. Try again.');
    expect(expectProblem(unknownEmail, 401, 'wrong-credentials').detail).toBe(first.detail);
    expect(cookiesOf(unknownEmail.headers)).toEqual([]);
  });

  it('lets five wrong tries pass and then asks for five minutes, even with the right password', async () => {
    const { email, password } = await buildPerson(server);
    const other = await buildPerson(server);
    const agent = anonymous(server);
    const wrong = () => agent.post('/api/session').send({ email, password: 'wrong' });
    const statuses = (await Promise.all(Array.from({ length: 8 }, wrong))).map((answer) => answer.status);
    expect(statuses.filter((status) => status === 401)).toHaveLength(5);
    expect(statuses.filter((status) => status === 429)).toHaveLength(3);
    const right = await agent.post('/api/session').send({ email, password });
    expect(expectProblem(right, 429, 'too-many-tries').detail).toBe('Wait 5 minutes, then try again.');
    expect(right.headers['retry-after']).toBe('300');
    await agent.post('/api/session').send({ email: other.email, password: other.password }).expect(200);
  });

  it('counts anew after the right password', async () => {
    const { email, password } = await buildPerson(server);
    const agent = anonymous(server);
    for (let round = 0; round < 2; round += 1) {
      for (let wrong = 0; wrong < 4; wrong += 1) {
        await agent.post('/api/session').send({ email, password: 'wrong' }).expect(401);
      }
      await agent.post('/api/session').send({ email, password }).expect(200);
    }
  });

  it.each([
    [{ email: 'not an address', password: 'x' }, ['email']],
    [{ email: 'a@b.example' }, ['password']],
    [{ email: 'a@b.example', password: 'x', remember: true }, ['remember']],
    [{ email: { $gt: '' }, password: ['x'] }, ['email', 'password']],
    [[], ['']],
  ])('names the fields that cannot be read: %j', async (body, paths) => {
    const answer = await anonymous(server).post('/api/session').send(body);
    expect(pathsOf(expectProblem(answer, 400, 'bad-request'))).toEqual(paths);
  });
});

describe('a session', () => {
  it('needs a token', async () => {
    expectProblem(await anonymous(server).get('/api/session'), 401, 'signed-out');
  });

  it.each([
    [
      'of another secret',
      (id: number) => signAccessToken(id, 'some other secret of thirty-two letters').token,
    ],
    ['without a signature', (id: number) => unsigned({ sid: id, exp: 4_000_000_000 })],
    ['that is no token', () => 'borewright'],
  ])('refuses a token %s', async (_, tokenFor) => {
    const person = await buildPerson(server);
    await signInAs(server, person);
    const session = await server.database.models.Session.findOne({ where: { personId: person.id } });
    const answer = await anonymous(server)
      .get('/api/session')
      .set('Cookie', `borewright_access=${tokenFor(session!.id)}`);
    expectProblem(answer, 401, 'signed-out');
  });

  it('is over at once when signed out, and the cookies are taken back', async () => {
    const agent = await signInAs(server, await buildPerson(server));
    await agent.get('/api/session').expect(200);
    const answer = await agent.delete('/api/session').expect(204);
    expect(cookiesOf(answer.headers).every((cookie) => cookie.includes('Expires=Thu, 01 Jan 1970'))).toBe(
      true,
    );
    expectProblem(await agent.get('/api/session'), 401, 'signed-out');
    expectProblem(await agent.post('/api/session/refresh'), 401, 'signed-out');
  });

  it('is over in another process of the same database within the time it trusts what it knows', async () => {
    const person = await buildPerson(server);
    const agent = await signInAs(server, person);
    const row = await server.database.models.Session.findOne({ where: { personId: person.id } });
    const elsewhere = new SessionDirectory(server.database);
    expect(await elsewhere.find(row!.id)).toMatchObject({ personId: person.id });
    await agent.delete('/api/session').expect(204);
    await expect.poll(() => elsewhere.find(row!.id), { timeout: 5_000 }).toBeNull();
  });
});

describe('refreshing', () => {
  it('gives a new pair of tokens and a later end', async () => {
    const person = await buildPerson(server);
    const agent = anonymous(server);
    const { email, password } = person;
    const signedIn = await agent.post('/api/session').send({ email, password }).expect(200);
    const refreshed = await agent.post('/api/session/refresh').expect(200);
    expect(sessionSchema.parse(refreshed.body).person.id).toBe(person.id);
    expect(refreshTokenIn(refreshed.headers)).not.toBe(refreshTokenIn(signedIn.headers));
    await agent.post('/api/session/refresh').expect(200);
  });

  it('ends the whole session when a used token comes again', async () => {
    const { email, password } = await buildPerson(server);
    const owner = anonymous(server);
    const signedIn = await owner.post('/api/session').send({ email, password }).expect(200);
    await owner.post('/api/session/refresh').expect(200);
    const stolen = refreshTokenIn(signedIn.headers);
    const thief = await anonymous(server).post('/api/session/refresh').set('Cookie', stolen);
    expectProblem(thief, 401, 'signed-out');
    expectProblem(await owner.get('/api/session'), 401, 'signed-out');
    expectProblem(await owner.post('/api/session/refresh'), 401, 'signed-out');
  });

  it('gives one token to one of two that come at the same moment', async () => {
    const { email, password } = await buildPerson(server);
    const signedIn = await anonymous(server).post('/api/session').send({ email, password }).expect(200);
    const token = refreshTokenIn(signedIn.headers);
    const answers = await Promise.all(
      [1, 2, 3].map(() => anonymous(server).post('/api/session/refresh').set('Cookie', token)),
    );
    expect(answers.filter((answer) => answer.status === 200).length).toBeLessThanOrEqual(1);
  });

  it('stores no token that could be used', async () => {
    const { email, password } = await buildPerson(server);
    const signedIn = await anonymous(server).post('/api/session').send({ email, password }).expect(200);
    const token = refreshTokenIn(signedIn.headers).split('=')[1]!;
    const rows = await server.database.models.RefreshToken.findAll();
    expect(rows.map((row) => row.tokenHash)).not.toContain(token);
    expect(rows.every((row) => /^[0-9a-f]{64}$/.test(row.tokenHash))).toBe(true);
  });

  it.each([
    ['nothing', ''],
    ['an unknown token', 'borewright_refresh=abc'],
  ])('refuses %s', async (_, cookie) => {
    const answer = await anonymous(server).post('/api/session/refresh').set('Cookie', cookie);
    expectProblem(answer, 401, 'signed-out');
  });
});

function unsigned(claims: object): string {
  const part = (value: object) => Buffer.from(JSON.stringify(value)).toString('base64url');
  return `${part({ alg: 'none', typ: 'JWT' })}.${part(claims)}.`;
}
