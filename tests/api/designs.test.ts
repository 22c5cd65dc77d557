import { describe, expect, it } from 'vitest';
import { designListSchema, designSummarySchema, draftSchema } from '#shared/contract/designs.ts';
import { buildDesign } from '../support/build-design.ts';
import { buildPerson } from '../support/build-person.ts';
import { buildWorkshop } from '../support/build-workshop.ts';
import { expectProblem, pathsOf } from '../support/expect-problem.ts';
import { anonymous, signInAs } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';
import { whistleDocument } from '../support/whistle-document.ts';

const server = await startTestServer();

async function makerWithDesigns(documents: Parameters<typeof whistleDocument>[0][]) {
  const maker = await buildPerson(server, { role: 'maker', name: 'Bryn' });
  const ids: number[] = [];
  for (const document of documents)
    ids.push(await buildDesign(server, { by: maker, document: document ?? {} }));
  return { maker, ids, agent: await signInAs(server, maker) };
}

async function list(
  agent: Awaited<ReturnType<typeof signInAs>>,
  query: Record<string, string | number> = {},
) {
  return designListSchema.parse((await agent.get('/api/designs').query(query).expect(200)).body);
}

const namesOf = ({ items }: { items: { name: string }[] }) => items.map((item) => item.name);

describe('making a design', () => {
  it('keeps the document, its prediction and what the rack shows of both', async () => {
    const { agent, maker } = await makerWithDesigns([]);
    const document = whistleDocument({ name: 'High whistle in D' });
    const answer = await agent.post('/api/designs').send({ document }).expect(201);
    const summary = designSummarySchema.parse(answer.body);
    expect(summary).toMatchObject({
      name: 'High whistle in D',
      kind: 'window',
      lowestNote: 'D5',
      temperament: 'equal',
      a4Hz: 440,
      draftVersion: 1,
      revisionNumber: 1,
      state: 'draft',
      archived: false,
      createdBy: { id: maker.id, name: 'Bryn' },
      outline: { mouthEndKind: 'window', mouthMm: -4.4, footMm: 265 },
    });
    expect(summary.outline.holes).toHaveLength(6);
    expect(summary.plumb).toHaveLength(7);
    expect(summary.furthest1).not.toBeNull();
    const draft = await agent.get(`/api/designs/${summary.id}/draft`).expect(200);
    expect(draftSchema.parse(draft.body).document).toEqual(document);
    await agent.get(`/api/designs/${summary.id}/draft/prediction`).expect(200);
  });

  it('keeps nothing of a document that does not hold together', async () => {
    const { agent } = await makerWithDesigns([]);
    const document = whistleDocument();
    document.holes[2]!.diameterMm = 13;
    const answer = await agent.post('/api/designs').send({ document });
    const problem = expectProblem(answer, 422, 'cannot-be-built');
    expect(pathsOf(problem)).toContain('document.holes.2.diameterMm');
    expect((await list(agent)).total).toBe(0);
  });
});

