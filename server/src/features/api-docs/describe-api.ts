import { z } from 'zod';
import { problemSchema } from '#shared/contract/problem.ts';
import type { Route } from '../../http/route.ts';

type Json = Record<string, unknown>;

/** The parts of an OpenAPI 3.1 document that we make and print. */
export interface ApiDescription {
  openapi: '3.1.0';
  info: { title: string; version: string; description: string };
  servers: { url: string }[];
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: Record<string, Json>; securitySchemes: Json };
}

export interface Operation {
  summary: string;
  tags: string[];
  operationId: string;
  security: Json[];
  parameters?: Parameter[];
  requestBody?: Json;
  responses: Record<string, { description: string; content?: Json; $ref?: string }>;
}

export interface Parameter {
  name: string;
  in: 'path' | 'query' | 'header';
  required: boolean;
  schema: unknown;
  description?: string;
}

const REFUSALS: Record<number, string> = {
  400: 'Something in the request cannot be read; every field is named.',
  401: 'Signed out, or e-mail and password do not match.',
  403: 'The role does not allow it; the detail says who may.',
  404: 'It does not exist, or is not shared with you.',
  409: 'In conflict with the present state.',
  412: 'Someone else saved; the newer draft is in `newer`.',
  413: 'Larger than 1 MB.',
  415: 'Not JSON.',
  422: 'The design does not hold together; every field is named.',
  428: 'If-Match is missing.',
  429: 'Too many tries; Retry-After says when to come back.',
  503: 'The database does not answer.',
};

/** OpenAPI 3.1 of the routes, from the schemas that read their requests and name their answers. */
export function describeApi(routes: readonly Route[]): ApiDescription {
  const paths: ApiDescription['paths'] = {};
  for (const route of routes) {
    const path = route.path.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [route.method]: operation(route) };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Borewright',
      version: '1',
      description:
        'Sign in with POST /session; the session lives in cookies. Every error is a problem document.',
    },
    servers: [{ url: '/api' }],
    paths,
    components: {
      schemas: { Problem: schemaOf(problemSchema, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'borewright_access' } },
    },
  };
}

function operation(route: Route): Operation {
  const parameters = [
    ...objectParameters(route.params, 'path'),
    ...objectParameters(route.query, 'query'),
    ...(route.ifMatch === true ? [ifMatchParameter] : []),
  ];
  return {
    summary: route.summary,
    tags: [route.tag],
    operationId: operationId(route),
    security: route.action === 'anyone' ? [] : [{ session: [] }],
    ...(parameters.length === 0 ? {} : { parameters }),
    ...(route.body === undefined ? {} : { requestBody: jsonContent(schemaOf(route.body, 'input')) }),
    responses: { [route.answer.status]: success(route), ...refusals(route) },
  };
}

const ifMatchParameter: Parameter = {
  name: 'If-Match',
  in: 'header',
  required: true,
  schema: { type: 'string' },
  description: 'The version seen, in quotes: "7".',
};

const operationId = ({ method, path }: Route) =>
  method + path.replace(/\/:?(\w)/g, (_, letter: string) => letter.toUpperCase()).replace(/\W/g, '');

function objectParameters(schema: z.ZodType | undefined, place: 'path' | 'query'): Parameter[] {
  if (schema === undefined) return [];
  const { properties = {}, required = [] } = schemaOf(schema, 'input') as {
    properties?: Record<string, unknown>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, property]) => ({
    name,
    in: place,
    required: place === 'path' || required.includes(name),
    schema: property,
  }));
}

function success({ answer }: Route) {
  if (answer.contentType !== undefined) {
    return { description: answer.description, content: { [answer.contentType]: {} } };
  }
  if (answer.schema === undefined) return { description: answer.description };
  return { description: answer.description, ...jsonContent(schemaOf(answer.schema, 'output')) };
}

/** What the steps before the handler refuse with, and what the handler says it does. */
function refusals(route: Route): Operation['responses'] {
  const reads = [route.params, route.query, route.body].some((schema) => schema !== undefined);
  const statuses = new Set([
    ...(reads ? [400] : []),
    ...(route.body === undefined ? [] : [413, 415]),
    ...(route.action === 'anyone' ? [] : [401, 403]),
    ...(route.params === undefined ? [] : [404]),
    ...(route.refusals ?? []),
  ]);
  const content = { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } };
  return Object.fromEntries(
    [...statuses]
      .sort((a, b) => a - b)
      .map((status) => [String(status), { description: REFUSALS[status] ?? 'Refused.', content }]),
  );
}

const jsonContent = (schema: Json) => ({ content: { 'application/json': { schema } } });

function schemaOf(schema: z.ZodType, io: 'input' | 'output'): Json {
  const json: Json = z.toJSONSchema(schema, { io, target: 'draft-2020-12', unrepresentable: 'any' });
  // An OpenAPI document names its dialect once, at its top.
  delete json.$schema;
  return json;
}
