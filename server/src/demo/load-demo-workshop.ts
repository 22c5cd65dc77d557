import { readFile } from 'node:fs/promises';
import { z } from 'zod';
import { emailSchema, passwordSchema, ROLES } from '#shared/contract/session.ts';
import { readDocument } from '#shared/document/read-document.ts';
import type { AppConfig } from '../config.ts';
import type { Database } from '../db/connect.ts';
import { WorkshopScope } from '../db/workshop-scope.ts';
import { hashPassword } from '../identity/password.ts';
import { createDesign, predictDraft } from '../predicting/store-draft.ts';

const FOLDER = new URL('../../../seed-data/', import.meta.url);

const demoSchema = z.strictObject({
  name: z.string(),
  unit: z.enum(['mm', 'inch']),
  a4Hz: z.number(),
  temperatureC: z.number(),
  /** The same for every demo account, printed at the start. */
  password: passwordSchema,
  people: z.array(z.strictObject({ name: z.string(), email: emailSchema, role: z.enum(ROLES) })).min(1),
  /** Files under designs/, oldest first, each with whose it is. */
  designs: z.array(z.strictObject({ file: z.string(), by: emailSchema })),
});

type Demo = z.output<typeof demoSchema>;

interface Target {
  database: Database;
  config: AppConfig;
}

/** Fills an empty database with the demo workshop; one in which anybody has worked is left alone. */
export async function loadDemoWorkshop(target: Target): Promise<void> {
  if ((await target.database.models.Workshop.count()) > 0) return;
  const demo = demoSchema.parse(await readJson('workshop.json'));
  const people = await createPeople(target, demo);
  for (const { file, by } of demo.designs) {
    const scope = people.get(by);
    const reading = readDocument(await readJson(`designs/${file}`));
    if (scope === undefined) throw new RangeError(`seed-data names ${by}, who is not among its people.`);
    if (reading.status === 'refused') {
      throw new RangeError(`seed-data/designs/${file}: ${reading.faults[0]?.message ?? 'cannot be read'}`);
    }
    await createDesign(scope, predictDraft(reading.document));
  }
}

async function readJson(path: string): Promise<unknown> {
  return JSON.parse(await readFile(new URL(path, FOLDER), 'utf8'));
}

/** The workshop and everybody in it, each with what they reach. */
async function createPeople({ database, config }: Target, demo: Demo): Promise<Map<string, WorkshopScope>> {
  const { Workshop, Person, Membership } = database.models;
  const passwordHash = await hashPassword(demo.password, config.passwordRounds);
  return database.sequelize.transaction(async (transaction) => {
    const { name, unit, a4Hz, temperatureC } = demo;
    const workshop = await Workshop.create({ name, unit, a4Hz, temperatureC }, { transaction });
    const scopes = new Map<string, WorkshopScope>();
    for (const { role, ...person } of demo.people) {
      const { id: personId } = await Person.create({ ...person, passwordHash }, { transaction });
      await Membership.create({ workshopId: workshop.id, personId, role }, { transaction });
      const caller = { personId, workshopId: workshop.id, role, sessionId: 0, tokenExpiresAt: new Date() };
      scopes.set(person.email, new WorkshopScope(database, caller));
    }
    return scopes;
  });
}