describe('the list', () => {
  it.each([
    ['name', 'asc', ['Alder fife', 'Low whistle', 'Zebrano flute']],
    ['name', 'desc', ['Zebrano flute', 'Low whistle', 'Alder fife']],
    ['lowest-note', 'asc', ['Low whistle', 'Zebrano flute', 'Alder fife']],
    ['changed', 'asc', ['Zebrano flute', 'Alder fife', 'Low whistle']],
  ])('sorts by %s, %s', async (sort, order, names) => {
    const chart = (note: string) => [{ ...whistleDocument().fingerings[0]!, note }];
    const { agent } = await makerWithDesigns([
      { name: 'Zebrano flute', fingerings: chart('D5') },
      { name: 'Alder fife', fingerings: chart('Bb5') },
      { name: 'Low whistle', fingerings: chart('C#5') },
    ]);
    expect(namesOf(await list(agent, { sort, order }))).toEqual(names);
  });

  it('cuts into pages that together hold everything once', async () => {
    const { agent } = await makerWithDesigns(Array.from({ length: 5 }, () => ({ name: 'Same name' })));
    const pages = await Promise.all(
      [1, 2, 3].map((page) => list(agent, { page, pageSize: 2, sort: 'name' })),
    );
    expect(pages.map((page) => page.items.length)).toEqual([2, 2, 1]);
    expect(new Set(pages.flatMap((page) => page.items.map((item) => item.id))).size).toBe(5);
    expect(pages.map((page) => page.total)).toEqual([5, 5, 5]);
    expect((await list(agent, { page: 9 })).items).toEqual([]);
  });

  it.each([
    ['50%', ['50% longer']],
    ['_', ['a_b']],
    ['\\', ['back\\slash']],
    ['WHISTLE high', ['High whistle']],
    ["' OR 1=1 --", []],
    ['zzz', []],
  ])('finds %j as it is typed', async (search, names) => {
    const { agent } = await makerWithDesigns(
      ['50% longer', '500 longer', 'a_b', 'axb', 'back\\slash', 'High whistle'].map((name) => ({ name })),
    );
    const found = await list(agent, { search });
    expect(namesOf(found)).toEqual(names);
    expect(found.total).toBe(names.length);
    expect(found.counts.all).toBe(6);
  });

  it('filters by kind, own work and archive, and counts what each would show', async () => {
    const workshop = await buildWorkshop(server);
    const ines = await buildPerson(server, { workshop });
    const bryn = await buildPerson(server, { workshop, role: 'maker' });
    const pipe = { mouthEnd: { kind: 'ideal-open', correctionScale: 1 }, ...boreFrom(0) } as const;
    await buildDesign(server, { by: ines, document: { name: 'Hers' } });
    await buildDesign(server, { by: bryn, document: { name: 'His', ...pipe } });
    await buildDesign(server, { by: bryn, document: { name: 'Old' }, archived: true });
    await buildDesign(server, { by: await buildPerson(server), document: { name: 'Of another workshop' } });
    const agent = await signInAs(server, bryn);
    expect(namesOf(await list(agent, { kind: 'window' }))).toEqual(['Hers']);
    expect(namesOf(await list(agent, { mine: 'true' }))).toEqual(['His']);
    expect(namesOf(await list(agent, { archived: 'true' }))).toEqual(['Old']);
    const counts = { all: 2, mine: 1, archived: 1, kinds: { window: 1, 'ideal-open': 1 } };
    expect((await list(agent)).counts).toEqual(counts);
  });

  it.each([
    [{ sort: 'name; DROP TABLE designs' }, 'sort'],
    [{ pageSize: '1000' }, 'pageSize'],
    [{ page: '0' }, 'page'],
    [{ page: '1e6' }, 'page'],
    [{ kind: 'drum' }, 'kind'],
    [{ workshopId: '1' }, 'workshopId'],
    [{ mine: 'perhaps' }, 'mine'],
  ])('refuses the query %j', async (query, path) => {
    const { agent } = await makerWithDesigns([]);
    const answer = await agent.get('/api/designs').query(query);
    expect(pathsOf(expectProblem(answer, 400, 'bad-request'))).toEqual([path]);
  });
});

