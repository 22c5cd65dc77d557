// @vitest-environment jsdom
import { act, cleanup, render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider, useSearchParams } from 'react-router';
import { useCallback } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import { FindBox } from './FindBox.tsx';
import { changeList, readListAddress, writeListAddress } from './list-address.ts';

/** The box above a list that lives in the address, as on the page; `arrive` lets a slow answer in. */
function Finder() {
  const [search, setSearch] = useSearchParams();
  const handleSearch = useCallback(
    (text: string) =>
      setSearch((current) => writeListAddress(changeList(readListAddress(current), { search: text })), {
        replace: true,
      }),
    [setSearch],
  );
  return <FindBox search={readListAddress(search).search} onSearch={handleSearch} />;
}

function setUp(address: string, loader: () => unknown = () => null) {
  const router = createMemoryRouter(
    [{ path: '/designs', element: <Finder />, loader, HydrateFallback: () => null }],
    {
      initialEntries: [address],
    },
  );
  render(<RouterProvider router={router} />);
  return router;
}

const findBox = () => screen.findByRole('searchbox', { name: 'Find a design' });
const user = userEvent.setup();

afterEach(cleanup);

describe('FindBox', () => {
  it('shows what the address looks for', async () => {
    setUp('/designs?search=low%20G');
    expect(await findBox()).toHaveProperty('value', 'low G');
  });

  it('puts what is typed into the address after a pause, at the first page, and keeps the filters', async () => {
    const router = setUp('/designs?kind=window&page=3');
    await user.type(await findBox(), 'wharf');
    expect(router.state.location.search).toBe('?kind=window&page=3');
    await waitFor(() => expect(router.state.location.search).toBe('?search=wharf&kind=window'));
  });

  it('keeps letters typed while the list is still on its way', async () => {
    const answers: (() => void)[] = [];
    const answerNext = async () => {
      await waitFor(() => expect(answers).not.toHaveLength(0));
      act(() => answers.shift()?.());
    };
    const router = setUp('/designs', () => new Promise((resolve) => answers.push(() => resolve(null))));
    await answerNext();
    const box = await findBox();
    await user.type(box, 'wh');
    await waitFor(() => expect(router.state.navigation.location?.search).toBe('?search=wh'));
    await user.type(box, 'a');
    await answerNext();
    await waitFor(() => expect(router.state.location.search).toBe('?search=wh'));
    expect(box).toHaveProperty('value', 'wha');
    await answerNext();
    await waitFor(() => expect(router.state.location.search).toBe('?search=wha'));
    expect(box).toHaveProperty('value', 'wha');
  });

  it('follows the address when somebody else changes it', async () => {
    const router = setUp('/designs?search=wharf');
    const box = await findBox();
    await act(() => router.navigate('/designs'));
    expect(box).toHaveProperty('value', '');
  });

  it('is found with /', async () => {
    setUp('/designs');
    const box = await findBox();
    await user.keyboard('/');
    expect(document.activeElement).toBe(box);
    expect(box).toHaveProperty('value', '');
  });
});
