import { queryOptions, useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { sessionSchema, type Session } from '#shared/contract/session.ts';
import { apiRequest, isStatus } from './api-client.ts';

/** Who is signed in, or null; asked once and kept until somebody signs in or out. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  staleTime: Infinity,
  queryFn: async ({ signal }): Promise<Session | null> => {
    try {
      return await apiRequest({
        path: '/api/session',
        schema: sessionSchema,
        onSignedOut: 'refresh',
        signal,
      });
    } catch (error) {
      if (isStatus(error, 401)) return null;
      throw error;
    }
  },
});

/** For pages behind the sign-in, whose loader has made sure of it. */
export function useSession(): Session {
  const { data } = useSuspenseQuery(sessionQuery);
  if (data === null)
    throw new Error('This page stands before the sign-in; its loader must ask for a session.');
  return data;
}

/** After signing in: nothing that the last person saw may be left behind. */
export function startSession(queryClient: QueryClient, session: Session): void {
  queryClient.clear();
  queryClient.setQueryData(sessionQuery.queryKey, session);
}
