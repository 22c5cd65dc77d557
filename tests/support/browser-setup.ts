import { chromium } from 'playwright-core';
import type { TestProject } from 'vitest/node';
import { ensureChromium, findChromium } from '../../server/scripts/lib/debian.mjs';
import { CHROMIUM_FLAGS } from './chromium-flags.ts';

export async function setup(project: TestProject) {
  await ensureChromium();
  const executablePath = findChromium();
  if (executablePath === null) throw new Error('Chromium is missing: sudo apt-get install chromium');
  const browser = await chromium.launchServer({ executablePath, args: CHROMIUM_FLAGS });
  project.provide('browserEndpoint', browser.wsEndpoint());
  return () => browser.close();
}
