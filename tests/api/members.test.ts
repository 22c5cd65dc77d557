import { describe, expect, it } from 'vitest';
import { membersSchema } from '#shared/contract/session.ts';
import { buildPerson } from '../support/build-person.ts';
import { buildWorkshop } from '../support/build-workshop.ts';
import { signInAs } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';

const server = await startTestServer();

describe('the list of members', () => {
  it('names the people of this workshop only, by name, with role and last visit', async () => {
    const workshop = await buildWorkshop(server);
    const owner = await buildPerson(server, { workshop, name: 'Zoe' });
    await buildPerson(server, { workshop, name: 'Abel', role: 'apprentice' });
    await buildPerson(server, { name: 'Mallory' });
    const agent = await signInAs(server, owner);
    const { items } = membersSchema.parse((await agent.get('/api/members').expect(200)).body);
    expect(items.map(({ name, role }) => [name, role])).toEqual([
      ['Abel', 'apprentice'],
      ['Zoe', 'owner'],
    ]);
    expect(items.map(({ lastHereAt }) => lastHereAt === null)).toEqual([true, false]);
    expect(JSON.stringify(items)).not.toContain('$2');
  });
});
