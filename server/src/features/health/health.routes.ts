import { healthSchema } from '#shared/contract/health.ts';
import type { Dependencies } from '../../dependencies.ts';
import { openRoute, type Route } from '../../http/route.ts';

export function healthRoutes({ database }: Dependencies): Route[] {
  return [
    openRoute({
      method: 'get',
      path: '/health',
      tag: 'Health',
      summary: 'Whether this process answers and reaches its database.',
      answer: { status: 200, description: 'All is well.', schema: healthSchema },
      refusals: [503],
      handle: async () => {
        await database.sequelize.authenticate();
        return { body: { status: 'up' as const } };
      },
    }),
  ];
}
