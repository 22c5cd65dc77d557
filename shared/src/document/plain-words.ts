import type { z } from 'zod';

type Issue = Parameters<z.core.$ZodErrorMap>[0];

const KINDS: Record<string, string> = {
  number: 'a number',
  int: 'a whole number',
  string: 'text',
  boolean: 'true or false',
  array: 'a list',
  object: 'a group of fields',
};

function wrongType(issue: z.core.$ZodRawIssue<z.core.$ZodIssueInvalidType>): string {
  if (issue.input === undefined) return 'This is missing.';
  const kind = KINDS[issue.expected] ?? issue.expected;
  return Number.isFinite(issue.input) || typeof issue.input !== 'number'
    ? `Give ${kind} here.`
    : 'Give a number that is finite.';
}

function tooSmall({ origin, minimum, inclusive }: z.core.$ZodRawIssue<z.core.$ZodIssueTooSmall>): string {
  if (origin === 'string')
    return minimum === 1 ? 'Type something here.' : `Use at least ${minimum} characters.`;
  if (origin === 'array') return `Give at least ${minimum}.`;
  return inclusive === false ? `Give more than ${minimum}.` : `Give ${minimum} or more.`;
}

function tooBig({ origin, maximum, inclusive }: z.core.$ZodRawIssue<z.core.$ZodIssueTooBig>): string {
  if (origin === 'string') return `Use at most ${maximum} characters.`;
  if (origin === 'array') return `Keep to ${maximum}.`;
  return inclusive === false ? `Give less than ${maximum}.` : `Give ${maximum} or less.`;
}

/** Messages for what a schema says nothing of its own about: short, in a maker's words, with what would do. */
export const plainWords = (issue: Issue): string => {
  switch (issue.code) {
    case 'invalid_type':
      return wrongType(issue);
    case 'too_small':
      return tooSmall(issue);
    case 'too_big':
      return tooBig(issue);
    case 'invalid_value':
      return `Choose one of ${issue.values.map(String).join(', ')}.`;
    case 'unrecognized_keys':
      return `There is no field called ${issue.keys.join(', ')} here.`;
    case 'invalid_union':
      return 'None of the kinds known here fits.';
    default:
      return 'This cannot be read here.';
  }
};
