import { request as httpRequest } from 'node:http';
import { describe, expect, it } from 'vitest';
import { problemSchema } from '#shared/contract/problem.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { buildPerson } from '../support/build-person.ts';
import { expectProblem, pathsOf } from '../support/expect-problem.ts';
import { anonymous, signInAs } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';
import { whistleDocument } from '../support/whistle-document.ts';

const server = await startTestServer();
const person = await buildPerson(server, { role: 'maker' });
const agent = await signInAs(server, person);

async function expectNothingKept() {
  expect((await agent.get('/api/designs').expect(200)).body).toMatchObject({ total: 0 });
}

const postRaw = (text: string) =>
  agent.post('/api/designs').set('Content-Type', 'application/json').send(text);

/** The document with one value put in as text of JSON, so that what no program would write can be sent too. */
function withValue(path: string, json: string): string {
  const keys = path.split('.');
  const document = structuredClone(whistleDocument()) as unknown as Record<string, unknown>;
  const holder = keys.slice(0, -1).reduce((part, key) => part[key] as Record<string, unknown>, document);
  holder[keys.at(-1)!] = '@@';
  return JSON.stringify({ document }).replace('"@@"', json);
}

describe('a document that cannot be read', () => {
  it.each([
    ['holes.0.diameterMm', 'null'],
    ['holes.0.diameterMm', '1e999'],
    ['holes.0.diameterMm', '-1e999'],
    ['holes.0.diameterMm', '-6'],
    ['holes.0.diameterMm', '0'],
    ['holes.0.diameterMm', '"6"'],
    ['holes.0.diameterMm', '[6]'],
    ['holes.0.positionMm', '1e9'],
    ['bore.stations.1.positionMm', 'null'],
    ['bore.stations.1.diameterMm', '-12.7'],
    ['mouthEnd.widthMm', '-9'],
    ['mouthEnd.kind', '"drum"'],
    ['air.temperatureC', '900'],
    ['pitch.a4Hz', '0'],
    ['fingerings.0.note', '"H9"'],
    ['fingerings.0.register', '1.5'],
    ['format', '"borewright-design/2"'],
    ['name', '""'],
    ['name', '{"$ne":1}'],
  ])('%s: %s', async (path, json) => {
    const problem = expectProblem(await postRaw(withValue(path, json)), 400, 'bad-request');
    expect(pathsOf(problem)).toEqual([`document.${path}`]);
    expect(problem.errors![0]!.message).toMatch(/^[A-Z].*\.$/);
    expect(problem.errors![0]!.message).not.toMatch(/invalid|NaN|undefined/i);
    await expectNothingKept();
  });

  it.each([
    [
      '401 stations',
      'bore.stations',
      Array.from({ length: 401 }, (_, i) => ({ positionMm: i - 4.4, diameterMm: 12.7 })),
    ],
    [
      '25 holes',
      'holes',
      Array.from({ length: 25 }, (_, i) => ({ ...whistleDocument().holes[0]!, id: `h${i}` })),
    ],
    [
      '121 fingerings',
      'fingerings',
      Array.from({ length: 121 }, (_, i) => ({ ...whistleDocument().fingerings[0]!, id: `f${i}` })),
    ],
  ])('%s', async (_, path, list) => {
    const problem = expectProblem(await postRaw(withValue(path, JSON.stringify(list))), 400, 'bad-request');
    expect(pathsOf(problem)).toEqual([`document.${path}`]);
    expect(problem.detail).toMatch(/^Keep to \d+/);
    await expectNothingKept();
  });

  it('names a field that does not exist', async () => {
    const document = { ...whistleDocument(), owner: 'me', __proto__: null };
    const problem = expectProblem(await agent.post('/api/designs').send({ document }), 400, 'bad-request');
    expect(pathsOf(problem)).toEqual(['document.owner']);
  });

  it('does not let a document reach for the prototype of objects', async () => {
    const text = JSON.stringify({ document: whistleDocument() }).replace(
      '{"format"',
      '{"__proto__":{"role":"owner"},"format"',
    );
    expectProblem(await postRaw(text), 400, 'bad-request');
    expect(({} as { role?: string }).role).toBeUndefined();
  });

  it.each(['', '{', 'null', '[]', '"text"', '42', '{"document":null}', '{"document":[]}', '{}'])(
    'refuses the body %j',
    async (text) => {
      expectProblem(await postRaw(text), 400, 'bad-request');
    },
  );

  it.each([String.raw`"a\ud800"`, String.raw`"\udfffa"`])(
    'refuses half a character in a name: %s',
    async (json) => {
      expectProblem(await postRaw(withValue('name', json)), 400, 'bad-request');
      await expectNothingKept();
    },
  );

  it.each([String.raw`"a\u0000b"`, String.raw`"a\u001bb"`, String.raw`"a\bb"`])(
    'refuses a control character in a name: %s',
    async (json) => {
      expectProblem(await postRaw(withValue('name', json)), 400, 'bad-request');
      await expectNothingKept();
    },
  );

  it.each([101, 5000, 200_000])('refuses a body nested %d deep', async (depth) => {
    const text = `{"document":${'['.repeat(depth)}${']'.repeat(depth)}}`;
    expectProblem(await postRaw(text), 400, 'bad-request');
    await expectNothingKept();
  });

  it.each(['\ud83c\udfb6', String.raw`C:\ud800`])('keeps %s in a name, which is whole', async (name) => {
    const elsewhere = await signInAs(server, await buildPerson(server, { role: 'maker' }));
    const answer = await elsewhere.post('/api/designs').send({ document: { ...whistleDocument(), name } });
    expect(answer.status).toBe(201);
    expect(answer.body).toMatchObject({ name });
  });

  it('refuses bytes that are not UTF-8', async () => {
    const body = Buffer.concat([Buffer.from('{"document":"'), Buffer.from([0xff, 0xfe]), Buffer.from('"}')]);
    const answer = await agent
      .post('/api/designs')
      .set('Content-Type', 'application/json')
      .serialize(() => body.toString('latin1'))
      .send({});
    expectProblem(answer, 400, 'bad-request');
  });

  it('lists no more than fifty faults', async () => {
    const stations = Array.from({ length: 400 }, () => ({ positionMm: 'x', diameterMm: 'x' }));
    const problem = expectProblem(
      await postRaw(withValue('bore.stations', JSON.stringify(stations))),
      400,
      'bad-request',
    );
    expect(problem.errors).toHaveLength(50);
  });
});

