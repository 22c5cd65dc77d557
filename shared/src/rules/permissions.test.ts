import { describe, expect, it } from 'vitest';
import { ROLES } from '../contract/session.ts';
import { ACTIONS, designReach, permissionRefusal } from './permissions.ts';

describe('permissionRefusal', () => {
  it.each([
    ['owner', 'change-workshop', true],
    ['mentor', 'change-workshop', false],
    ['mentor', 'see-members', true],
    ['maker', 'see-members', false],
    ['maker', 'create-design', true],
    ['apprentice', 'create-design', false],
    ['apprentice', 'copy-design', false],
    ['apprentice', 'edit-design', true],
    ['visitor', 'edit-design', false],
    ['visitor', 'print-sheet', false],
    ['visitor', 'see-designs', true],
  ] as const)('%s, %s: %s', (role, action, allowed) => {
    expect(permissionRefusal({ role }, action) === null).toBe(allowed);
  });

  it('tells an apprentice where designs come from', () => {
    expect(permissionRefusal({ role: 'apprentice' }, 'create-design')).toBe(
      'Apprentices start from a template. Ask a mentor to give you one.',
    );
  });

  it.each(ACTIONS)('refuses %s with a sentence that names the next move, and never an owner', (action) => {
    expect(permissionRefusal({ role: 'owner' }, action)).toBeNull();
    for (const role of ROLES) {
      const refusal = permissionRefusal({ role }, action);
      if (refusal !== null) expect(refusal).toMatch(/\. Ask .+\.$/);
    }
  });
});

describe('designReach', () => {
  it.each([
    ['owner', 'all'],
    ['mentor', 'all'],
    ['maker', 'all'],
    ['apprentice', 'own'],
    ['visitor', 'none'],
  ] as const)('lets a %s see %s', (role, reach) => {
    expect(designReach(role)).toBe(reach);
  });
});
