import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { membersSchema, workshopSchema, type updateWorkshopRequest } from '#shared/contract/session.ts';
import { apiRequest } from '../../lib/api-client.ts';
import { sessionQuery } from '../../lib/session.ts';

export const membersQuery = queryOptions({
  queryKey: ['members'],
  queryFn: ({ signal }) => apiRequest({ path: '/api/members', schema: membersSchema, signal }),
});

export function useUpdateWorkshop() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: z.input<typeof updateWorkshopRequest>) =>
      apiRequest({ method: 'PATCH', path: '/api/workshop', body, schema: workshopSchema }),
    // The session carries the workshop, and everything on screen reads it from there.
    onSuccess: (workshop) => {
      queryClient.setQueryData(sessionQuery.queryKey, (session) =>
        session === null || session === undefined ? session : { ...session, workshop },
      );
    },
  });
}
