import express, { Router, type Express } from 'express';
import type { Dependencies } from './dependencies.ts';
import { accountRoutes } from './features/account/account.routes.ts';
import { apiDocsRoutes } from './features/api-docs/api-docs.routes.ts';
import { designRoutes } from './features/designs/designs.routes.ts';
import { draftRoutes } from './features/drafts/drafts.routes.ts';
import { healthRoutes } from './features/health/health.routes.ts';
import { membersRoutes } from './features/members/members.routes.ts';
import { predictionRoutes } from './features/predictions/predictions.routes.ts';
import { sessionRoutes } from './features/session/session.routes.ts';
import { sheetRoutes } from './features/sheets/sheets.routes.ts';
import { workshopRoutes } from './features/workshop/workshop.routes.ts';
import { errorHandler } from './http/error-handler.ts';
import { notFound } from './http/http-error.ts';
import { mountRoutes } from './http/mount-routes.ts';
import { checkOrigin } from './http/origin-check.ts';
import { generalLimit, routeLimits } from './http/rate-limits.ts';
import { nameRequest } from './http/request-id.ts';
import { requestLog } from './http/request-log.ts';
import type { Route } from './http/route.ts';
import { securityHeaders } from './http/security-headers.ts';
import { staticClient } from './http/static-client.ts';

/** Every route under /api that a description can be made of. */
export function allRoutes(dependencies: Dependencies): Route[] {
  return [
    ...sessionRoutes(dependencies),
    ...workshopRoutes(dependencies),
    ...accountRoutes(dependencies),
    ...membersRoutes(),
    ...designRoutes(),
    ...draftRoutes(),
    ...predictionRoutes(dependencies),
    ...sheetRoutes(dependencies),
    ...healthRoutes(dependencies),
  ];
}

/** Builds the app; it does not listen. */
export function createApp(dependencies: Dependencies): Express {
  const { config, log } = dependencies;
  const app = express();
  app.set('trust proxy', config.trustedProxies);
  app.set('etag', false);
  app.use(nameRequest, requestLog(log), securityHeaders());
  app.use('/api', apiRouter(dependencies));
  app.use(staticClient(config.staticDir));
  app.use(errorHandler(log));
  return app;
}

function apiRouter(dependencies: Dependencies): Router {
  const { config } = dependencies;
  const router = Router();
  router.use(generalLimit(config), checkOrigin);
  const routes = allRoutes(dependencies);
  mountRoutes(router, routes, { dependencies, limits: routeLimits(config) });
  router.use(apiDocsRoutes(routes));
  router.use(() => {
    throw notFound();
  });
  return router;
}
