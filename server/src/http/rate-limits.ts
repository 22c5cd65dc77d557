import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import type { AppConfig } from '../config.ts';
import { HttpError } from './http-error.ts';

export interface RouteLimits {
  'sign-in': RequestHandler;
  'sign-up': RequestHandler;
}

const MINUTE_MS = 60_000;

/** A limit per network address; what remains is not told, when to come back is. */
function limitPerAddress(limit: number, windowMs: number, options: { failuresOnly?: boolean } = {}) {
  return rateLimit({
    limit,
    windowMs,
    skipSuccessfulRequests: options.failuresOnly ?? false,
    standardHeaders: false,
    legacyHeaders: false,
    handler: (_req, _res, next) => {
      next(tooManyTries('Too much at once from this address. Nothing was changed. Wait a minute.', windowMs));
    },
  });
}

export function tooManyTries(detail: string, waitMs: number): HttpError {
  return new HttpError(429, 'too-many-tries', 'Too many tries', {
    detail,
    headers: { 'Retry-After': String(Math.ceil(waitMs / 1000)) },
  });
}

export function generalLimit({ requestsPerMinute }: AppConfig): RequestHandler {
  return limitPerAddress(requestsPerMinute, MINUTE_MS);
}

export function routeLimits({ signUpsPerHour }: AppConfig): RouteLimits {
  return {
    // Checking a password is meant to be slow: a flood of wrong ones must not keep everyone else waiting.
    'sign-in': limitPerAddress(60, MINUTE_MS, { failuresOnly: true }),
    'sign-up': limitPerAddress(signUpsPerHour, 60 * MINUTE_MS),
  };
}