describe('a document that does not hold together', () => {
  const stations = (...points: [number, number][]) => ({
    stations: points.map(([positionMm, diameterMm]) => ({ positionMm, diameterMm })),
  });
  const hole = (changes: Partial<DesignDocument['holes'][number]>) =>
    whistleDocument().holes.map((other, index) => (index === 3 ? { ...other, ...changes } : other));

  it.each<[string, Partial<DesignDocument>, string]>([
    [
      'crossing stations',
      { bore: stations([-4.4, 12.7], [200, 12.7], [100, 12], [265, 12]) },
      'document.bore.stations.2.positionMm',
    ],
    ['a hole beyond the foot', { holes: hole({ positionMm: 270 }) }, 'document.holes.3.positionMm'],
    ['a hole before the mouth end', { holes: hole({ positionMm: -20 }) }, 'document.holes.3.positionMm'],
    ['overlapping holes', { holes: hole({ positionMm: 199 }) }, 'document.holes.4.positionMm'],
    ['a hole wider than the bore', { holes: hole({ diameterMm: 13 }) }, 'document.holes.3.diameterMm'],
    ['two holes of one id', { holes: hole({ id: 'h1' }) }, 'document.holes.3.id'],
    ['a bore through the outside', { outside: stations([-4.4, 12], [265, 12]) }, 'document.outside.stations'],
    [
      'a fingering of an unknown hole',
      { fingerings: [{ ...whistleDocument().fingerings[0]!, covered: ['h9'] }] },
      'document.fingerings.0.covered.0',
    ],
  ])('%s', async (_, changes, path) => {
    const answer = await agent.post('/api/designs').send({ document: whistleDocument(changes) });
    const problem = expectProblem(answer, 422, 'cannot-be-built');
    expect(pathsOf(problem)).toContain(path);
    expect(problem.detail).toMatch(/\.$/);
    await expectNothingKept();
  });
});

