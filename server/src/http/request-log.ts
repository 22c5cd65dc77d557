import type { RequestHandler } from 'express';
import type { Logger } from 'pino';
import { requestIdOf } from './request-id.ts';

/** One line for each request, without its query or body: those may hold what nobody else should read. */
export function requestLog(log: Logger): RequestHandler {
  return (req, res, next) => {
    if (log.isLevelEnabled('info')) {
      const begun = performance.now();
      const { method, path } = req;
      res.once('finish', () => {
        const ms = Math.round(performance.now() - begun);
        log.info({ requestId: requestIdOf(res), method, path, status: res.statusCode, ms }, 'answered');
      });
    }
    next();
  };
}
