import type { QueryInterface } from 'sequelize';
import { up as peopleAndWorkshops } from './0001-people-and-workshops.ts';
import { up as sessions } from './0002-sessions.ts';
import { up as designs } from './0003-designs.ts';

interface Migration {
  name: string;
  up: (params: { context: QueryInterface }) => Promise<void>;
}

/** In the order they run. One that has been released is never changed: what follows is a new file. */
export const ALL_MIGRATIONS: readonly Migration[] = [
  { name: '0001-people-and-workshops', up: peopleAndWorkshops },
  { name: '0002-sessions', up: sessions },
  { name: '0003-designs', up: designs },
];
