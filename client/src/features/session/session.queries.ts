import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { sessionSchema, type createWorkshopRequest, type signInRequest } from '#shared/contract/session.ts';
import { apiRequest, noAnswer } from '../../lib/api-client.ts';
import { sessionQuery, startSession } from '../../lib/session.ts';
import { paths } from '../../paths.ts';

type SignIn = z.input<typeof signInRequest>;
type CreateWorkshop = z.input<typeof createWorkshopRequest>;

const signIn = (body: SignIn) =>
  apiRequest({ method: 'POST', path: '/api/session', body, schema: sessionSchema, onSignedOut: 'none' });

export function useSignIn() {
  const queryClient = useQueryClient();
  return useMutation({ mutationFn: signIn, onSuccess: (session) => startSession(queryClient, session) });
}

/** The same person again, in the middle of work: what is on the page stays. */
export function useSignInAgain() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: signIn,
    onSuccess: (session) => {
      queryClient.setQueryData(sessionQuery.queryKey, session);
    },
  });
}

export function useSignOut() {
  return useMutation({
    mutationFn: () =>
      apiRequest({ method: 'DELETE', path: '/api/session', schema: noAnswer, onSignedOut: 'none' }),
    // A fresh page rather than an emptied cache: what is still on the screen cannot do without its session.
    onSuccess: () => window.location.assign(paths.signIn()),
  });
}

export function useCreateWorkshop() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: CreateWorkshop) =>
      apiRequest({
        method: 'POST',
        path: '/api/workshops',
        body,
        schema: sessionSchema,
        onSignedOut: 'none',
      }),
    onSuccess: (session) => startSession(queryClient, session),
  });
}
