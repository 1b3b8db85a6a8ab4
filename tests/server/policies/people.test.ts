import { describe, expect, it } from 'vitest';
import type { ROLES } from '../../../src/schemas/roles';
import { mayLeaveAdministration, mayLookAfterPeople } from '../../../src/server/policies/people';

const holding = (...roles: (typeof ROLES)[number][]) => ({
  id: '5f0c2a54-7c1e-4c52-9a39-5b2f0f6f0b11',
  name: 'Tamsin',
  email: 't@example.com',
  roles,
});

describe('mayLookAfterPeople', () => {
  it.each([
    ['maker', false],
    ['designer', false],
    ['seller', false],
    ['teacher', false],
    ['student', false],
    ['administrator', true],
  ] as const)('%s: %s', (role, allowed) => {
    expect(mayLookAfterPeople(holding(role))).toBe(allowed);
  });

  it('needs the role among others, and an account at all', () => {
    expect(mayLookAfterPeople(holding('maker', 'administrator'))).toBe(true);
    expect(mayLookAfterPeople(holding())).toBe(false);
    expect(mayLookAfterPeople(null)).toBe(false);
  });
});

describe('mayLeaveAdministration', () => {
  it.each([
    ['the only administrator', 'a', ['a'], false],
    ['one of two', 'a', ['a', 'b'], true],
    ['someone who is none', 'c', ['a'], true],
    ['anyone where there is none', 'c', [], true],
  ])('%s', (_, id, administrators, allowed) => {
    expect(mayLeaveAdministration(id, administrators)).toBe(allowed);
  });
});
