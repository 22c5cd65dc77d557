import type { Role } from '#shared/contract/session.ts';

/** The signed-in person as a request sees them. */
export interface Caller {
  personId: number;
  workshopId: number;
  role: Role;
  sessionId: number;
  /** When the access token of this request runs out. */
  tokenExpiresAt: Date;
}