describe('one design', () => {
  it.each([
    "<script>alert('x')</script>",
    "'; DROP TABLE designs; --",
    '🎶 Flöte "№ 1" \\ %',
    '"><img src=x>',
  ])('is called %s as it is typed', async (name) => {
    const { agent, ids } = await makerWithDesigns([{}]);
    const renamed = await agent.patch(`/api/designs/${ids[0]!}`).send({ name }).expect(200);
    expect(designSummarySchema.parse(renamed.body)).toMatchObject({ name, draftVersion: 2 });
    const read = await agent.get(`/api/designs/${ids[0]!}`).expect(200);
    expect(designSummarySchema.parse(read.body).name).toBe(name);
    const draft = draftSchema.parse((await agent.get(`/api/designs/${ids[0]!}/draft`).expect(200)).body);
    expect(draft.document.name).toBe(name);
    expect(namesOf(await list(agent))).toEqual([name]);
  });

  it('is copied with its draft under a name of its own', async () => {
    const { agent, ids } = await makerWithDesigns([{ name: 'First' }]);
    const answer = await agent.post(`/api/designs/${ids[0]!}/copies`).send({ name: 'Second' }).expect(201);
    const copy = designSummarySchema.parse(answer.body);
    expect(copy).toMatchObject({ name: 'Second', draftVersion: 1 });
    const draft = draftSchema.parse((await agent.get(`/api/designs/${copy.id}/draft`).expect(200)).body);
    expect(draft.document).toEqual(whistleDocument({ name: 'Second' }));
    expect(namesOf(await list(agent, { sort: 'name', order: 'asc' }))).toEqual(['First', 'Second']);
  });

  it('goes into the archive and comes back, twice as well as once', async () => {
    const { agent, ids } = await makerWithDesigns([{ name: 'Once' }]);
    const address = `/api/designs/${ids[0]!}`;
    for (let round = 0; round < 2; round += 1) {
      const answer = await agent.post(`${address}/archive`).expect(200);
      expect(designSummarySchema.parse(answer.body).archived).toBe(true);
    }
    expect(namesOf(await list(agent))).toEqual([]);
    expectProblem(await agent.patch(address).send({ name: 'Twice' }), 409, 'conflict');
    for (let round = 0; round < 2; round += 1) {
      const answer = await agent.post(`${address}/restore`).expect(200);
      expect(designSummarySchema.parse(answer.body).archived).toBe(false);
    }
    expect(namesOf(await list(agent))).toEqual(['Once']);
  });

  it('keeps both changes when a rename and a save cross', async () => {
    const { agent, ids } = await makerWithDesigns([{}]);
    const address = `/api/designs/${ids[0]!}`;
    const answers = await Promise.all(['A', 'B', 'C'].map((name) => agent.patch(address).send({ name })));
    expect(answers.map((answer) => answer.status)).toEqual([200, 200, 200]);
    expect((await agent.get(address).expect(200)).body).toMatchObject({ draftVersion: 4 });
  });

  it.each([
    ['', 'Give the design a name.'],
    ['  ', 'Give the design a name.'],
    ['x'.repeat(121), 'Use at most 120 characters.'],
  ])('is not renamed to %j', async (name, message) => {
    const { agent, ids } = await makerWithDesigns([{}]);
    const answer = await agent.patch(`/api/designs/${ids[0]!}`).send({ name });
    expect(expectProblem(answer, 400, 'bad-request').errors).toEqual([{ path: 'name', message }]);
  });

  it('answers alike for a design of another workshop and for none at all', async () => {
    const theirs = await buildDesign(server, { by: await buildPerson(server) });
    const { agent } = await makerWithDesigns([]);
    const strange = expectProblem(await agent.get(`/api/designs/${theirs}`), 404, 'not-found');
    const none = expectProblem(await agent.get('/api/designs/2147483647'), 404, 'not-found');
    const { requestId: first, ...strangeBody } = strange;
    const { requestId: second, ...noneBody } = none;
    expect(strangeBody).toEqual(noneBody);
    expect(first).not.toBe(second);
  });

  it.each(['abc', '0', '-1', '1.5', '2147483648', '1%20OR%201=1'])('refuses the id %s', async (id) => {
    const { agent } = await makerWithDesigns([]);
    expect(pathsOf(expectProblem(await agent.get(`/api/designs/${id}`), 400, 'bad-request'))).toEqual(['id']);
  });

  it('needs a session', async () => {
    expectProblem(await anonymous(server).get('/api/designs/1'), 401, 'signed-out');
  });
});

function boreFrom(positionMm: number) {
  const stations = (diameterMm: number) => ({
    stations: [
      { positionMm, diameterMm },
      { positionMm: 265, diameterMm },
    ],
  });
  return { bore: stations(12.7), outside: stations(17.5) };
}
