import type { Role } from '#shared/contract/session.ts';

export const ROLE_WORDS: Record<Role, string> = {
  owner: 'Owner',
  mentor: 'Mentor',
  maker: 'Maker',
  apprentice: 'Apprentice',
  visitor: 'Visitor',
};
