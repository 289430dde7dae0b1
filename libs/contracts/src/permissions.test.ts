import { may, PERMISSIONS, ROLES, type Permission } from './permissions';

/** The table of the design, by role. */
const table: Record<(typeof ROLES)[number], Permission[]> = {
  trainee: ['account.use', 'trailers.read', 'plans.read', 'traces.readOwn'],
  technician: [
    'account.use',
    'trailers.read',
    'trailers.write',
    'plans.read',
    'traces.run',
    'traces.readAll',
    'traces.readOwn',
  ],
  lead: Object.keys(PERMISSIONS) as Permission[],
};

describe('what each role may do', () => {
  it.each(ROLES)('is as the design says for a %s', (role) => {
    const permissions = (Object.keys(PERMISSIONS) as Permission[]).filter((permission) =>
      may(role, permission),
    );
    expect(permissions.sort()).toEqual([...table[role]].sort());
  });

  it('is nothing for a role that does not exist', () => {
    expect(may('driver' as never, 'account.use')).toBe(false);
  });
});
