import type { Response } from 'supertest';
import { expect } from 'vitest';
import { problemSchema, type Problem } from '#shared/contract/problem.ts';

/** Reads an answer as the problem it has to be. */
export function expectProblem(response: Response, status: number, kind: string): Problem {
  const problem = problemSchema.parse(response.body);
  expect({ status: response.status, type: problem.type }).toEqual({
    status,
    type: `urn:borewright:problem:${kind}`,
  });
  expect(response.type).toBe('application/problem+json');
  expect(problem.status).toBe(status);
  return problem;
}

export const pathsOf = (problem: Problem) => (problem.errors ?? []).map((error) => error.path);
