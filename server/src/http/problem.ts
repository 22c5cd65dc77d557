import type { Response } from 'express';
import type { Problem } from '#shared/contract/problem.ts';
import type { HttpError } from './http-error.ts';

const TYPE_PREFIX = 'urn:borewright:problem:';

/** Answers with an RFC 9457 problem document, the one body of every error. */
export function sendProblem(res: Response, error: HttpError, requestId: string): void {
  const { detail, errors, headers = {}, extra = {} } = error.details;
  const problem: Problem & Record<string, unknown> = {
    type: `${TYPE_PREFIX}${error.kind}`,
    title: error.title,
    status: error.status,
    detail,
    ...(errors === undefined || errors.length === 0 ? {} : { errors }),
    requestId,
    ...extra,
  };
  res.status(error.status).set(headers).set('Cache-Control', 'no-store');
  res.type('application/problem+json').send(JSON.stringify(problem));
}
