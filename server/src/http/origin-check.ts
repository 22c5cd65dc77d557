import type { RequestHandler } from 'express';
import { forbidden } from './http-error.ts';

const READS = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses a write that another site's page has sent: a browser always names the page's origin.
 *
 * Clients other than browsers send no Origin and hold no cookies that a foreign page could ride on.
 */
export const checkOrigin: RequestHandler = (req, _res, next) => {
  if (READS.has(req.method) || comesFromHere(req.headers.origin, req.headers.host)) {
    next();
    return;
  }
  throw forbidden(
    'This came from a page of another site. Nothing was changed. Open Borewright itself and try again.',
  );
};

function comesFromHere(origin: string | undefined, host: string | undefined): boolean {
  if (origin === undefined) return true;
  // The scheme is left out: a proxy that ends TLS hands on plain http.
  return URL.canParse(origin) && new URL(origin).host === host?.toLowerCase();
}
