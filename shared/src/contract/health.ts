import { z } from 'zod';

/** GET /api/health */
export const healthSchema = z.object({ status: z.literal('up') });
