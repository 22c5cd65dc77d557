import type { FieldErrors, FieldValues, Resolver } from 'react-hook-form';
import type { z } from 'zod';
import { plainWords } from '#shared/document/plain-words.ts';

/** Checks a form by the schema that the server will check it by, so that both say the same sentence. */
export function zodResolver<Values extends FieldValues>(schema: z.ZodType): Resolver<Values> {
  return (values) => {
    const parsed = schema.safeParse(values, { error: plainWords });
    if (parsed.success) return { values, errors: {} };
    const errors: Partial<Record<string, { type: string; message: string }>> = {};
    for (const issue of parsed.error.issues) {
      errors[issue.path.join('.')] ??= { type: issue.code, message: issue.message };
    }
    return { values: {}, errors: errors as FieldErrors<Values> };
  };
}
