import type { FieldError } from '#shared/contract/problem.ts';

interface ErrorDetails {
  errors?: FieldError[];
  headers?: Record<string, string>;
  /** Members of the problem document beyond the usual ones. */
  extra?: Record<string, unknown>;
}

/** An answer we mean; everything else that is thrown is a bug. */
export class HttpError extends Error {
  override name = 'HttpError';

  /**
   * @param status - of the answer
   * @param kind - stable end of the problem's `type`, kebab-case
   * @param title - the same for every problem of this kind
   * @param details - `detail` in a maker's words, and what else the answer carries
   */
  constructor(
    readonly status: number,
    readonly kind: string,
    readonly title: string,
    readonly details: ErrorDetails & { detail: string },
  ) {
    super(details.detail);
  }
}

export const badRequest = (detail: string, errors: FieldError[] = []) =>
  new HttpError(400, 'bad-request', 'The request cannot be read', { detail, errors });

export const signedOut = (detail = 'You are signed out. Sign in to go on.') =>
  new HttpError(401, 'signed-out', 'Signed out', { detail });

export const forbidden = (detail: string) => new HttpError(403, 'not-allowed', 'Not allowed', { detail });

/** The same words for what does not exist and for what belongs to another workshop. */
export const notFound = (detail = 'There is nothing here that is shared with you. Check the address.') =>
  new HttpError(404, 'not-found', 'Not found', { detail });

export const conflict = (detail: string, errors: FieldError[] = []) =>
  new HttpError(409, 'conflict', 'In conflict with the present state', { detail, errors });

export const unprocessable = (detail: string, errors: FieldError[]) =>
  new HttpError(422, 'cannot-be-built', 'The design does not hold together', { detail, errors });
