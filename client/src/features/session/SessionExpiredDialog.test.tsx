// @vitest-environment jsdom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { signInRequest, type Session } from '#shared/contract/session.ts';
import { apiRequest } from '../../lib/api-client.ts';
import { sessionQuery } from '../../lib/session.ts';
import { SessionExpiredDialog } from './SessionExpiredDialog.tsx';

const session: Session = {
  person: { id: 1, name: 'Ines Varrow', email: 'ines@saltgate.example' },
  role: 'owner',
  workshop: {
    id: 1,
    name: 'Saltgate Yard',
    unit: 'mm',
    a4Hz: 440,
    temperatureC: 24,
    bandCents: [5, 8, 15],
    referenceEnd: 'foot',
  },
  expiresAt: '2026-03-18T09:00:00.000Z',
};

const answer = (status: number, body: unknown) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } });
const refusal = (detail: string) => answer(401, { type: 'x', title: 'x', status: 401, detail });

const sent: unknown[] = [];
let isSignedIn = false;

/** A workshop that knows one password and whose tokens have all run out. */
const expiredWorkshop = vi.fn<typeof fetch>((path, init) => {
  if (path !== '/api/session')
    return Promise.resolve(isSignedIn ? answer(200, { saved: true }) : refusal('Signed out.'));
  const body = signInRequest.parse(JSON.parse(z.string().parse(init?.body)));
  sent.push(body);
  isSignedIn = body.password === 'right';
  return Promise.resolve(isSignedIn ? answer(200, session) : refusal('Email and password do not match.'));
});

const save = () =>
  apiRequest({
    method: 'PUT',
    path: '/api/designs/1/draft',
    body: {},
    schema: z.object({ saved: z.boolean() }),
  });

function setUp() {
  const queryClient = new QueryClient();
  queryClient.setQueryData(sessionQuery.queryKey, session);
  const onGiveUp = vi.fn();
  render(
    <QueryClientProvider client={queryClient}>
      <SessionExpiredDialog onGiveUp={onGiveUp} />
    </QueryClientProvider>,
  );
  return { onGiveUp, user: userEvent.setup() };
}

beforeEach(() => {
  isSignedIn = false;
  sent.length = 0;
  vi.stubGlobal('fetch', expiredWorkshop);
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

describe('SessionExpiredDialog', () => {
  it('stays away while nothing has run out', () => {
    setUp();
    expect(screen.queryByRole('dialog')).toBeNull();
  });

  it('asks over the page, says what is wrong with a password, and sends again what was being sent', async () => {
    const { user } = setUp();
    const saving = save();
    await screen.findByRole('dialog', { name: 'Your sign-in has run out' });
    await user.keyboard('{Escape}');
    await user.type(screen.getByLabelText('Password'), 'wrong{Enter}');
    expect((await screen.findByRole('alert')).textContent).toBe('Email and password do not match.');
    await user.clear(screen.getByLabelText('Password'));
    await user.type(screen.getByLabelText('Password'), 'right{Enter}');
    await expect(saving).resolves.toEqual({ saved: true });
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(sent.at(-1)).toEqual({ email: 'ines@saltgate.example', password: 'right' });
  });

  it('does not send an empty password', async () => {
    const { user } = setUp();
    const failure = save().catch((error: unknown) => error);
    await user.click(await screen.findByRole('button', { name: 'Sign in and go on' }));
    expect(screen.getByRole('alert').textContent).toBe('Type the password.');
    expect(sent).toEqual([]);
    cleanup();
    expect(await failure).toMatchObject({ status: 401 });
  });

  it('lets the person leave, and the request fail for what it was', async () => {
    const { user, onGiveUp } = setUp();
    const failure = save().catch((error: unknown) => error);
    await user.click(await screen.findByRole('button', { name: 'Leave this page' }));
    expect(onGiveUp).toHaveBeenCalledTimes(1);
    expect(await failure).toMatchObject({ status: 401 });
  });
});
