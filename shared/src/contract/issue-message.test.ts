import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { issueMessage } from './issue-message.ts';

const say = (schema: z.ZodType, input: unknown) =>
  schema.safeParse(input, { error: issueMessage }).error?.issues.map((issue) => issue.message);

describe('issueMessage', () => {
  it.each<[string, z.ZodType, unknown, string]>([
    ['what is missing', z.object({ a: z.string() }), {}, 'Fill this in.'],
    ['an empty text', z.string().min(1), '', 'Fill this in.'],
    ['a short text', z.string().min(3), 'a', 'Use at least 3 characters.'],
    ['a long text', z.string().max(2), 'abc', 'Use at most 2 characters.'],
    ['text for a number', z.number(), '4', 'Give a number here.'],
    ['infinity', z.number(), Infinity, 'Give a number here.'],
    ['null for a text', z.string(), null, 'Give text here.'],
    ['a fraction', z.int(), 1.5, 'Give a whole number here.'],
    ['too little', z.number().min(3), 1, 'Give 3 or more.'],
    ['nothing at all', z.number().positive(), 0, 'Give more than 0.'],
    ['too much', z.number().max(3), 4, 'Give 3 or less.'],
    ['the end of an open range', z.number().lt(3), 3, 'Give less than 3.'],
    ['too many', z.array(z.number()).max(1), [1, 2], 'Keep to 1.'],
    ['too few', z.array(z.number()).min(2), [1], 'Give at least 2.'],
    ['no known choice', z.enum(['mm', 'inch']), 'ell', 'Choose one of mm, inch.'],
    ['an unknown field', z.strictObject({}), { a: 1 }, 'There is no field named a. Leave it out.'],
    [
      'an unknown kind',
      z.discriminatedUnion('kind', [z.object({ kind: z.literal('a') })]),
      { kind: 'b' },
      'This kind is not known here.',
    ],
  ])('says of %s what would do', (_, schema, input, message) => {
    expect(say(schema, input)).toEqual([message]);
  });

  it('leaves a schema its own sentence', () => {
    expect(say(z.string().min(1, 'Give the design a name.'), '')).toEqual(['Give the design a name.']);
  });
});
