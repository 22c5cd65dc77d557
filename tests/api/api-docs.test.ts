import { describe, expect, it } from 'vitest';
import { allRoutes } from '../../server/src/app.ts';
import { anonymous } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';

const server = await startTestServer();

interface OpenApi {
  openapi: string;
  paths: Record<string, Record<string, { responses: Record<string, unknown>; security: unknown[] }>>;
}

describe('the description of the API', () => {
  it('holds every route, with the statuses it answers', async () => {
    const answer = await anonymous(server).get('/api/openapi.json').expect(200);
    const api = answer.body as OpenApi;
    expect(api.openapi).toBe('3.1.0');
    const described = Object.entries(api.paths).flatMap(([path, methods]) =>
      Object.keys(methods).map((method) => `${method} ${path}`),
    );
    const routes = allRoutes(server).map(({ method, path }) => `${method} ${path.replace(':id', '{id}')}`);
    expect(described.sort()).toEqual(routes.sort());
    const save = api.paths['/designs/{id}/draft']!.put!;
    expect(Object.keys(save.responses)).toEqual([
      '200',
      '400',
      '401',
      '403',
      '404',
      '409',
      '412',
      '413',
      '415',
      '422',
      '428',
    ]);
    expect(save.security).toEqual([{ session: [] }]);
    expect(api.paths['/session']!.post!.security).toEqual([]);
  });

  it('refers to nothing that is not in it', async () => {
    const answer = await anonymous(server).get('/api/openapi.json').expect(200);
    const text = JSON.stringify(answer.body);
    const references = [...text.matchAll(/"\$ref":"([^"]+)"/g)].map((match) => match[1]!);
    expect(references.length).toBeGreaterThan(0);
    for (const reference of new Set(references)) {
      const found = reference
        .replace('#/', '')
        .split('/')
        .reduce<unknown>((part, key) => (part as Record<string, unknown> | undefined)?.[key], answer.body);
      expect(found, reference).toBeDefined();
    }
  });

  it('is a page for people too, without a script', async () => {
    const { text, type } = await anonymous(server).get('/api/docs').expect(200);
    expect(type).toBe('text/html');
    expect(text).toContain('PUT /designs/{id}/draft');
    expect(text).not.toMatch(/<script|https?:\/\//);
  });
});

describe('the JSON Schema of the design document', () => {
  it('states kinds, limits and which fields may be left out', async () => {
    const answer = await anonymous(server).get('/api/design-document.schema.json').expect(200);
    const schema = answer.body as {
      $schema: string;
      required: string[];
      properties: Record<
        string,
        { maxItems?: number; properties?: Record<string, unknown>; required?: string[] }
      >;
    };
    expect(schema.$schema).toBe('https://json-schema.org/draft/2020-12/schema');
    expect(schema.properties.holes!.maxItems).toBe(24);
    expect(schema.properties.fingerings!.maxItems).toBe(120);
    expect(schema.required).toContain('bore');
    expect(schema.properties.air!.required).not.toContain('losses');
  });
});
