import { join } from 'node:path';
import express, { Router } from 'express';
import { notFound } from './http-error.ts';

const YEAR_S = 365 * 24 * 60 * 60;

/** The built pages: files as they are, and for every other address the one page that routes by itself. */
export function staticClient(folder: string): Router {
  const router = Router();
  // Vite puts a hash of its content into the name of everything under assets/.
  const assets = express.static(join(folder, 'assets'), {
    immutable: true,
    maxAge: YEAR_S * 1000,
    index: false,
  });
  router.use('/assets', assets, (_req, res) => {
    res.sendStatus(404);
  });
  router.use(express.static(folder, { index: false, cacheControl: false, setHeaders: askEachTime }));
  router.get('/{*path}', (_req, res, next) => {
    res.set('Cache-Control', 'no-cache');
    res.sendFile('index.html', { root: folder, cacheControl: false }, (error) => {
      if (error !== undefined && !res.headersSent) next(isMissing(error) ? notFound() : error);
    });
  });
  return router;
}

/** The pages are not built, or not into this folder. */
function isMissing(error: Error): boolean {
  return 'code' in error && error.code === 'ENOENT';
}

function askEachTime(res: { setHeader: (name: string, value: string) => unknown }): void {
  res.setHeader('Cache-Control', 'no-cache');
}
