import type { QueryClient } from '@tanstack/react-query';
import { redirect, type LoaderFunction, type LoaderFunctionArgs } from 'react-router';
import type { Session } from '#shared/contract/session.ts';
import { paths } from '../paths.ts';
import { sessionQuery } from './session.ts';

type Load = (args: LoaderFunctionArgs, session: Session) => Promise<unknown>;

/** A loader for people who are signed in; everyone else is sent to the sign-in, which leads back here. */
export function signedInLoader(
  queryClient: QueryClient,
  load: Load = () => Promise.resolve(null),
): LoaderFunction {
  return async (args) => {
    const session = await queryClient.query({ ...sessionQuery, staleTime: 'static' });
    if (session !== null) return load(args, session);
    const { pathname, search } = new URL(args.request.url);
    return redirect(paths.signIn(pathname + search));
  };
}
