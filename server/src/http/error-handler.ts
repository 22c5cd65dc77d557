import { BaseError, DatabaseError, ConnectionError } from 'sequelize';
import type { ErrorRequestHandler } from 'express';
import type { Logger } from 'pino';
import { HttpError, badRequest } from './http-error.ts';
import { cutOffUnread } from './json-body.ts';
import { sendProblem } from './problem.ts';
import { requestIdOf } from './request-id.ts';

/** The one exit of everything that is thrown. */
export function errorHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, req, res, next) => {
    const requestId = requestIdOf(res);
    const answer = meaning(error);
    if (answer.status >= 500)
      log.error({ err: loggable(error), requestId, method: req.method, url: req.path }, 'failed');
    if (res.headersSent) {
      // A stream broke midway: an ended connection is the only way left to say so.
      next(error);
      return;
    }
    sendProblem(res, answer, requestId);
    cutOffUnread(req);
  };
}

/** A database error carries its statement and every value in it, documents and password hashes too: none of that is logged. */
function loggable(error: unknown): unknown {
  if (!(error instanceof BaseError)) return error;
  return { type: error.name, message: error.message, stack: error.stack };
}

function meaning(error: unknown): HttpError {
  if (error instanceof HttpError) return error;
  // A path such as /api/designs/%E0%A4%A that Express cannot decode.
  if (error instanceof URIError) return badRequest('This address cannot be read.');
  if (error instanceof ConnectionError || isPassing(error)) return noDatabase();
  return new HttpError(500, 'internal', 'Something broke here', {
    detail:
      'The workshop could not do this. Nothing was changed. Try again; if it stays, report the request id.',
  });
}

const PASSING_CODES = new Set(['ER_LOCK_DEADLOCK', 'ER_LOCK_WAIT_TIMEOUT']);

/** A lock that was not to be had, or a connection that broke: the same request may do better in a moment. */
function isPassing(error: unknown): boolean {
  if (!(error instanceof DatabaseError)) return false;
  const { code, fatal } = error.parent as { code?: string; fatal?: boolean };
  return fatal === true || (code !== undefined && PASSING_CODES.has(code));
}

function noDatabase(): HttpError {
  return new HttpError(503, 'no-database', 'The database does not answer', {
    detail: 'The workshop cannot reach its records just now. Nothing was changed. Try again in a minute.',
    headers: { 'Retry-After': '10' },
  });
}
