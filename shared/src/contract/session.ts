import { z } from 'zod';

export const ROLES = ['owner', 'mentor', 'maker', 'apprentice', 'visitor'] as const;
export type Role = (typeof ROLES)[number];

export const emailSchema = z.email('Type an e-mail address such as ines@saltgate.example.').max(200);
export const passwordSchema = z
  .string()
  .min(10, 'Use at least 10 characters.')
  .max(200, 'Use at most 200 characters.');
const personName = z.string().trim().min(1, 'Type a name.').max(100);

export const signInRequest = z.strictObject({
  email: emailSchema,
  password: z.string().min(1, 'Type the password.').max(200),
});

/** POST /api/workshops: a new workshop and its owner, signed in at once. */
export const createWorkshopRequest = z.strictObject({
  workshopName: z.string().trim().min(1, 'Give the workshop a name.').max(100),
  name: personName,
  email: emailSchema,
  password: passwordSchema,
  unit: z.enum(['mm', 'inch']).default('mm'),
  a4Hz: z.number().min(300).max(600).default(440),
  temperatureC: z.number().min(0).max(40).default(24),
});

export const changePasswordRequest = z.strictObject({
  currentPassword: z.string().min(1).max(200),
  newPassword: passwordSchema,
});

export const workshopSchema = z.object({
  id: z.int(),
  name: z.string(),
  unit: z.enum(['mm', 'inch']),
  a4Hz: z.number(),
  temperatureC: z.number(),
  /** In tune within this many cents, for registers 1, 2, and 3 and above. */
  bandCents: z.array(z.number()).length(3),
  referenceEnd: z.enum(['foot', 'mouth']),
});

/** GET /api/session and the answer to signing in. */
export const sessionSchema = z.object({
  person: z.object({ id: z.int(), name: z.string(), email: z.string() }),
  role: z.enum(ROLES),
  workshop: workshopSchema,
  /** When the short-lived token runs out; the client refreshes before. */
  expiresAt: z.string(),
});

const band = z
  .number()
  .min(0.5, 'Give a band of 0.5 cents or more.')
  .max(50, 'Give a band of 50 cents or less.');

/** PATCH /api/workshop, owners only. */
export const updateWorkshopRequest = z.strictObject({
  name: z.string().trim().min(1).max(100).optional(),
  unit: z.enum(['mm', 'inch']).optional(),
  a4Hz: z.number().min(300).max(600).optional(),
  temperatureC: z.number().min(0).max(40).optional(),
  bandCents: z.array(band).length(3).optional(),
  referenceEnd: z.enum(['foot', 'mouth']).optional(),
});

/** GET /api/members */
export const membersSchema = z.object({
  items: z.array(
    z.object({
      id: z.int(),
      name: z.string(),
      email: z.string(),
      role: z.enum(ROLES),
      lastHereAt: z.string().nullable(),
    }),
  ),
});

export type Session = z.infer<typeof sessionSchema>;
export type Workshop = z.infer<typeof workshopSchema>;
