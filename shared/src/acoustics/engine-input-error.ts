/**
 * A broken precondition of the engine: something was asked that no formula here answers.
 *
 * The message is in a maker's words and may be shown as it stands.
 */
export class EngineInputError extends Error {
  override readonly name = 'EngineInputError';

  /**
   * @param field - which input is wrong, for example `boreRadius`
   * @param value - what it was
   * @param message - one sentence that says what is wrong and what would do
   */
  constructor(
    readonly field: string,
    readonly value: unknown,
    message: string,
  ) {
    super(message);
  }
}
