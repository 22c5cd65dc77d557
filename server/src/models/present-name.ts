import type { PersonRow } from './person.ts';

/** The two things about a person that stand beside their work. */
export function presentName(person: PersonRow | undefined): { id: number; name: string } {
  if (person === undefined) throw new TypeError('A row was read without the person beside it.');
  return { id: person.id, name: person.name };
}
