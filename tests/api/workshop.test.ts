import { describe, expect, it } from 'vitest';
import { sessionSchema, workshopSchema } from '#shared/contract/session.ts';
import { buildPerson } from '../support/build-person.ts';
import { expectProblem, pathsOf } from '../support/expect-problem.ts';
import { anonymous, signInAs } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';

const server = await startTestServer();

const opening = {
  workshopName: 'Heron Bench',
  name: 'Maud Ferrin',
  email: 'maud@heron.example',
  password: 'reeds and rushes',
};

describe('opening a workshop', () => {
  it('makes the workshop and its owner, signed in', async () => {
    const agent = anonymous(server);
    const answer = await agent.post('/api/workshops').send(opening).expect(201);
    const session = sessionSchema.parse(answer.body);
    expect(session).toMatchObject({
      person: { name: 'Maud Ferrin', email: 'maud@heron.example' },
      role: 'owner',
      workshop: { name: 'Heron Bench', unit: 'mm', a4Hz: 440, temperatureC: 24, referenceEnd: 'foot' },
    });
    const workshop = await agent.get('/api/workshop').expect(200);
    expect(workshopSchema.parse(workshop.body)).toEqual(session.workshop);
    await anonymous(server).post('/api/session').send(opening).expect(400);
    const { email, password } = opening;
    await anonymous(server).post('/api/session').send({ email, password }).expect(200);
  });

  it('refuses an address that has an account, in whatever case, and keeps nothing', async () => {
    const { email } = await buildPerson(server);
    const before = await server.database.models.Workshop.count();
    const body = { ...opening, email: email.toUpperCase() };
    const answer = await anonymous(server).post('/api/workshops').send(body);
    expect(pathsOf(expectProblem(answer, 409, 'conflict'))).toEqual(['email']);
    expect(await server.database.models.Workshop.count()).toBe(before);
  });

  it('lets one of two with the same address through', async () => {
    const body = { ...opening, email: 'twice@heron.example' };
    const answers = await Promise.all([1, 2].map(() => anonymous(server).post('/api/workshops').send(body)));
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 409]);
  });

  it('names every field that cannot be read', async () => {
    const body = { workshopName: ' ', name: '', email: 'maud', password: 'short', a4Hz: 20, extra: 1 };
    const answer = await anonymous(server).post('/api/workshops').send(body);
    const paths = pathsOf(expectProblem(answer, 400, 'bad-request'));
    expect(paths.sort()).toEqual(['a4Hz', 'email', 'extra', 'name', 'password', 'workshopName']);
  });
});

describe('the settings of a workshop', () => {
  it('are changed by an owner; what is left out stays', async () => {
    const person = await buildPerson(server);
    const agent = await signInAs(server, person);
    const before = workshopSchema.parse((await agent.get('/api/workshop').expect(200)).body);
    const changes = { a4Hz: 415, bandCents: [3, 6, 12] };
    const answer = await agent.patch('/api/workshop').send(changes).expect(200);
    expect(workshopSchema.parse(answer.body)).toEqual({ ...before, ...changes });
    expect((await agent.get('/api/workshop').expect(200)).body).toEqual(answer.body);
  });

  it('belong to one workshop', async () => {
    const agent = await signInAs(server, await buildPerson(server));
    const other = await signInAs(server, await buildPerson(server));
    await agent.patch('/api/workshop').send({ name: 'Renamed' }).expect(200);
    const theirs = workshopSchema.parse((await other.get('/api/workshop').expect(200)).body);
    expect(theirs.name).toBe('Test Yard');
  });

  it.each([
    [{ a4Hz: null }, 'a4Hz'],
    [{ a4Hz: '440' }, 'a4Hz'],
    [{ bandCents: [5, 8] }, 'bandCents'],
    [{ bandCents: [5, 8, 0.1] }, 'bandCents.2'],
    [{ unit: 'ell' }, 'unit'],
    [{ id: 7 }, 'id'],
  ])('refuse %j', async (body, path) => {
    const agent = await signInAs(server, await buildPerson(server));
    const answer = await agent.patch('/api/workshop').send(body);
    expect(pathsOf(expectProblem(answer, 400, 'bad-request'))).toEqual([path]);
  });
});
