import { beforeAll, describe, expect, it } from 'vitest';
import { ROLES, type Role } from '#shared/contract/session.ts';
import { allRoutes } from '../../server/src/app.ts';
import { buildDesign } from '../support/build-design.ts';
import { buildPerson } from '../support/build-person.ts';
import { buildWorkshop } from '../support/build-workshop.ts';
import { expectProblem } from '../support/expect-problem.ts';
import { anonymous, signInAs } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';
import { whistleDocument } from '../support/whistle-document.ts';

const server = await startTestServer();

/** Written out by hand: the order is owner, mentor, maker, apprentice, visitor; `*` for all, `-` for none. */
const ALL = 'omkav';
const DESIGNERS = 'omk';
const MAKERS = 'omka';

interface Expectation {
  /** Whose requests get through. */
  may: string;
  /** What is sent, so that only the role can be the reason for a refusal. */
  body?: object;
  headers?: Record<string, string>;
}

const EXPECTED: Record<string, Expectation | 'open'> = {
  'post /session': 'open',
  'post /session/refresh': 'open',
  'post /workshops': 'open',
  'get /health': 'open',
  'get /session': { may: ALL },
  'delete /session': { may: ALL },
  'put /account/password': {
    may: ALL,
    body: { currentPassword: 'a long enough one', newPassword: 'a long enough one' },
  },
  'get /workshop': { may: ALL },
  'patch /workshop': { may: 'o', body: { a4Hz: 442 } },
  'get /members': { may: 'om' },
  'get /designs': { may: ALL },
  'post /designs': { may: DESIGNERS, body: { document: whistleDocument() } },
  'get /designs/:id': { may: ALL },
  'patch /designs/:id': { may: MAKERS, body: { name: 'Renamed' } },
  'post /designs/:id/copies': { may: DESIGNERS, body: { name: 'Copy' } },
  'post /designs/:id/archive': { may: MAKERS },
  'post /designs/:id/restore': { may: MAKERS },
  'get /designs/:id/draft': { may: ALL },
  'put /designs/:id/draft': {
    may: MAKERS,
    body: { document: whistleDocument() },
    headers: { 'If-Match': '"1"' },
  },
  'get /designs/:id/draft/prediction': { may: ALL },
  'post /designs/:id/draft/prediction': { may: MAKERS },
  'get /designs/:id/draft/sheet.pdf': { may: MAKERS },
};

const LETTERS: Record<Role, string> = { owner: 'o', mentor: 'm', maker: 'k', apprentice: 'a', visitor: 'v' };
const routes = allRoutes(server);
const keyOf = (route: { method: string; path: string }) => `${route.method} ${route.path}`;

/** Whose design the address names, as seen by the one who asks. */
const WHOSE = ['own', "a colleague's", "another workshop's"] as const;
type Whose = (typeof WHOSE)[number];

/** Screens and contract: a colleague's work is seen by everyone but apprentices and visitors, who see only what is theirs. */
function isVisible(role: Role, whose: Whose): boolean {
  if (whose === "another workshop's" || role === 'visitor') return false;
  return whose === 'own' || role !== 'apprentice';
}

const cells = routes.flatMap((route) => {
  const expectation = EXPECTED[keyOf(route)];
  if (expectation === undefined || expectation === 'open') return [];
  const places: readonly Whose[] = route.path.includes(':id') ? WHOSE : ['own'];
  return ROLES.flatMap((role) =>
    places.map((whose) => ({ key: keyOf(route), route, expectation, role, whose })),
  );
});

let strangerDesign: number;
beforeAll(async () => {
  strangerDesign = await buildDesign(server, { by: await buildPerson(server) });
});

async function designIdFor(whose: Whose, person: Awaited<ReturnType<typeof buildPerson>>): Promise<number> {
  if (whose === "another workshop's") return strangerDesign;
  const by = whose === 'own' ? person : await buildPerson(server, { workshop: person.workshop });
  return buildDesign(server, { by });
}

describe('role by route', () => {
  it('covers every route there is', () => {
    expect(Object.keys(EXPECTED).sort()).toEqual(routes.map(keyOf).sort());
  });

  it.each(cells)('$key, $role, $whose', async ({ route, expectation, role, whose }) => {
    const workshop = await buildWorkshop(server);
    const person = await buildPerson(server, { role, workshop });
    const agent = await signInAs(server, person);
    const path = `/api${route.path.replace(':id', String(await designIdFor(whose, person)))}`;
    const request = agent[route.method](path).set(expectation.headers ?? {});
    const answer = await (expectation.body === undefined ? request : request.send(expectation.body));
    if (!expectation.may.includes(LETTERS[role])) {
      expect(expectProblem(answer, 403, 'not-allowed').detail).toMatch(/\. Ask /);
    } else if (route.path.includes(':id') && !isVisible(role, whose)) {
      expectProblem(answer, 404, 'not-found');
    } else {
      expect(answer.status).toBe(route.answer.status);
    }
  });

  it.each(routes.filter((route) => EXPECTED[keyOf(route)] !== 'open'))(
    '$method $path needs a session',
    async (route) => {
      const path = `/api${route.path.replace(':id', String(strangerDesign))}`;
      expectProblem(await anonymous(server)[route.method](path).send({}), 401, 'signed-out');
    },
  );
});

describe('the list of designs', () => {
  it.each([
    ['owner', ['Apprentice piece', 'Maker piece']],
    ['mentor', ['Apprentice piece', 'Maker piece']],
    ['apprentice', ['Apprentice piece']],
    ['visitor', []],
  ] as const)('shows a %s %j', async (role, names) => {
    const workshop = await buildWorkshop(server);
    const maker = await buildPerson(server, { workshop, role: 'maker' });
    const person = await buildPerson(server, { workshop, role });
    const apprentice =
      role === 'apprentice' ? person : await buildPerson(server, { workshop, role: 'apprentice' });
    await buildDesign(server, { by: maker, document: { name: 'Maker piece' } });
    await buildDesign(server, { by: apprentice, document: { name: 'Apprentice piece' } });
    const agent = await signInAs(server, person);
    const answer = await agent.get('/api/designs?sort=name&order=asc').expect(200);
    const { items, total, counts } = answer.body as {
      items: { name: string }[];
      total: number;
      counts: { all: number };
    };
    expect(items.map((item) => item.name)).toEqual(names);
    expect([total, counts.all]).toEqual([names.length, names.length]);
  });
});

describe('a role that is taken away', () => {
  it('is felt by a session that is open', async () => {
    const person = await buildPerson(server, { role: 'owner' });
    const agent = await signInAs(server, person);
    await agent.get('/api/members').expect(200);
    await server.database.models.Membership.update({ role: 'maker' }, { where: { personId: person.id } });
    await expect.poll(async () => (await agent.get('/api/members')).status, { timeout: 5_000 }).toBe(403);
  });
});
