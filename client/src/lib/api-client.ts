import { z } from 'zod';
import { ApiProblem, NoLineError, toApiProblem } from './api-problem.ts';

export interface ApiRequest<Answer> {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  path: `/api/${string}`;
  query?: Record<string, string | number | boolean | undefined>;
  body?: unknown;
  headers?: Record<string, string>;
  signal?: AbortSignal | undefined;
  /** The request outlives the page; browsers let this carry 64 kB at most. */
  keepalive?: boolean;
  /** Reads the answer; the same schema that the server answers by. */
  schema: z.ZodType<Answer>;
  /**
   * What a 401 leads to: `none` at sign-in itself, `refresh` when nobody need be signed in, `ask` (the usual) to have the
   * password asked for over the page.
   */
  onSignedOut?: 'none' | 'refresh' | 'ask';
}

/** For answers without a body. */
export const noAnswer = z.undefined();

/** Asks for the password over the page; resolves when somebody is signed in again, or has given up. */
type AskForPassword = () => Promise<'signed-in' | 'given-up'>;

let askForPassword: AskForPassword | null = null;
let refreshing: Promise<boolean> | null = null;
let asking: Promise<'signed-in' | 'given-up'> | null = null;

/** The dialog that asks registers itself here; returns how to take it away. */
export function onSessionExpired(ask: AskForPassword): () => void {
  askForPassword = ask;
  return () => {
    if (askForPassword === ask) askForPassword = null;
  };
}

/** Sends one request. An expired sign-in is renewed once and the request sent again; the caller never notices. */
export async function apiRequest<Answer>(request: ApiRequest<Answer>): Promise<Answer> {
  const first = await send(request);
  if (first.status !== 401 || request.onSignedOut === 'none') return readAnswer(first, request.schema);
  if (await refreshSession()) return readAnswer(await send(request), request.schema);
  if (request.onSignedOut !== 'refresh' && (await askOnce()) === 'signed-in')
    return readAnswer(await send(request), request.schema);
  return readAnswer(first, request.schema);
}

async function send({
  method = 'GET',
  path,
  query,
  body,
  headers,
  signal,
  keepalive = false,
}: ApiRequest<unknown>): Promise<Response> {
  try {
    return await fetch(path + searchOf(query), {
      method,
      keepalive,
      headers: {
        Accept: 'application/json',
        ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
        ...headers,
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      ...(signal === undefined ? {} : { signal }),
    });
  } catch (error) {
    // fetch rejects with a TypeError for every failure of the line, and with an AbortError when we gave up ourselves.
    if (error instanceof TypeError) throw new NoLineError(error);
    throw error;
  }
}

function searchOf(query: ApiRequest<unknown>['query'] = {}): string {
  const search = new URLSearchParams();
  for (const [key, value] of Object.entries(query)) if (value !== undefined) search.set(key, String(value));
  return search.size === 0 ? '' : `?${search.toString()}`;
}

async function readAnswer<Answer>(response: Response, schema: z.ZodType<Answer>): Promise<Answer> {
  const body = await readBody(response);
  if (!response.ok) throw toApiProblem(response.status, body);
  return schema.parse(body);
}

async function readBody(response: Response): Promise<unknown> {
  const text = await response.text();
  if (text === '') return undefined;
  if (!(response.headers.get('Content-Type') ?? '').includes('json')) return text;
  return JSON.parse(text);
}

/** However many requests find the sign-in expired at once, the token is renewed once: it is good for one use. */
async function refreshSession(): Promise<boolean> {
  refreshing ??= alone(async () => {
    const response = await send({ method: 'POST', path: '/api/session/refresh', schema: noAnswer });
    if (response.status === 401) return false;
    if (!response.ok) throw toApiProblem(response.status, await readBody(response));
    return true;
  }).finally(() => {
    refreshing = null;
  });
  return refreshing;
}

/** Other windows of this browser share the cookie, so they must not spend the same token either. */
function alone(work: () => Promise<boolean>): Promise<boolean> {
  // Missing where the page is served without TLS from another machine; then only this window's requests are in step.
  const locks = (navigator as { locks?: LockManager }).locks;
  return locks === undefined ? work() : locks.request('borewright.refresh', work);
}

async function askOnce(): Promise<'signed-in' | 'given-up'> {
  if (askForPassword === null) return 'given-up';
  asking ??= askForPassword().finally(() => {
    asking = null;
  });
  return asking;
}

export function isStatus(error: unknown, status: number): boolean {
  return error instanceof ApiProblem && error.status === status;
}
