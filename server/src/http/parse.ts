import type { z } from 'zod';
import { issueMessage } from '#shared/contract/issue-message.ts';
import { fieldPath, type FieldError } from '#shared/contract/problem.ts';
import { badRequest } from './http-error.ts';

/** How many field errors one answer names; a document of 400 bad stations is not listed whole. */
const MOST_ERRORS = 50;

/**
 * Reads one part of a request with its schema.
 *
 * @throws HttpError 400 with every issue by its path
 */
export function parseWith<T>(schema: z.ZodType<T>, input: unknown): T {
  const parsed = schema.safeParse(input, { error: issueMessage });
  if (parsed.success) return parsed.data;
  const errors = parsed.error.issues.slice(0, MOST_ERRORS).map(fieldError);
  throw badRequest(errors[0]?.message ?? 'The request cannot be read.', errors);
}

function fieldError(issue: z.core.$ZodIssue): FieldError {
  // An unknown field is told at the field itself, where a form can show it.
  const unknown = issue.code === 'unrecognized_keys' ? issue.keys.slice(0, 1) : [];
  const keys = [...issue.path, ...unknown].map((key) => (typeof key === 'symbol' ? key.toString() : key));
  return { path: fieldPath(keys), message: issue.message };
}
