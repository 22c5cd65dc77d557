import { describe, expect } from 'vitest';
import { expectAccessible, test } from '../support/browser-test.ts';
import { demoPerson, signInThroughPage } from '../support/sign-in-page.ts';

describe('signing in', () => {
  test('a wrong password is refused beside the form, and the address typed is kept', async ({ page }) => {
    const { email } = await demoPerson('maker');
    await page.goto('/sign-in');
    await page.getByLabel('Email').fill(email);
    await page.getByLabel('Password').fill('not the password');
    await page.getByRole('button', { name: 'Sign in' }).click();

    await page.getByText('Email and password do not match.').waitFor();
    expect(await page.getByLabel('Email').inputValue()).toBe(email);
    expect(await page.getByLabel('Password').inputValue()).toBe('');
    expect(new URL(page.url()).pathname).toBe('/sign-in');
    await expectAccessible(page);
  });

  test('a maker signs in, is remembered, and signs out', async ({ page }) => {
    const { name } = await signInThroughPage(page, 'maker');
    expect(new URL(page.url()).pathname).toBe('/today');

    await page.reload();
    await page.getByRole('button', { name }).click();
    await page.getByRole('menuitem', { name: 'Sign out' }).click();
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();

    await page.goto('/designs');
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();
  });

  test('whoever comes by a link gets to its page once signed in', async ({ page }) => {
    const { email, password } = await demoPerson('owner');
    await page.goto('/workshop/members');
    await page.getByLabel('Email').fill(email);
    await page.getByLabel('Password').fill(password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await expect.poll(() => new URL(page.url()).pathname).toBe('/workshop/members');
  });
});

describe('every page', () => {
  test.for(['/sign-in', '/start', '/no-such-peg'])('%s can be used by everybody', async (path, { page }) => {
    await page.goto(path);
    await page.getByRole('heading', { level: 1 }).waitFor();
    await expectAccessible(page);
  });

  test.for(['/today', '/designs', '/designs/new', '/account', '/workshop/defaults', '/workshop/members'])(
    '%s can be used by everybody who is signed in',
    async (path, { page }) => {
      await signInThroughPage(page, 'owner');
      await page.goto(path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await expectAccessible(page);
    },
  );
});
