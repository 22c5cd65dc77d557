import { chromium } from 'playwright-core';
import { CHROMIUM_FLAGS } from '../support/chromium-flags.ts';
import { startApp } from '../support/start-app.ts';
import { measureDrag } from './drag-bench.ts';
import { measureEngine } from './engine-bench.ts';
import { measureFirstLoad } from './first-load-bench.ts';
import { measureReads } from './http-bench.ts';
import { measureSheet } from './sheet-bench.ts';
import type { Figure } from './figure.ts';

/** A frame is painted as soon as there is one, so that waiting for the screen is not counted as work. */
const NO_FRAME_LIMIT = ['--disable-frame-rate-limit', '--disable-gpu-vsync'];

/** What `npm run bench` hands over. */
function setting(name: string): string {
  const value = process.env[name];
  if (value === undefined) throw new Error(`${name} is not set: run npm run bench.`);
  return value;
}

async function measureInBrowser(databaseUrl: string): Promise<Record<string, Figure>> {
  const app = await startApp({ databaseUrl, clientFolder: setting('BUILT_CLIENT') });
  const browser = await chromium.launch({
    executablePath: setting('CHROMIUM'),
    args: [...CHROMIUM_FLAGS, ...NO_FRAME_LIMIT],
  });
  try {
    return {
      drag: await measureDrag(browser, app.address),
      firstLoad: await measureFirstLoad(browser, app.address),
    };
  } finally {
    await browser.close();
    await app.stop();
  }
}

const databaseUrl = setting('TEST_DATABASE_URL');
const figures = {
  ...(await measureEngine()),
  sheet: await measureSheet(),
  ...(await measureReads(databaseUrl)),
  ...(await measureInBrowser(databaseUrl)),
};
process.stdout.write(`${JSON.stringify(figures, null, 2)}\n`);
