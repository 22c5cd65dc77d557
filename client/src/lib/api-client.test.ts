import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { apiRequest, noAnswer, onSessionExpired } from './api-client.ts';
import { ApiProblem, NoLineError } from './api-problem.ts';

const fetchStub = vi.fn<typeof fetch>();
const json = (status: number, body: unknown) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } });
const problem = (status: number, detail = 'No.') =>
  new Response(JSON.stringify({ type: 'x', title: 'x', status, detail }), {
    status,
    headers: { 'Content-Type': 'application/problem+json' },
  });

const schema = z.object({ name: z.string() });
const askForDesign = () => apiRequest({ path: '/api/designs/1', schema });
const pathsAsked = () => fetchStub.mock.calls.map(([path]) => path);

/** A server whose token is stale until it is refreshed; `refresh` answers how. */
function staleUntilRefreshed(refresh: () => Promise<Response>) {
  let isFresh = false;
  fetchStub.mockImplementation(async (path) => {
    if (path === '/api/session/refresh') {
      const answer = await refresh();
      isFresh = answer.ok;
      return answer;
    }
    return isFresh ? json(200, { name: 'Wharf' }) : problem(401);
  });
  return { freshen: () => (isFresh = true) };
}

beforeEach(() => {
  vi.stubGlobal('fetch', fetchStub);
  vi.stubGlobal('navigator', { locks: { request: (_name: string, work: () => unknown) => work() } });
});
afterEach(() => {
  fetchStub.mockReset();
  vi.unstubAllGlobals();
});

describe('apiRequest', () => {
  it('reads the answer by its schema and leaves out what is not asked for', async () => {
    fetchStub.mockResolvedValue(json(200, { name: 'Wharf' }));
    await expect(
      apiRequest({ path: '/api/designs', query: { search: 'a b', kind: undefined, mine: false }, schema }),
    ).resolves.toEqual({ name: 'Wharf' });
    expect(pathsAsked()).toEqual(['/api/designs?search=a+b&mine=false']);
  });

  it('refuses an answer that does not keep the contract', async () => {
    fetchStub.mockResolvedValue(json(200, { nom: 'Wharf' }));
    await expect(askForDesign()).rejects.toBeInstanceOf(z.ZodError);
  });

  it('takes an answer without a body', async () => {
    fetchStub.mockResolvedValue(new Response(null, { status: 204 }));
    await expect(
      apiRequest({ method: 'DELETE', path: '/api/session', schema: noAnswer }),
    ).resolves.toBeUndefined();
  });

  it('hands a refusal on with everything in it', async () => {
    fetchStub.mockResolvedValue(
      json(412, { type: 'x', title: 'x', status: 412, detail: 'Newer.', newer: { version: 8 } }),
    );
    const refusal = await askForDesign().catch((error: unknown) => error);
    expect(refusal).toBeInstanceOf(ApiProblem);
    expect(refusal).toMatchObject({ status: 412, message: 'Newer.', body: { newer: { version: 8 } } });
  });

  it('says something of use when a proxy answers in its own words', async () => {
    fetchStub.mockResolvedValue(new Response('<h1>Bad gateway</h1>', { status: 502 }));
    await expect(askForDesign()).rejects.toThrow("The workshop's server answered 502 and gave no reason.");
  });

  it('tells a broken line from a refusal', async () => {
    fetchStub.mockRejectedValue(new TypeError('Failed to fetch'));
    await expect(askForDesign()).rejects.toBeInstanceOf(NoLineError);
  });

  it('does not take giving up for a broken line', async () => {
    fetchStub.mockRejectedValue(new DOMException('Aborted', 'AbortError'));
    await expect(askForDesign()).rejects.toMatchObject({ name: 'AbortError' });
  });
});

describe('an expired sign-in', () => {
  it('is renewed once for all requests that find it expired, and each is sent again', async () => {
    let refreshed: () => void = () => undefined;
    const refreshing = new Promise<Response>((resolve) => {
      refreshed = () => resolve(json(200, {}));
    });
    staleUntilRefreshed(() => refreshing);
    const answers = Promise.all([askForDesign(), askForDesign(), askForDesign()]);
    await vi.waitFor(() => expect(pathsAsked()).toContain('/api/session/refresh'));
    refreshed();
    await expect(answers).resolves.toEqual(Array(3).fill({ name: 'Wharf' }));
    expect(pathsAsked().filter((path) => path === '/api/session/refresh')).toHaveLength(1);
    expect(pathsAsked().filter((path) => path === '/api/designs/1')).toHaveLength(6);
  });

  it('is renewed again the next time it runs out', async () => {
    staleUntilRefreshed(() => Promise.resolve(json(200, {})));
    await askForDesign();
    staleUntilRefreshed(() => Promise.resolve(json(200, {})));
    await askForDesign();
    expect(pathsAsked().filter((path) => path === '/api/session/refresh')).toHaveLength(2);
  });

  it('asks for the password once, and goes on where it was', async () => {
    const server = staleUntilRefreshed(() => Promise.resolve(problem(401)));
    const ask = vi.fn(() => {
      server.freshen();
      return Promise.resolve('signed-in' as const);
    });
    const stopAsking = onSessionExpired(ask);
    await expect(Promise.all([askForDesign(), askForDesign()])).resolves.toHaveLength(2);
    expect(ask).toHaveBeenCalledTimes(1);
    stopAsking();
  });

  it('is the answer when the person gives up', async () => {
    staleUntilRefreshed(() => Promise.resolve(problem(401)));
    const stopAsking = onSessionExpired(() => Promise.resolve('given-up'));
    await expect(askForDesign()).rejects.toMatchObject({ status: 401 });
    stopAsking();
  });

  it('is the answer at the sign-in itself, where a wrong password must not renew anything', async () => {
    fetchStub.mockResolvedValue(problem(401, 'Email and password do not match.'));
    await expect(
      apiRequest({ method: 'POST', path: '/api/session', body: {}, schema, onSignedOut: 'none' }),
    ).rejects.toThrow('Email and password do not match.');
    expect(pathsAsked()).toEqual(['/api/session']);
  });

  it('leaves a broken line a broken line', async () => {
    staleUntilRefreshed(() => Promise.reject(new TypeError('Failed to fetch')));
    await expect(askForDesign()).rejects.toBeInstanceOf(NoLineError);
  });
});