describe('a request of the wrong form', () => {
  it.each([
    ['text/plain', undefined],
    ['application/x-www-form-urlencoded', undefined],
    ['application/json; charset=iso-8859-1', undefined],
    ['application/json', 'gzip'],
  ])('%s %s', async (type, encoding) => {
    const request = agent.post('/api/designs').set('Content-Type', type);
    if (encoding !== undefined) request.set('Content-Encoding', encoding);
    expectProblem(await request.send('document=1'), 415, 'wrong-content-type');
  });

  it.each(['https://evil.example', 'null', 'http://127.0.0.1:1', 'not an origin'])(
    'refuses a write from a page of %s',
    async (origin) => {
      const answer = await agent
        .post('/api/designs')
        .set('Origin', origin)
        .send({ document: whistleDocument() });
      expectProblem(answer, 403, 'not-allowed');
      await expectNothingKept();
    },
  );

  it('takes a read from anywhere and a write from its own pages', async () => {
    await agent.get('/api/session').set('Origin', 'https://evil.example').expect(200);
    await agent.patch('/api/workshop').set('Origin', server.address).send({}).expect(403);
    await agent.post('/api/designs').set('Origin', 'https://evil.example').send({}).expect(403);
    const answer = await agent.post('/api/session/refresh').set('Origin', server.address);
    expect(answer.status).toBe(200);
  });

  it.each(['/api/nothing', '/api/designs/1/nothing', '/api'])('knows no %s', async (path) => {
    expectProblem(await agent.get(path), 404, 'not-found');
  });

  it('says of an address that cannot be decoded that it cannot be read', async () => {
    expectProblem(await agent.get('/api/designs/%E0%A4%A'), 400, 'bad-request');
  });
});

/** Sends until it is cut off; tells the answer and how much had to be sent for it. */
function pour(headers: Record<string, string>, megabytes: number) {
  return new Promise<{ status: number; body: string; sentBytes: number }>((resolve, reject) => {
    const request = httpRequest(`${server.address}/api/session`, { method: 'POST', headers });
    const chunk = Buffer.alloc(64 * 1024, 0x20);
    let sentBytes = 0;
    let answered = false;
    const more = () => {
      if (answered || sentBytes >= megabytes * 1_000_000) return;
      sentBytes += chunk.length;
      request.write(chunk, more);
    };
    request.on('response', (response) => {
      answered = true;
      let body = '';
      response.on('data', (part: Buffer) => (body += part.toString()));
      response.on('end', () => {
        request.destroy();
        resolve({ status: response.statusCode ?? 0, body, sentBytes });
      });
    });
    request.on('error', (error) => {
      if (!answered) reject(error);
    });
    more();
  });
}

describe('a body of 100 MB', () => {
  it.each([
    ['announced', { 'Content-Type': 'application/json', 'Content-Length': '100000000' }],
    ['in chunks of unknown number', { 'Content-Type': 'application/json', 'Transfer-Encoding': 'chunked' }],
  ])('%s, is refused long before its end', async (_, headers) => {
    const { status, body, sentBytes } = await pour(headers, 100);
    expect(status).toBe(413);
    expect(problemSchema.parse(JSON.parse(body)).type).toBe('urn:borewright:problem:too-large');
    expect(sentBytes).toBeLessThan(20_000_000);
  });

  it('is not even looked at from someone who may not send it', async () => {
    const answer = await anonymous(server)
      .post('/api/designs')
      .send({ document: 'x'.repeat(2_000_000) });
    expectProblem(answer, 401, 'signed-out');
  });
});
