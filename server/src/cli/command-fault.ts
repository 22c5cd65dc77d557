import type { FieldError, Problem } from '#shared/contract/problem.ts';

const TITLES = {
  arguments: 'The command cannot be understood',
  '--modes': 'The command cannot be understood',
  '--impedance': 'The command cannot be understood',
  file: 'The document cannot be read',
  document: 'The design document has faults',
} as const;

/** What a person got wrong on the command line or in the document they gave. */
export class CommandFault extends Error {
  override readonly name = 'CommandFault';

  constructor(
    private readonly about: keyof typeof TITLES,
    message: string,
    private readonly errors: FieldError[] = [{ path: about, message }],
  ) {
    super(message);
  }

  /** The fault as an RFC 9457 problem document. */
  problem(): Problem {
    return {
      type: `urn:borewright:problem:${this.about === 'document' ? 'invalid-document' : 'invalid-command'}`,
      title: TITLES[this.about],
      status: this.about === 'document' ? 422 : 400,
      detail: this.message,
      errors: this.errors,
    };
  }
}
