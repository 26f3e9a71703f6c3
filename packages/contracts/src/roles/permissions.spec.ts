import { may, permissions } from './permissions';
import { isRole, roles } from './roles';

describe('permissions', () => {
  it('give every thing to somebody, and to known roles only', () => {
    for (const [thing, allowed] of Object.entries(permissions)) {
      expect({ thing, allowed: allowed.length }).not.toEqual({ thing, allowed: 0 });
      expect(allowed.every((role) => isRole(role))).toBe(true);
    }
  });

  it('leave issuing to officers and rules to analysts', () => {
    expect(roles.filter((role) => may(role, 'notices.issue'))).toEqual(['officer']);
    expect(roles.filter((role) => may(role, 'rules.write'))).toEqual(['analyst']);
  });
});
