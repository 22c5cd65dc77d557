import { pipeline } from 'node:stream/promises';
import type { Request, Response, Router } from 'express';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import { WorkshopScope } from '../db/workshop-scope.ts';
import type { Dependencies } from '../dependencies.ts';
import { authenticate } from './authenticate.ts';
import { forbidden } from './http-error.ts';
import { readJsonBody } from './json-body.ts';
import type { RouteLimits } from './rate-limits.ts';
import type { Reply, Route, SignedIn } from './route.ts';
import { refreshTokenOf, setSessionCookies } from './session-cookies.ts';

/** Hangs routes into Express; each runs through the same steps in the same order. */
export function mountRoutes(
  router: Router,
  routes: readonly Route[],
  { dependencies, limits }: { dependencies: Dependencies; limits: RouteLimits },
): void {
  for (const route of routes) {
    const before = route.limit === undefined ? [] : [limits[route.limit]];
    router[route.method](route.path, ...before, async (req: Request, res: Response) => {
      const signedIn = await admit(req, route, dependencies);
      // The body is read last: nothing large comes in for someone who may not send it.
      const body = route.body === undefined ? undefined : await readJsonBody(req);
      const raw = {
        params: req.params,
        query: req.query,
        body,
        ifMatch: req.get('if-match'),
        refreshToken: refreshTokenOf(req),
        address: req.ip ?? '',
      };
      await send(req, res, { route, reply: await route.run(raw, signedIn) });
    });
  }
}

async function admit(req: Request, route: Route, dependencies: Dependencies): Promise<SignedIn | undefined> {
  if (route.action === 'anyone') return undefined;
  const caller = await authenticate(req, dependencies);
  const refusal = permissionRefusal(caller, route.action);
  if (refusal !== null) throw forbidden(refusal);
  return { caller, scope: new WorkshopScope(dependencies.database, caller) };
}

async function send(
  req: Request,
  res: Response,
  { route, reply }: { route: Route; reply: Reply<unknown> },
): Promise<void> {
  if (reply.session !== undefined) setSessionCookies(req, res, reply.session);
  res.status(route.answer.status).set('Cache-Control', 'private, no-cache');
  if (reply.headers !== undefined) res.set(reply.headers);
  if (reply.stream !== undefined) {
    res.type(route.answer.contentType ?? 'application/octet-stream');
    await pipeline(reply.stream, res);
  } else if (reply.body === undefined) {
    res.end();
  } else {
    res.json(reply.body);
  }
}
