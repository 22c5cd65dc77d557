import { QueryClient } from '@tanstack/react-query';
import { NoLineError } from './api-problem.ts';

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 10_000,
        // Without a line the page says so, instead of waiting in silence until there is one.
        networkMode: 'always',
        retry: (failures, error) => error instanceof NoLineError && failures < 1,
      },
      mutations: { networkMode: 'always', retry: false },
    },
  });
}
