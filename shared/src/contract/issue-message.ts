import type { z } from 'zod';

const TYPE_NAMES: Record<string, string> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'yes or no',
  array: 'a list',
  object: 'a group of fields',
  record: 'a group of fields',
};

/**
 * Says in bench language what a schema refuses, where the schema has no sentence of its own.
 *
 * Handed to zod as error map by the server, by forms and by the command line, so that all say the same.
 */
export function issueMessage(issue: z.core.$ZodRawIssue): string | undefined {
  switch (issue.code) {
    case 'invalid_type':
      return issue.input === undefined ? 'Fill this in.' : `Give ${typeName(issue.expected)} here.`;
    case 'too_small':
      return tooSmall(issue);
    case 'too_big':
      return tooBig(issue);
    case 'invalid_value':
      return `Choose one of ${issue.values.map(String).join(', ')}.`;
    case 'invalid_union':
      return 'This kind is not known here.';
    case 'unrecognized_keys':
      return `There is no field named ${issue.keys.map((key) => key.slice(0, 40)).join(', ')}. Leave it out.`;
    default:
      return undefined;
  }
}

function typeName(expected: string): string {
  return TYPE_NAMES[expected] ?? expected;
}

const counted = (origin: string) => origin === 'array' || origin === 'set';

function tooSmall(issue: Pick<z.core.$ZodIssueTooSmall, 'origin' | 'inclusive' | 'minimum'>): string {
  const least = String(issue.minimum);
  if (issue.origin === 'string') return least === '1' ? 'Fill this in.' : `Use at least ${least} characters.`;
  if (counted(issue.origin)) return `Give at least ${least}.`;
  return issue.inclusive === false ? `Give more than ${least}.` : `Give ${least} or more.`;
}

function tooBig(issue: Pick<z.core.$ZodIssueTooBig, 'origin' | 'inclusive' | 'maximum'>): string {
  const most = String(issue.maximum);
  if (issue.origin === 'string') return `Use at most ${most} characters.`;
  if (counted(issue.origin)) return `Keep to ${most}.`;
  return issue.inclusive === false ? `Give less than ${most}.` : `Give ${most} or less.`;
}
