import { Router } from 'express';
import type { Route } from '../../http/route.ts';
import { describeApi } from './describe-api.ts';
import { designDocumentJsonSchema } from './design-document-json-schema.ts';
import { docsPage } from './docs-page.ts';

/** The API's own description: made of the same routes and schemas that answer. */
export function apiDocsRoutes(routes: readonly Route[]): Router {
  const router = Router();
  const description = describeApi(routes);
  const page = docsPage(description);
  const schema = designDocumentJsonSchema();
  router.get('/openapi.json', (_req, res) => {
    res.json(description);
  });
  router.get('/docs', (_req, res) => {
    res.type('html').send(page);
  });
  router.get('/design-document.schema.json', (_req, res) => {
    res.type('application/schema+json').send(JSON.stringify(schema));
  });
  return router;
}
