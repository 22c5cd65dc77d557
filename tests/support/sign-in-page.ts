import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { z } from 'zod';
import { ROLES, type Role } from '#shared/contract/session.ts';

const demoSchema = z.object({
  password: z.string(),
  people: z.array(z.object({ name: z.string(), email: z.string(), role: z.enum(ROLES) })),
});

export interface DemoPerson {
  name: string;
  email: string;
  password: string;
}

export async function demoPerson(role: Role): Promise<DemoPerson> {
  const file = new URL('../../seed-data/workshop.json', import.meta.url);
  const { people, password } = demoSchema.parse(JSON.parse(await readFile(file, 'utf8')));
  const person = people.find((someone) => someone.role === role);
  if (person === undefined) throw new Error(`The demo workshop has no ${role}.`);
  return { ...person, password };
}

/** Signs in through the sign-in page, as somebody of the demo workshop, and waits for what comes after it. */
export async function signInThroughPage(page: Page, role: Role): Promise<DemoPerson> {
  const person = await demoPerson(role);
  await page.goto('/sign-in');
  await page.getByLabel('Email').fill(person.email);
  await page.getByLabel('Password').fill(person.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('button', { name: person.name }).waitFor();
  return person;
}
