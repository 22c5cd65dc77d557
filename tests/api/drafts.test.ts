import { describe, expect, it } from 'vitest';
import { draftSchema, newerDraftSchema } from '#shared/contract/designs.ts';
import { storedPredictionSchema } from '#shared/contract/prediction.ts';
import { buildDesign } from '../support/build-design.ts';
import { buildPerson } from '../support/build-person.ts';
import { expectProblem, pathsOf } from '../support/expect-problem.ts';
import { signInAs } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';
import { whistleDocument } from '../support/whistle-document.ts';

const server = await startTestServer();

async function openDraft() {
  const ines = await buildPerson(server, { name: 'Ines' });
  const id = await buildDesign(server, { by: ines });
  const bryn = await buildPerson(server, { role: 'maker', name: 'Bryn', workshop: ines.workshop });
  const address = `/api/designs/${id}/draft`;
  return { id, address, ines: await signInAs(server, ines), bryn: await signInAs(server, bryn) };
}

const movedHole = (positionMm: number) => {
  const document = whistleDocument();
  document.holes[3]!.positionMm = positionMm;
  return document;
};

describe('reading a draft', () => {
  it('carries its version as ETag, and is not sent again to someone who has it', async () => {
    const { ines, address } = await openDraft();
    const answer = await ines.get(address).expect(200);
    expect(answer.headers.etag).toBe('"1"');
    expect(draftSchema.parse(answer.body)).toMatchObject({ version: 1, savedBy: { name: 'Ines' } });
    const again = await ines.get(address).set('If-None-Match', '"1"').expect(304);
    expect(again.text).toBe('');
    await ines.get(address).set('If-None-Match', '"2"').expect(200);
  });
});

describe('saving a draft', () => {
  it('moves the version on and says who saved', async () => {
    const { ines, bryn, address, id } = await openDraft();
    const document = movedHole(187.5);
    const answer = await bryn.put(address).set('If-Match', '"1"').send({ document }).expect(200);
    expect(answer.headers.etag).toBe('"2"');
    const saved = draftSchema.parse(answer.body);
    expect(saved).toMatchObject({ version: 2, savedBy: { name: 'Bryn' }, document });
    expect((await ines.get(address).expect(200)).body).toEqual(answer.body);
    const summary = await ines.get(`/api/designs/${id}`).expect(200);
    expect(summary.body).toMatchObject({ draftVersion: 2, changedBy: { name: 'Bryn' } });
    const prediction = await ines.get(`${address}/prediction`).expect(200);
    expect(storedPredictionSchema.parse(prediction.body).draftVersion).toBe(2);
  });

  it('tells the slower of two what the faster saved, and keeps nothing of the slower', async () => {
    const { ines, bryn, address } = await openDraft();
    await ines
      .put(address)
      .set('If-Match', '"1"')
      .send({ document: movedHole(187) })
      .expect(200);
    const answer = await bryn
      .put(address)
      .set('If-Match', '"1"')
      .send({ document: movedHole(188) });
    const problem = expectProblem(answer, 412, 'newer-version');
    expect(problem.detail).toContain('Ines saved a newer version');
    const { newer } = newerDraftSchema.parse(answer.body);
    expect(newer).toMatchObject({ version: 2, savedBy: { name: 'Ines' }, document: movedHole(187) });
    expect(draftSchema.parse((await bryn.get(address).expect(200)).body)).toEqual(newer);
    await bryn
      .put(address)
      .set('If-Match', '"2"')
      .send({ document: movedHole(188) })
      .expect(200);
  });

  it('lets exactly one of many at the same moment through', async () => {
    const { ines, address } = await openDraft();
    const answers = await Promise.all(
      [186, 187, 188, 189].map((at) =>
        ines
          .put(address)
          .set('If-Match', '"1"')
          .send({ document: movedHole(at) }),
      ),
    );
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 412, 412, 412]);
    expect((await ines.get(address).expect(200)).body).toMatchObject({ version: 2 });
  });

  it('needs the version that was seen', async () => {
    const { ines, address } = await openDraft();
    const answer = await ines.put(address).send({ document: movedHole(187) });
    expectProblem(answer, 428, 'version-required');
    expect((await ines.get(address).expect(200)).body).toMatchObject({ version: 1 });
  });

  it.each(['1', '*', 'W/"1"', '"1", "2"', '"one"', '"-1"'])('cannot read %s as a version', async (tag) => {
    const { ines, address } = await openDraft();
    const answer = await ines
      .put(address)
      .set('If-Match', tag)
      .send({ document: movedHole(187) });
    expectProblem(answer, 400, 'bad-request');
  });

  it('refuses a design in the archive', async () => {
    const { ines, address, id } = await openDraft();
    await ines.post(`/api/designs/${id}/archive`).expect(200);
    const answer = await ines
      .put(address)
      .set('If-Match', '"1"')
      .send({ document: movedHole(187) });
    expectProblem(answer, 409, 'conflict');
  });

  it('keeps nothing of a document that does not hold together', async () => {
    const { ines, address } = await openDraft();
    const before = (await ines.get(address).expect(200)).body as unknown;
    const answer = await ines
      .put(address)
      .set('If-Match', '"1"')
      .send({ document: movedHole(9999 / 10) });
    expect(pathsOf(expectProblem(answer, 422, 'cannot-be-built'))).toEqual(['document.holes.3.positionMm']);
    expect((await ines.get(address).expect(200)).body).toEqual(before);
  });
});
