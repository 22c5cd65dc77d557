import type { Browser, Locator, Page } from 'playwright-core';
import { z } from 'zod';
import { demoMaker, sixHoleDesign } from './demo-workshop.ts';
import { figureOf, type Figure } from './figure.ts';

const MOVES = 200;
/** Moves before the measured ones, while the browser compiles what is used most. */
const WARM_UP = 40;
const REACH_PX = 30;

const designsSchema = z.object({ items: z.array(z.object({ id: z.int(), name: z.string() })) });

/** Time from each pointer event of a dragged hole to the moment its frame has been painted. */
export async function measureDrag(browser: Browser, address: string): Promise<Figure> {
  const page = await browser.newPage({ viewport: { width: 1440, height: 900 }, baseURL: address });
  await openWorkbench(page);
  await watchFrames(page);
  await dragToAndFro(page, page.getByRole('button', { name: /^Hole 3,/ }));
  const samples = z.array(z.number()).parse(await page.evaluate('globalThis.frameTimes'));
  await page.close();
  const what = 'Dragging a hole: input to painted frame, Chromium without a frame-rate limit';
  return figureOf({ what, unit: 'ms', budget: 16 }, samples.slice(WARM_UP));
}

async function openWorkbench(page: Page): Promise<void> {
  const { name } = await sixHoleDesign();
  await page.request.post('/api/session', { data: await demoMaker() });
  const answer = await page.request.get('/api/designs', { params: { pageSize: 100 } });
  const design = designsSchema.parse(await answer.json()).items.find((item) => item.name === name);
  if (design === undefined) throw new Error(`The server has no design named ${name}.`);
  await page.goto(`/designs/${design.id}`);
  await page.getByRole('group', { name: 'Instrument' }).waitFor();
}

// A message posted from inside a frame's callback arrives once that frame has been laid out and painted.
const WATCH = `
  globalThis.frameTimes = [];
  addEventListener('pointermove', (event) => {
    requestAnimationFrame(() => {
      const { port1, port2 } = new MessageChannel();
      port1.onmessage = () => globalThis.frameTimes.push(performance.now() - event.timeStamp);
      port2.postMessage(null);
    });
  }, { capture: true });
`;

const watchFrames = (page: Page) => page.evaluate(WATCH);

async function dragToAndFro(page: Page, hole: Locator): Promise<void> {
  const box = await hole.boundingBox();
  if (box === null) throw new Error('The hole to drag is not on the screen.');
  const x = box.x + box.width / 2;
  const y = box.y + box.height / 2;
  await page.mouse.move(x, y);
  await page.mouse.down();
  for (let move = 0; move < WARM_UP + MOVES; move += 1) {
    await page.mouse.move(x + REACH_PX * Math.sin(move / 8), y);
  }
  await page.mouse.up();
}
