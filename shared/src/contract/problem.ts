import { z } from 'zod';

/** What is wrong with one field, and what would do. */
export const fieldErrorSchema = z.object({ path: z.string(), message: z.string() });

/** RFC 9457 problem document: the one body of every error. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  errors: z.array(fieldErrorSchema).optional(),
  requestId: z.string().optional(),
});

export type FieldError = z.infer<typeof fieldErrorSchema>;
export type Problem = z.infer<typeof problemSchema>;

/** A path of keys as one string: `holes.2.diameterMm`. */
export function fieldPath(path: readonly (string | number)[]): string {
  return path.join('.');
}
