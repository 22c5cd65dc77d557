import { readFile } from 'node:fs/promises';
import { z } from 'zod';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { readDocument } from '#shared/document/read-document.ts';

const FOLDER = new URL('../../seed-data/', import.meta.url);

const demoSchema = z.object({
  password: z.string(),
  people: z.array(z.object({ email: z.string(), role: z.string() })),
  designs: z.array(z.object({ file: z.string() })),
});

const readJson = async (path: string): Promise<unknown> =>
  JSON.parse(await readFile(new URL(path, FOLDER), 'utf8'));

const readDemo = async () => demoSchema.parse(await readJson('workshop.json'));

export async function demoMaker(): Promise<{ email: string; password: string }> {
  const { people, password } = await readDemo();
  const maker = people.find(({ role }) => role === 'maker');
  if (maker === undefined) throw new Error('The demo workshop has no maker.');
  return { email: maker.email, password };
}

/** The first design of the demo workshop that has six holes. */
export async function sixHoleDesign(): Promise<DesignDocument> {
  const { designs } = await readDemo();
  for (const { file } of designs) {
    const reading = readDocument(await readJson(`designs/${file}`));
    if (reading.status === 'read' && reading.document.holes.length === 6) return reading.document;
  }
  throw new Error('The demo workshop has no design with six holes.');
}

/** Signs the demo maker in and returns the cookies to send. */
export async function demoSignIn(address: string): Promise<string> {
  const answer = await fetch(`${address}/api/session`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify(await demoMaker()),
  });
  if (!answer.ok) throw new Error(`The demo maker could not sign in: ${await answer.text()}`);
  const pairs = answer.headers.getSetCookie().map((cookie) => cookie.split(';')[0]);
  return pairs.join('; ');
}
