import { chromium } from 'playwright-core';
import type { TestProject } from 'vitest/node';
import { ensureChromium, findChromium } from '../../server/scripts/lib/debian.mjs';

/** Chromium without the calls home that a closed network would only refuse. */
const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--no-first-run',
];

export async function setup(project: TestProject) {
  await ensureChromium();
  const executablePath = findChromium();
  if (executablePath === null) throw new Error('Chromium is missing: sudo apt-get install chromium');
  const browser = await chromium.launchServer({ executablePath, args: FLAGS });
  project.provide('browserEndpoint', browser.wsEndpoint());
  return () => browser.close();
}
