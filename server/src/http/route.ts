import type { z } from 'zod';
import type { Action } from '#shared/rules/permissions.ts';
import type { WorkshopScope } from '../db/workshop-scope.ts';
import type { Caller } from '../identity/caller.ts';
import type { SessionTokens } from '../identity/start-session.ts';
import { parseWith } from './parse.ts';

/** A request as it came, before anything of it is believed. */
export interface RawRequest {
  params: unknown;
  query: unknown;
  body: unknown;
  ifMatch: string | undefined;
  refreshToken: string | undefined;
  /** The client's network address. */
  address: string;
}

/** Who asks, and the tables they may reach. */
export interface SignedIn {
  caller: Caller;
  scope: WorkshopScope;
}

type Parsed<P, Q, B> = Omit<RawRequest, 'params' | 'query' | 'body'> & { params: P; query: Q; body: B };

/** What a handler hands back; the status is the route's. */
export interface Reply<T> {
  body?: T;
  headers?: Record<string, string>;
  /** Instead of a body: something long, sent as it is made. */
  stream?: NodeJS.ReadableStream;
  session?: SessionTokens | 'cleared';
}

interface Answer<A> {
  status: 200 | 201 | 204;
  description: string;
  schema?: z.ZodType<A>;
  /** Of a stream. */
  contentType?: string;
}

interface RouteDescription<P, Q, B, A> {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** Under /api, with Express's `:name`. */
  path: string;
  summary: string;
  tag: string;
  params?: z.ZodType<P>;
  query?: z.ZodType<Q>;
  body?: z.ZodType<B>;
  answer: Answer<A>;
  /** Statuses it refuses with on its own account, beyond what every route of its form does. */
  refusals?: readonly number[];
  /** A limit on tries of its own. */
  limit?: 'sign-in' | 'sign-up';
  /** Whether the version seen is named in If-Match. */
  ifMatch?: boolean;
}

/** One route: the server's checks and the API's description both come from here. */
export interface Route extends RouteDescription<unknown, unknown, unknown, unknown> {
  /** What the caller must be allowed to do; `anyone`: no sign-in needed. */
  action: Action | 'anyone';
  run: (raw: RawRequest, signedIn: SignedIn | undefined) => Promise<Reply<unknown>>;
}

interface MemberRoute<P, Q, B, A> extends RouteDescription<P, Q, B, A> {
  action: Action;
  handle: (request: Parsed<P, Q, B> & SignedIn) => Promise<Reply<A>>;
}

interface OpenRoute<P, Q, B, A> extends RouteDescription<P, Q, B, A> {
  handle: (request: Parsed<P, Q, B>) => Promise<Reply<A>>;
}

/** A route for members of a workshop whose role allows the action. */
export function route<P = unknown, Q = unknown, B = unknown, A = unknown>(
  spec: MemberRoute<P, Q, B, A>,
): Route {
  const { handle, ...description } = spec;
  return {
    ...description,
    run: async (raw, signedIn) => {
      if (signedIn === undefined) throw new TypeError(`${spec.path} was run for nobody.`);
      return handle({ ...parseRequest(spec, raw), ...signedIn });
    },
  };
}

/** A route that needs no sign-in. */
export function openRoute<P = unknown, Q = unknown, B = unknown, A = unknown>(
  spec: OpenRoute<P, Q, B, A>,
): Route {
  const { handle, ...description } = spec;
  return { ...description, action: 'anyone', run: async (raw) => handle(parseRequest(spec, raw)) };
}

function parseRequest<P, Q, B, A>(spec: RouteDescription<P, Q, B, A>, raw: RawRequest): Parsed<P, Q, B> {
  const parsePart = <T>(schema: z.ZodType<T> | undefined, input: unknown) =>
    // Without a schema the type is unknown, and nothing of the input is handed on.
    schema === undefined ? (undefined as T) : parseWith(schema, input);
  return {
    ...raw,
    params: parsePart(spec.params, raw.params),
    query: parsePart(spec.query, raw.query),
    body: parsePart(spec.body, raw.body),
  };
}
