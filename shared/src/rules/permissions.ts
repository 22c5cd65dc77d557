import { ROLES, type Role } from '../contract/session.ts';

interface Rule {
  roles: readonly Role[];
  /** What everyone else is told: who may, and the next move. */
  refusal: string;
  /** A better sentence for some of them. */
  refusals?: Partial<Record<Role, string>>;
}

const everyone: Rule = { roles: ROLES, refusal: 'Join this workshop first. Ask an owner for an invitation.' };
const designers: readonly Role[] = ['owner', 'mentor', 'maker'];
const makersAndApprentices: readonly Role[] = [...designers, 'apprentice'];

const startsDesigns: Rule = {
  roles: designers,
  refusal: 'Visitors look at designs. Ask an owner to make you a maker.',
  refusals: { apprentice: 'Apprentices start from a template. Ask a mentor to give you one.' },
};
const editsDesigns: Rule = {
  roles: makersAndApprentices,
  refusal: 'Visitors look at designs. Ask an owner to make you a maker.',
};

/** Everything that can be done in a workshop, and who may. Asked by every route and by every button. */
const PERMISSIONS = {
  'see-session': everyone,
  'change-own-password': everyone,
  'see-workshop': everyone,
  'change-workshop': {
    roles: ['owner'],
    refusal: "Only owners change the workshop's settings. Ask an owner.",
  },
  'see-members': {
    roles: ['owner', 'mentor'],
    refusal: 'Only owners and mentors see the list of members. Ask one of them.',
  },
  'see-designs': everyone,
  'create-design': startsDesigns,
  'copy-design': startsDesigns,
  'edit-design': editsDesigns,
  'archive-design': editsDesigns,
  'print-sheet': {
    roles: makersAndApprentices,
    refusal: 'Visitors do not print sheets. Ask a maker for one.',
  },
} satisfies Record<string, Rule>;

export type Action = keyof typeof PERMISSIONS;

export const ACTIONS = Object.keys(PERMISSIONS) as Action[];

/** Why a person of this role may not do this, in a sentence with the next move; null when they may. */
export function permissionRefusal(person: { role: Role }, action: Action): string | null {
  const rule: Rule = PERMISSIONS[action];
  if (rule.roles.includes(person.role)) return null;
  return rule.refusals?.[person.role] ?? rule.refusal;
}

/** Which designs a role sees at all. To someone who may not see a design it does not exist. */
export function designReach(role: Role): 'all' | 'own' | 'none' {
  if (role === 'apprentice') return 'own';
  // A visitor sees what was shared with them, and nothing can be shared yet.
  return role === 'visitor' ? 'none' : 'all';
}
