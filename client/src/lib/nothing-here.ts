/** The address names something that is not there; the error boundary says so in the usual words. */
export class NothingHereError extends Error {
  override name = 'NothingHereError';
}
