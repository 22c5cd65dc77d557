import { QueryTypes } from 'sequelize';
import type { Role } from '#shared/contract/session.ts';
import type { Database } from '../db/connect.ts';

/** How long a session found good is taken as good without asking the database again, ms. */
const TRUST_MS = 2_000;
const MOST_ENTRIES = 10_000;

export interface LiveSession {
  personId: number;
  workshopId: number;
  role: Role;
}

interface Entry {
  session: Promise<LiveSession | null>;
  until: number;
}

/**
 * Which sessions are alive, and with which role.
 *
 * A session ended by this process is forgotten at once; one ended, or a role changed, by another process on the same
 * database takes effect within two seconds. In return a burst of requests costs one query, not one each.
 */
export class SessionDirectory {
  readonly #database: Database;
  readonly #entries = new Map<number, Entry>();

  constructor(database: Database) {
    this.#database = database;
  }

  find(sessionId: number): Promise<LiveSession | null> {
    const known = this.#entries.get(sessionId);
    if (known !== undefined && known.until > Date.now()) return known.session;
    // Kept as a promise: forgetting it while the query runs also forgets its answer.
    const session = this.#load(sessionId);
    if (this.#entries.size >= MOST_ENTRIES) this.#entries.clear();
    this.#entries.set(sessionId, { session, until: Date.now() + TRUST_MS });
    session.catch(() => this.forget(sessionId));
    return session;
  }

  forget(sessionId: number): void {
    this.#entries.delete(sessionId);
  }

  async #load(sessionId: number): Promise<LiveSession | null> {
    const [row] = await this.#database.sequelize.query<LiveSession>(
      `SELECT sessions.person_id AS personId, sessions.workshop_id AS workshopId, memberships.role AS role
       FROM sessions
       JOIN memberships ON memberships.person_id = sessions.person_id
         AND memberships.workshop_id = sessions.workshop_id
       WHERE sessions.id = ? AND sessions.ended_at IS NULL AND sessions.expires_at > UTC_TIMESTAMP(3)`,
      { replacements: [sessionId], type: QueryTypes.SELECT },
    );
    return row ?? null;
  }
}
