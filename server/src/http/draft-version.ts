import { badRequest, HttpError } from './http-error.ts';

/** ETag of a draft's version: `"7"`. */
export const versionTag = (version: number) => `"${version}"`;

/**
 * The version that an `If-Match` header names.
 *
 * @throws HttpError 428 without the header, 400 when it is not one version
 */
export function seenVersion(ifMatch: string | undefined): number {
  if (ifMatch === undefined) {
    throw new HttpError(428, 'version-required', 'Version required', {
      detail: 'Say which version of the draft you saw, with If-Match: "7". Nothing was saved.',
    });
  }
  const match = /^\s*"(\d{1,9})"\s*$/.exec(ifMatch);
  if (match === null) {
    throw badRequest('If-Match names one version in quotes, for example "7". Nothing was saved.');
  }
  return Number(match[1]);
}
