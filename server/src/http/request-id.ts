import { randomUUID } from 'node:crypto';
import type { RequestHandler, Response } from 'express';

const HEADER = 'X-Request-Id';

/** Gives every request a name of its own, which its log lines and its problem document carry. */
export const nameRequest: RequestHandler = (_req, res, next) => {
  res.setHeader(HEADER, randomUUID());
  next();
};

export function requestIdOf(res: Response): string {
  return String(res.getHeader(HEADER));
}
