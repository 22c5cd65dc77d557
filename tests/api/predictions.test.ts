import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import { storedPredictionSchema } from '#shared/contract/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { EnginePool } from '../../server/src/jobs/engine-pool.ts';
import { buildDesign } from '../support/build-design.ts';
import { buildPerson } from '../support/build-person.ts';
import { anonymous, signInAs } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';
import { whistleDocument } from '../support/whistle-document.ts';

const server = await startTestServer();

async function openPrediction({ document = {} }: { document?: Partial<DesignDocument> } = {}) {
  const maker = await buildPerson(server, { role: 'maker' });
  const id = await buildDesign(server, { by: maker, document });
  return { agent: await signInAs(server, maker), address: `/api/designs/${id}/draft/prediction`, id };
}

describe('predicting the stored draft', () => {
  it('answers with the engine’s own figures and saves them', async () => {
    const { agent, address } = await openPrediction();
    const answer = await agent.post(address).expect(200);
    const stored = storedPredictionSchema.parse(answer.body);
    expect(stored.draftVersion).toBe(1);
    expect(stored.prediction).toEqual(JSON.parse(JSON.stringify(predictDesign(whistleDocument()))));
    expect(stored.sensitivities?.fingerings).toHaveLength(whistleDocument().fingerings.length);
    expect((await agent.get(address).expect(200)).body).toEqual(answer.body);
  });

  it('is there from the first save on, without the cents of each dimension until they are asked for', async () => {
    const { agent, address } = await openPrediction();
    const stored = storedPredictionSchema.parse((await agent.get(address).expect(200)).body);
    expect(stored).toMatchObject({ draftVersion: 1, sensitivities: null });
    expect(stored.prediction.fingerings).toHaveLength(9);
  });

  it('names the document by the SHA-256 of its JSON with keys in order and no spaces', async () => {
    const { agent, address } = await openPrediction();
    const { documentHash } = storedPredictionSchema.parse((await agent.post(address).expect(200)).body);
    const sorted = (value: unknown): unknown => {
      if (Array.isArray(value)) return value.map(sorted);
      if (typeof value !== 'object' || value === null) return value;
      return Object.fromEntries(
        Object.keys(value)
          .sort()
          .map((key) => [key, sorted((value as Record<string, unknown>)[key])]),
      );
    };
    const json = JSON.stringify(sorted(whistleDocument()));
    expect(documentHash).toBe(createHash('sha256').update(json).digest('hex'));
  });

  it('takes nothing from the client: what it predicts is what is stored', async () => {
    const { agent, address } = await openPrediction();
    const stored = await agent.post(address).send({ document: whistleDocument({ holes: [] }) });
    expect(storedPredictionSchema.parse(stored.body).prediction.fingerings).toHaveLength(9);
  });
});

describe('the cents of every dimension', () => {
  it('keep nobody else waiting', async () => {
    const { agent, address } = await openPrediction({ document: manyStations(120) });
    const order: string[] = [];
    const slow = agent.post(address).then((answer) => order.push(`predicted ${answer.status}`));
    const quick = anonymous(server)
      .get('/api/health')
      .then(() => order.push('healthy'));
    await Promise.all([slow, quick]);
    expect(order).toEqual(['healthy', 'predicted 200']);
  });

  it('are given up when they take too long, and say so', async () => {
    const impatient = new EnginePool(1);
    await expect(impatient.sensitivities(whistleDocument(manyStations(400)))).rejects.toMatchObject({
      status: 422,
      kind: 'too-much-work',
    });
    await impatient.close();
  });
});

/** The same straight bore, measured at more places than it needs. */
function manyStations(count: number): Partial<DesignDocument> {
  const stations = Array.from({ length: count }, (_, index) => ({
    positionMm: -4.4 + (269.4 * index) / (count - 1),
    diameterMm: 12.7,
  }));
  return { bore: { stations } };
}
