import { gzipSync } from 'node:zlib';
import type { Browser, Response } from 'playwright-core';
import { demoMaker } from './demo-workshop.ts';
import { figureOf, type Figure } from './figure.ts';

const isScript = (response: Response) =>
  (response.headers()['content-type'] ?? '').includes('javascript') && response.ok();

/** All JavaScript that a browser with nothing kept fetches for signing in and for the list of designs. */
export async function measureFirstLoad(browser: Browser, address: string): Promise<Figure> {
  const page = await browser.newPage();
  const sizes = new Map<string, Promise<number>>();
  page.on('response', (response) => {
    if (isScript(response)) sizes.set(response.url(), gzippedSize(response));
  });
  const { email, password } = await demoMaker();
  await page.goto(`${address}/sign-in`);
  await page.getByLabel('Email').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('link', { name: 'Designs', exact: true }).click();
  await page.getByRole('heading', { name: 'Designs', level: 1 }).waitFor();
  await page.waitForLoadState('networkidle');
  const total = (await Promise.all(sizes.values())).reduce((sum, size) => sum + size, 0);
  await page.close();
  const what = 'JavaScript before the workbench, gzip';
  return figureOf({ what, unit: 'kB', budget: 200 }, [total / 1000]);
}

const gzippedSize = async (response: Response) => gzipSync(await response.body()).length;
