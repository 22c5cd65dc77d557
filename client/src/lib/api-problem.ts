import { problemSchema, type Problem } from '#shared/contract/problem.ts';

/** The workshop answered, and the answer is no. */
export class ApiProblem extends Error {
  readonly problem: Problem;
  /** The whole answer: a 412 carries the newer draft beside the problem. */
  readonly body: unknown;

  constructor(problem: Problem, body: unknown) {
    super(problem.detail);
    this.name = 'ApiProblem';
    this.problem = problem;
    this.body = body;
  }

  get status(): number {
    return this.problem.status;
  }
}

/** The workshop could not be reached at all, which says nothing about what was asked. */
export class NoLineError extends Error {
  constructor(cause: unknown) {
    super('No line to the workshop.', { cause });
    this.name = 'NoLineError';
  }
}

/** Reads a refusal. A proxy in between may answer in words of its own: then the status has to speak. */
export function toApiProblem(status: number, body: unknown): ApiProblem {
  const parsed = problemSchema.safeParse(body);
  if (parsed.success) return new ApiProblem(parsed.data, body);
  const detail = `The workshop's server answered ${status} and gave no reason. Nothing was changed. Try again in a minute.`;
  return new ApiProblem({ type: 'about:blank', title: 'No reason given', status, detail }, body);
}

/** What went wrong in a maker's words, to stand beside the button or field that caused it. */
export function problemSentence(error: unknown): string {
  if (error instanceof ApiProblem) return error.problem.detail;
  if (error instanceof NoLineError)
    return 'No line to the workshop. Nothing you typed is lost. Try again when the line is back.';
  return 'Something broke here, not at your bench. Nothing was sent. Load the page again.';
}

/** Messages of a refusal by field path, `document.bore.stations.0.positionMm`. */
export function problemFields(error: unknown): Record<string, string> {
  if (!(error instanceof ApiProblem)) return {};
  return Object.fromEntries((error.problem.errors ?? []).map(({ path, message }) => [path, message]));
}
